import { z } from 'zod'
import { endpoint } from '#shared/http/endpoint'
import { pieceStateSchema } from '#shared/pieces/piece-state'

/** What a code on a label stands for, and where it leads. */
export const resolvedCodeSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('piece'),
    code: z.string(),
    state: pieceStateSchema,
    runId: z.uuid(),
    orderId: z.uuid(),
  }),
  z.strictObject({
    kind: z.literal('bundle'),
    code: z.string(),
    bundleId: z.uuid(),
    orderId: z.uuid(),
  }),
  z.strictObject({ kind: z.literal('run'), code: z.string(), runId: z.uuid() }),
  /** What a crew shows at the counter. */
  z.strictObject({ kind: z.literal('slip'), code: z.string(), orderId: z.uuid() }),
])

export const resolveCode = endpoint({
  method: 'GET',
  path: '/codes/:code',
  permission: 'rack.read',
  summary: 'What a typed or scanned code is: a piece, a bundle, a run or a slip.',
  params: z.strictObject({ code: z.string().max(40) }),
  answer: resolvedCodeSchema,
})

export type ResolvedCode = z.infer<typeof resolvedCodeSchema>
