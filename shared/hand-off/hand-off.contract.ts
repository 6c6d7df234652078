import { z } from 'zod'
import { bundleSchema } from '#shared/bundles/bundles.contract'
import { endpoint } from '#shared/http/endpoint'
import { idParams, momentSchema, textField } from '#shared/http/fields'
import { orderSummarySchema } from '#shared/orders/order.schema'

/** A signature as strokes of points in a box 0…1000 wide and 0…400 high. */
export const signatureSchema = z
  .array(
    z
      .array(z.tuple([z.number().min(0).max(1000), z.number().min(0).max(400)]))
      .min(1)
      .max(500),
  )
  .max(60)

export const handOffSchema = z.strictObject({
  id: z.uuid(),
  at: momentSchema,
  receivedBy: z.string(),
  handedBy: z.string(),
  bundleCodes: z.array(z.string()),
  signature: signatureSchema,
})

/** All that the counter must see to hand an order over and leave nothing behind. */
export const handOffSheetSchema = z.strictObject({
  order: orderSummarySchema,
  bundles: z.array(bundleSchema),
  /** Bent pieces not bundled yet. */
  looseCount: z.int(),
  handOffs: z.array(handOffSchema),
})

const params = idParams('orderId')

export const getHandOffSheet = endpoint({
  method: 'GET',
  path: '/orders/:orderId/hand-off',
  permission: 'rack.read',
  summary: 'What of an order lies where, what is still missing and what has gone.',
  params,
  answer: handOffSheetSchema,
})

export const handOff = endpoint({
  method: 'POST',
  path: '/orders/:orderId/hand-off',
  permission: 'bundles.handOff',
  summary: 'Hand bundles over to a person: their pieces are picked up, all or none.',
  params,
  body: z.strictObject({
    bundleCodes: z.array(z.string().max(40)).min(1, 'Scan at least one bundle.').max(100),
    receivedBy: textField(80),
    signature: signatureSchema,
  }),
  answer: handOffSheetSchema,
  success: 201,
  idempotent: true,
})

export const returnBundle = endpoint({
  method: 'POST',
  path: '/bundles/:bundleId/returned',
  permission: 'bundles.handOff',
  summary: 'Take a handed-over bundle back onto the rack.',
  params: idParams('bundleId'),
  body: z.strictObject({ reason: textField(400) }),
  answer: handOffSheetSchema,
  idempotent: true,
})

export type Signature = z.infer<typeof signatureSchema>
export type HandOff = z.infer<typeof handOffSchema>
export type HandOffSheet = z.infer<typeof handOffSheetSchema>
