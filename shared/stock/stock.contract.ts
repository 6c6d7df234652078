import { z } from 'zod'
import { endpoint } from '#shared/http/endpoint'
import { idParams, momentSchema, optionalText } from '#shared/http/fields'
import { stockSchema } from '#shared/stock/stock.schema'

const params = idParams('stockId')
const length = (what: string) =>
  z.number().positive(`Enter the ${what}.`).max(120, `The ${what} is at most 120 in.`)

/** One bend made from a measured strip. Legs are outside dimensions, as a tape reads them. Inches. */
export const testBendInputSchema = z.strictObject({
  brakeId: z.uuid(),
  stripWidth: length('strip width'),
  legA: length('first leg'),
  legB: length('second leg'),
  /** Degrees of bend, as measured when the piece lies free. */
  turn: z.number().gt(0, 'Enter the angle.').lt(180, 'A bend turns less than 180 degrees.'),
  /** As a micrometer reads it. */
  thickness: z.number().positive('Enter the thickness.').max(0.5),
  /** Where the radius was measured as well; null: it is solved from bends of different angles. */
  insideRadius: z.number().nonnegative().max(1).nullable(),
  note: optionalText(200),
})

export const testBendSchema = z.strictObject({
  ...testBendInputSchema.shape,
  id: z.uuid(),
  brakeName: z.string(),
  by: z.string(),
  at: momentSchema,
  /** Set when somebody said that it does not count; it stays in the list. */
  withdrawn: z.strictObject({ by: z.string(), at: momentSchema, reason: z.string() }).nullable(),
})

/** What the bends of one brake give together. `spread` is the largest deviation in inches of strip. */
export const foldFitSchema = z.strictObject({
  brakeId: z.uuid(),
  kFactor: z.number(),
  insideRadius: z.number(),
  bends: z.int(),
  spread: z.number(),
})

export const listStocks = endpoint({
  method: 'GET',
  path: '/stocks',
  permission: 'stocks.read',
  summary: 'The stocks the shop sells.',
  answer: z.strictObject({ items: z.array(stockSchema) }),
})

const testBendsAnswer = z.strictObject({
  stock: stockSchema,
  /** Newest first. */
  bends: z.array(testBendSchema),
  /** For every brake whose bends give one; none where they contradict each other or one is missing. */
  fits: z.array(foldFitSchema),
})

export const listTestBends = endpoint({
  method: 'GET',
  path: '/stocks/:stockId/test-bends',
  permission: 'stocks.read',
  summary: 'The test bends of a stock, what they give, and what is in use.',
  params,
  answer: testBendsAnswer,
})

export const recordTestBend = endpoint({
  method: 'POST',
  path: '/stocks/:stockId/test-bends',
  permission: 'stocks.test',
  summary: 'Record a test bend. Nothing is cut by it until a manager takes it into use.',
  params,
  body: testBendInputSchema,
  answer: testBendsAnswer,
  success: 201,
  idempotent: true,
})

export const withdrawTestBend = endpoint({
  method: 'POST',
  path: '/stocks/:stockId/test-bends/:bendId/withdrawal',
  permission: 'stocks.test',
  summary: 'Say that a test bend does not count, and why.',
  params: z.strictObject({ stockId: z.uuid(), bendId: z.uuid() }),
  body: z.strictObject({ reason: z.string().trim().min(1, 'Cannot be empty.').max(200) }),
  answer: testBendsAnswer,
  idempotent: true,
})

export const calibrateStock = endpoint({
  method: 'POST',
  path: '/stocks/:stockId/calibrations',
  permission: 'stocks.calibrate',
  summary: 'Take the fit of a brake into use for this stock, or go back to the stock’s own K.',
  params,
  body: z.strictObject({
    brakeId: z.uuid(),
    /** The fit the manager saw; null goes back. Another fit by now is answered with `changed-meanwhile`. */
    fit: z.strictObject({ kFactor: z.number(), insideRadius: z.number() }).nullable(),
  }),
  answer: testBendsAnswer,
  idempotent: true,
})

export type TestBendInput = z.infer<typeof testBendInputSchema>
export type TestBendRecord = z.infer<typeof testBendSchema>
export type FoldFit = z.infer<typeof foldFitSchema>
