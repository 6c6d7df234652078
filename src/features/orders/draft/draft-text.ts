import { z } from 'zod'
import { orderDraftSchema, type OrderDraft } from './order-draft'

const storedSchema = z.strictObject({ version: z.literal(1), draft: orderDraftSchema })

export type ReadDraft =
  { readonly ok: true; readonly draft: OrderDraft } | { readonly ok: false; readonly text: string }

export const writeDraft = (draft: OrderDraft): string => JSON.stringify({ version: 1, draft })

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
  return stored.success ? { ok: true, draft: stored.data.draft } : { ok: false, text }
}
