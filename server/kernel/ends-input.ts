import { z } from 'zod'
import type { End } from '#shared/ends/end.schema'
import { endSchema } from '#shared/ends/end.schema'

/** What a shop means that says no length. */
const LAP = 4
const TAB = 1

const looseTab = z.looseObject({})

const looseEnd = z.looseObject({
  kind: z.string(),
  tabs: z.array(looseTab).optional(),
})

/** Fills in what may be left out from the shell; whatever is not understood is left as it is. */
const filledIn = (given: unknown): unknown => {
  const parsed = looseEnd.safeParse(given)
  if (!parsed.success) return given
  const { data } = parsed
  const tabs = data.tabs?.map((tab) => ({ length: TAB, ...tab })) ?? []
  if (data.kind === 'tab') return { ...data, kind: 'square', tabs }
  if (data.kind === 'lap') return { length: LAP, ...data, tabs }
  if (data.kind === 'miter') return { lay: 0, ...data, tabs }
  return { ...data, tabs }
}

/**
 * An end as in the API. From the shell `{ kind: 'tab', tabs }` is a square end with tabs, `lay` is
 * 0 unless given, a lap 4 in. and a tab 1 in. long, and lists that are empty may be left out.
 */
export const endInput = z.unknown().transform((given, context): End => {
  const parsed = endSchema.safeParse(filledIn(given))
  if (parsed.success) return parsed.data
  for (const { path, message } of parsed.error.issues) {
    context.addIssue({ code: 'custom', path, message })
  }
  return z.NEVER
})
