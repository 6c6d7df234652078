import { z } from 'zod'
import { brakeSchema } from '#shared/bend-plan/brake.schema'
import { endpoint } from '#shared/http/endpoint'

export const shopBrakeSchema = z.strictObject({
  id: z.uuid(),
  position: z.int(),
  brake: brakeSchema,
})

export const listBrakes = endpoint({
  method: 'GET',
  path: '/brakes',
  permission: 'brakes.read',
  summary: "The shop's brakes, in the shop's order.",
  answer: z.strictObject({ items: z.array(shopBrakeSchema) }),
})

export type ShopBrake = z.infer<typeof shopBrakeSchema>
