import { z } from 'zod'
import { planSchema } from '#shared/bend-plan/plan.schema'
import { brakeSchema } from '#shared/bend-plan/brake.schema'
import { handsSchema, pieceEndsSchema, sideSchema } from '#shared/ends/end.schema'
import { endpoint } from '#shared/http/endpoint'
import { daySchema, idParams, momentSchema } from '#shared/http/fields'
import { progressSchema } from '#shared/orders/order.schema'
import { overrideSchema } from '#shared/orders/override.schema'
import { pieceStateSchema } from '#shared/pieces/piece-state'
import { profileSchema } from '#shared/profile/profile.schema'
import { stockSchema } from '#shared/stock/stock.schema'
import { stripSchema } from '#shared/strip/strip.schema'

/** Lengths of a run with how many pieces of each. */
const lengthCountSchema = z.strictObject({ length: z.number(), count: z.int() })

/** Pieces that share profile, stock and brake, bent one after another. */
export const runSummarySchema = z.strictObject({
  id: z.uuid(),
  number: z.int(),
  code: z.string(),
  name: z.string(),
  profile: profileSchema,
  stock: stockSchema,
  strip: stripSchema,
  brakeId: z.uuid(),
  brakeName: z.string(),
  company: z.string(),
  job: z.string(),
  orderNumber: z.int(),
  /** The earliest day one of its pieces is needed. */
  neededBy: daySchema,
  lengths: z.array(lengthCountSchema),
  progress: progressSchema,
  /**
   * Whether it is still to be bent and of the stock that its brake bent last, in another run: that
   * metal and its settings are at hand.
   */
  sameStock: z.boolean(),
  /** Set where the plan has no steps and somebody released it all the same. */
  override: overrideSchema.nullable(),
  /** Who bends it now; null when nobody took it. */
  claimedBy: z.strictObject({ id: z.uuid(), name: z.string(), at: momentSchema }).nullable(),
})

export const runPieceSchema = z.strictObject({
  code: z.string(),
  lineId: z.uuid(),
  mark: z.string(),
  hand: sideSchema.nullable(),
  lowEnd: sideSchema.nullable(),
  sequence: z.int(),
  quantity: z.int(),
  length: z.number(),
  weight: z.number(),
  state: pieceStateSchema,
  since: momentSchema,
  by: z.string(),
  lastEventId: z.int(),
})

/** A line of the order as the brake needs it: whose strips look alike. */
export const runLineSchema = z.strictObject({
  id: z.uuid(),
  mark: z.string(),
  name: z.string(),
  length: z.number(),
  quantity: z.int(),
  ends: pieceEndsSchema.nullable(),
  hands: handsSchema.nullable(),
})

export const runSchema = z.strictObject({
  ...runSummarySchema.shape,
  plan: planSchema,
  brake: brakeSchema,
  lines: z.array(runLineSchema),
  pieces: z.array(runPieceSchema),
})

const params = idParams('runId')

export const listRuns = endpoint({
  method: 'GET',
  path: '/runs',
  permission: 'runs.read',
  summary: 'Runs by the day they are needed; open ones have queued pieces.',
  query: z.strictObject({ state: z.enum(['open', 'done']).default('open') }),
  answer: z.strictObject({ items: z.array(runSummarySchema) }),
})

export const getRun = endpoint({
  method: 'GET',
  path: '/runs/:runId',
  permission: 'runs.read',
  summary: 'One run with its strip, bend plan, brake and pieces.',
  params,
  answer: runSchema,
})

export const claimRun = endpoint({
  method: 'POST',
  path: '/runs/:runId/claim',
  permission: 'runs.claim',
  summary: 'Take a run. Of two who press at once one gets it and the other is told who.',
  params,
  body: z.strictObject({}),
  answer: runSchema,
  idempotent: true,
})

export const leaveRun = endpoint({
  method: 'POST',
  path: '/runs/:runId/leave',
  permission: 'runs.claim',
  summary: 'Give a run back to the queue.',
  params,
  body: z.strictObject({}),
  answer: runSchema,
  idempotent: true,
})

export const bendCount = endpoint({
  method: 'POST',
  path: '/runs/:runId/bent',
  permission: 'pieces.bend',
  summary: 'Mark the next so many queued pieces of a run bent: one event a piece, all or none.',
  params,
  body: z.strictObject({
    count: z.int().min(1).max(500),
    /** Only pieces of this length; absent: in the order of the run. */
    length: z.number().optional(),
  }),
  answer: z.strictObject({ run: runSchema, eventIds: z.array(z.int()) }),
  idempotent: true,
})

export type RunSummary = z.infer<typeof runSummarySchema>
export type RunPiece = z.infer<typeof runPieceSchema>
export type RunLine = z.infer<typeof runLineSchema>
export type Run = z.infer<typeof runSchema>
