import { z } from 'zod'
import { profileSchema } from '#shared/profile/profile.schema'

/** A line that is being written: what is not filled in yet is null. Inches. */
export const draftLineSchema = z.strictObject({
  key: z.string().min(1),
  mark: z.string(),
  name: z.string(),
  profile: profileSchema,
  stockId: z.uuid().nullable(),
  quantity: z.number().nullable(),
  length: z.number().nullable(),
})

export const orderDraftSchema = z.strictObject({
  /**
   * The idempotency key of the submission. It stays with the draft across retries and reloads, so
   * that one draft is one order however often it is sent.
   */
  key: z.string().min(8),
  poNumber: z.string(),
  /** `YYYY-MM-DD`, or empty while no day is chosen. */
  neededBy: z.string(),
  notes: z.string(),
  lines: z.array(draftLineSchema),
  /** True from the press of "submit" until the server has answered, over reloads too. */
  sending: z.boolean(),
  /** The order being amended and the version it was read at; null for a new order. */
  amends: z
    .strictObject({
      orderId: z.uuid(),
      number: z.int(),
      version: z.int(),
      /** The reply to the shop's question, where one is open. */
      answer: z.string(),
    })
    .nullable(),
})

export type DraftLine = z.infer<typeof draftLineSchema>
export type OrderDraft = z.infer<typeof orderDraftSchema>
export type DraftFields = Partial<Omit<OrderDraft, 'key' | 'lines'>>
export type LinePatch = Partial<Omit<DraftLine, 'key'>>

export const emptyDraft = (key: string): OrderDraft => ({
  key,
  poNumber: '',
  neededBy: '',
  notes: '',
  lines: [],
  sending: false,
  amends: null,
})

/** True when nothing has been written into it yet. */
export const isBlank = (draft: OrderDraft): boolean =>
  draft.lines.length === 0 &&
  draft.poNumber === '' &&
  draft.neededBy === '' &&
  draft.notes === '' &&
  draft.amends === null

/** A…Z, AA…AZ, BA… for 0, 1, 2… */
const letters = (index: number): string =>
  index < 26
    ? String.fromCharCode(65 + index)
    : letters(Math.floor(index / 26) - 1) + letters(index % 26)

/** The first of A, B, C… that no line of the draft bears. */
export function nextMark({ lines }: Pick<OrderDraft, 'lines'>): string {
  const taken = new Set(lines.map(({ mark }) => mark.trim().toUpperCase()))
  let index = 0
  while (taken.has(letters(index))) index += 1
  return letters(index)
}

/* A change of the lines takes an order back that was on its way: what is sent is what was submitted. */

/** Puts a line at the end, or back at the place it was taken from. */
export const withLine = (
  draft: OrderDraft,
  line: DraftLine,
  at: number = draft.lines.length,
): OrderDraft => ({ ...draft, sending: false, lines: draft.lines.toSpliced(at, 0, line) })

export const withLinePatch = (draft: OrderDraft, key: string, patch: LinePatch): OrderDraft => ({
  ...draft,
  sending: false,
  lines: draft.lines.map((line) => (line.key === key ? { ...line, ...patch } : line)),
})

export const withoutLine = (draft: OrderDraft, key: string): OrderDraft => ({
  ...draft,
  sending: false,
  lines: draft.lines.filter((line) => line.key !== key),
})
