import { z } from 'zod'
import { handsSchema, pieceEndsSchema, sideSchema } from '#shared/ends/end.schema'
import { daySchema, momentSchema, optionalText, textField } from '#shared/http/fields'
import { pitchRiseSchema } from '#shared/jobs/jobs.contract'
import { overrideSchema } from '#shared/orders/override.schema'
import { companySchema } from '#shared/people/people.contract'
import { pieceStateSchema } from '#shared/pieces/piece-state'
import { pieceLengthSchema } from '#shared/plans/plans.contract'
import { lineQuoteSchema } from '#shared/pricing/line-quote'
import { centsSchema } from '#shared/pricing/price-book.schema'
import { profileSchema } from '#shared/profile/profile.schema'
import { goodSchema } from '#shared/roof-line/goods.schema'
import { stockSchema } from '#shared/stock/stock.schema'
import { stripSchema } from '#shared/strip/strip.schema'

/**
 * Derived in SQL from the order's events and its pieces, never stored: submitted, question (the
 * shop waits for an answer), withdrawn before release; afterwards released (nothing bent yet),
 * inWork, ready (all bundled), partPickedUp, pickedUp.
 */
export const ORDER_STATES = [
  'submitted',
  'question',
  'released',
  'inWork',
  'ready',
  'partPickedUp',
  'pickedUp',
  'withdrawn',
] as const
export const orderStateSchema = z.enum(ORDER_STATES)

/** Counts of an order's, a run's or a bundle's pieces by state. */
export const progressSchema = z.strictObject({
  queued: z.int(),
  bent: z.int(),
  bundled: z.int(),
  pickedUp: z.int(),
  scrapped: z.int(),
  withdrawn: z.int(),
})

/** A line as a person writes it, before its parts are held against each other. */
const lineInputShape = z.strictObject({
  /** The crew's mark on the drawing and the label: A, B, north rake… */
  mark: textField(20),
  name: textField(80),
  profile: profileSchema,
  stockId: z.uuid(),
  quantity: z
    .int('Count whole pieces.')
    .min(1, 'At least one piece.')
    .max(500, 'At most 500 pieces a line.'),
  /** Of the finished piece from tip to tip, laps included; tabs come on top. */
  length: pieceLengthSchema,
  /** Null: both ends square, the piece level. */
  ends: pieceEndsSchema.nullable().default(null),
  /** Null: the pieces have no hand. */
  hands: handsSchema.nullable().default(null),
  /** The girth the crew expects; a difference is shown, never mended. */
  statedGirth: z.number().positive().max(120).nullable().default(null),
})

/** A line as a person writes it. */
export const orderLineInputSchema = lineInputShape.refine(
  ({ hands, quantity }) => hands === null || hands.left + hands.right === quantity,
  { path: ['hands'], error: 'Left and right together must be the quantity.' },
)

export const orderInputSchema = z.strictObject({
  poNumber: optionalText(40),
  neededBy: daySchema,
  notes: optionalText(1000),
  lines: z.array(orderLineInputSchema).min(1, 'An order needs at least one line.').max(50),
  /** Small goods that go with the trim. */
  goods: z.array(goodSchema).max(40).default([]),
})

export const pieceSummarySchema = z.strictObject({
  code: z.string(),
  /** 1…quantity within the line; a remake keeps the number of the piece it replaces. */
  sequence: z.int(),
  /** L or R where the line has hands: its first pieces are the left ones. */
  hand: sideSchema.nullable(),
  state: pieceStateSchema,
  /** When it came into its state, and by whom. */
  since: momentSchema,
  by: z.string(),
  runNumber: z.int(),
  bundleCode: z.string().nullable(),
  rackPlace: z.string().nullable(),
  remakeOf: z.string().nullable(),
})

export const orderLineSchema = z.strictObject({
  id: z.uuid(),
  position: z.int(),
  mark: z.string(),
  name: z.string(),
  profile: profileSchema,
  stock: stockSchema,
  quantity: z.int(),
  length: z.number(),
  ends: pieceEndsSchema.nullable(),
  hands: handsSchema.nullable(),
  statedGirth: z.number().nullable(),
  strip: stripSchema,
  /** Pounds of one piece. */
  pieceWeight: z.number(),
  /** By the price book that counts, until release freezes it. */
  ...lineQuoteSchema.shape,
  /** Names of the brakes that bend it under the checks made; the chosen one after release. */
  bendsOn: z.array(z.string()),
  /** Set at release where no brake bends it and somebody answers for it; then `bendsOn` names that brake. */
  override: overrideSchema.nullable(),
  /** Empty before release. */
  pieces: z.array(pieceSummarySchema),
})

export const orderEventSchema = z.strictObject({
  id: z.int(),
  kind: z.enum([
    'submitted',
    'amended',
    'question',
    'answered',
    'released',
    'withdrawn',
    'handedOff',
    /** The job's pitch changed and the lines that follow it were drawn anew. */
    'redrawn',
  ]),
  at: momentSchema,
  by: z.string(),
  text: z.string(),
})

export const orderSummarySchema = z.strictObject({
  id: z.uuid(),
  /** Shown as `F-2047`. */
  number: z.int(),
  company: companySchema,
  job: z.strictObject({ id: z.uuid(), name: z.string(), pitchRise: pitchRiseSchema }),
  orderedBy: z.string(),
  poNumber: z.string(),
  neededBy: daySchema,
  submittedAt: momentSchema,
  state: orderStateSchema,
  /** Pieces ordered. */
  pieceCount: z.int(),
  progress: progressSchema,
  version: z.int(),
})

export const orderSchema = z.strictObject({
  ...orderSummarySchema.shape,
  notes: z.string(),
  lines: z.array(orderLineSchema),
  /** All lines together, without tax and small goods; null as soon as one line has no price. */
  priceCents: centsSchema.nullable(),
  goods: z.array(goodSchema),
  events: z.array(orderEventSchema),
})

export const orderNumber = (number: number): string => `F-${String(number).padStart(4, '0')}`

export type OrderState = z.infer<typeof orderStateSchema>
export type Progress = z.infer<typeof progressSchema>
export type OrderLineInput = z.infer<typeof orderLineInputSchema>
export type OrderInput = z.infer<typeof orderInputSchema>
export type PieceSummary = z.infer<typeof pieceSummarySchema>
export type OrderLine = z.infer<typeof orderLineSchema>
export type OrderEvent = z.infer<typeof orderEventSchema>
export type OrderSummary = z.infer<typeof orderSummarySchema>
export type Order = z.infer<typeof orderSchema>
