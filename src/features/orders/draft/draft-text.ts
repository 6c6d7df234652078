import { z } from 'zod'
import { draftLineSchema, orderDraftSchema, type OrderDraft } from './order-draft'

/** Drafts as they were kept before lines had ends, hands and a stated girth, and orders small goods. */
const firstLineSchema = draftLineSchema.omit({
  ends: true,
  hands: true,
  statedGirth: true,
  covers: true,
})
const firstDraftSchema = orderDraftSchema
  .omit({ goods: true })
  .extend({ lines: z.array(firstLineSchema) })

const storedSchema = z.discriminatedUnion('version', [
  z.strictObject({ version: z.literal(1), draft: firstDraftSchema }),
  z.strictObject({ version: z.literal(2), draft: orderDraftSchema }),
])

const upgraded = (draft: z.infer<typeof firstDraftSchema>): OrderDraft => ({
  ...draft,
  lines: draft.lines.map((line) => ({
    ...line,
    ends: null,
    hands: null,
    statedGirth: null,
    covers: null,
  })),
  goods: [],
})

export type ReadDraft =
  { readonly ok: true; readonly draft: OrderDraft } | { readonly ok: false; readonly text: string }

export const writeDraft = (draft: OrderDraft): string => JSON.stringify({ version: 2, draft })

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    // Not even JSON: undefined is no draft either, and the text itself is what gets reported.
    return undefined
  }
}

/** Reads a kept draft; one that cannot be read comes back as its text, so that it can be shown. */
export function readDraft(text: string): ReadDraft {
  const stored = storedSchema.safeParse(parseJson(text))
  if (!stored.success) return { ok: false, text }
  const { version, draft } = stored.data
  return { ok: true, draft: version === 1 ? upgraded(draft) : draft }
}
