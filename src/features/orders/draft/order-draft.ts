import { z } from 'zod'
import { profileSchema } from '#shared/profile/profile.schema'
import { GOOD_KINDS, GOOD_UNITS } from '#shared/roof-line/goods.schema'
import { draftEndsSchema, draftHandsSchema } from '@/features/ends/model/draft-end'
import { draftRoofLineSchema } from '@/features/roof-line/model/draft-roof-line'

/** A line that is being written: what is not filled in yet is null. Inches. */
export const draftLineSchema = z.strictObject({
  key: z.string().min(1),
  mark: z.string(),
  name: z.string(),
  profile: profileSchema,
  stockId: z.uuid().nullable(),
  quantity: z.number().nullable(),
  length: z.number().nullable(),
  /** Null: both ends square, the piece level. */
  ends: draftEndsSchema.nullable(),
  /** Null: the pieces have no hand. */
  hands: draftHandsSchema.nullable(),
  /** The girth the crew expects; null where none is stated. */
  statedGirth: z.number().nullable(),
  /**
   * The line on the roof that its pieces cover together with those of other lines of the same key;
   * known on this device alone, for counting small goods. Null where it was not made of one.
   */
  covers: z.strictObject({ roofLine: z.string(), line: draftRoofLineSchema }).nullable(),
})

/** Small goods that are being written. */
export const draftGoodSchema = z.strictObject({
  key: z.string().min(1),
  kind: z.enum(GOOD_KINDS),
  quantity: z.number().nullable(),
  unit: z.enum(GOOD_UNITS),
  stockId: z.uuid().nullable(),
  note: z.string(),
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
  goods: z.array(draftGoodSchema),
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
export type DraftGood = z.infer<typeof draftGoodSchema>
export type OrderDraft = z.infer<typeof orderDraftSchema>
export type DraftFields = Partial<Omit<OrderDraft, 'key' | 'lines' | 'goods'>>
export type LinePatch = Partial<Omit<DraftLine, 'key'>>

export const emptyDraft = (key: string): OrderDraft => ({
  key,
  poNumber: '',
  neededBy: '',
  notes: '',
  lines: [],
  goods: [],
  sending: false,
  amends: null,
})

/** What a line says beside its drawing when nothing was written yet. */
export const PLAIN_LINE = {
  quantity: 1,
  ends: null,
  hands: null,
  statedGirth: null,
  covers: null,
} as const satisfies Partial<DraftLine>

/** True when nothing has been written into it yet. */
export const isBlank = (draft: OrderDraft): boolean =>
  draft.lines.length === 0 &&
  draft.goods.length === 0 &&
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

/** The lines as they are to be from now on. */
export const withLines = (draft: OrderDraft, lines: readonly DraftLine[]): OrderDraft => ({
  ...draft,
  sending: false,
  lines: [...lines],
})

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

/** The goods as they are to be from now on. */
export const withGoods = (draft: OrderDraft, goods: readonly DraftGood[]): OrderDraft => ({
  ...draft,
  sending: false,
  goods: [...goods],
})
