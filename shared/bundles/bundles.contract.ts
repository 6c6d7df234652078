import { z } from 'zod'
import { sideSchema } from '#shared/ends/end.schema'
import { endpoint } from '#shared/http/endpoint'
import { daySchema, idParams, momentSchema, textField } from '#shared/http/fields'
import { pieceStateSchema } from '#shared/pieces/piece-state'

/** Where a bundle lies: the shop's own name of a rack bay or floor spot, `R3`, `F1`. */
export const rackPlaceSchema = z
  .string()
  .trim()
  .toUpperCase()
  .regex(/^[A-Z]{1,2}[0-9]{1,2}$/, 'Type a letter and a number, such as R3 or F1.')

export const bundlePieceSchema = z.strictObject({
  code: z.string(),
  mark: z.string(),
  name: z.string(),
  sequence: z.int(),
  /** L or R; null where the line has no hands. */
  hand: sideSchema.nullable(),
  length: z.number(),
  weight: z.number(),
  state: pieceStateSchema,
})

export const bundleSchema = z.strictObject({
  id: z.uuid(),
  code: z.string(),
  /** Within its order: shown as B1, B2… */
  number: z.int(),
  orderId: z.uuid(),
  orderNumber: z.int(),
  company: z.string(),
  job: z.string(),
  rackPlace: z.string(),
  pieces: z.array(bundlePieceSchema),
  /** Derived from its pieces: pounds, inches. */
  weight: z.number(),
  longest: z.number(),
  createdAt: momentSchema,
  by: z.string(),
  /** When it left; null while it lies on the rack. */
  pickedUpAt: momentSchema.nullable(),
})

/** What of an order can be bundled now. */
export const bundleWorkSchema = z.strictObject({
  orderId: z.uuid(),
  orderNumber: z.int(),
  company: z.string(),
  job: z.string(),
  neededBy: daySchema,
  /** Bent pieces that lie loose. */
  loose: z.array(bundlePieceSchema),
  /** Pieces still queued at the brake. */
  queued: z.int(),
})

export const getRack = endpoint({
  method: 'GET',
  path: '/rack',
  permission: 'rack.read',
  summary: 'Bent pieces waiting to be bundled, by order, and the bundles that lie on the rack.',
  answer: z.strictObject({ work: z.array(bundleWorkSchema), bundles: z.array(bundleSchema) }),
})

export const getBundle = endpoint({
  method: 'GET',
  path: '/bundles/:code',
  permission: 'rack.read',
  summary: 'One bundle by the code on its label.',
  params: z.strictObject({ code: z.string().max(40) }),
  answer: bundleSchema,
})

export const createBundle = endpoint({
  method: 'POST',
  path: '/bundles',
  permission: 'bundles.write',
  summary: 'Strap bent pieces of one order into a bundle with a place on the rack.',
  body: z.strictObject({
    orderId: z.uuid(),
    pieceCodes: z.array(z.string().max(40)).min(1, 'A bundle needs at least one piece.').max(500),
    rackPlace: rackPlaceSchema,
  }),
  answer: bundleSchema,
  success: 201,
  idempotent: true,
})

export const moveBundle = endpoint({
  method: 'PATCH',
  path: '/bundles/:bundleId',
  permission: 'bundles.write',
  summary: 'Give a bundle another place on the rack.',
  params: idParams('bundleId'),
  body: z.strictObject({ rackPlace: rackPlaceSchema }),
  answer: bundleSchema,
})

export const openBundle = endpoint({
  method: 'POST',
  path: '/bundles/:bundleId/opened',
  permission: 'bundles.write',
  summary: 'Take pieces out of a bundle again (all, or those named); they are bent and loose.',
  params: idParams('bundleId'),
  body: z.strictObject({
    pieceCodes: z.array(z.string().max(40)).min(1).max(500).optional(),
    reason: textField(400),
  }),
  answer: bundleSchema,
  idempotent: true,
})

export type Bundle = z.infer<typeof bundleSchema>
export type BundlePiece = z.infer<typeof bundlePieceSchema>
export type BundleWork = z.infer<typeof bundleWorkSchema>
