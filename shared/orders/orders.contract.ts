import { z } from 'zod'
import { endpoint } from '#shared/http/endpoint'
import { idParams, textField } from '#shared/http/fields'
import { pageOf, pageQuery } from '#shared/http/paging'
import {
  orderInputSchema,
  orderSchema,
  orderStateSchema,
  orderSummarySchema,
} from '#shared/orders/order.schema'
import { overrideInputSchema } from '#shared/orders/override.schema'

const params = idParams('orderId')
/** The version the person saw; an older one is answered with `changed-meanwhile`. */
const version = z.int()

export const listOrders = endpoint({
  method: 'GET',
  path: '/orders',
  permission: 'orders.read',
  summary: 'Orders, newest first; a crew lead sees those of the own company.',
  query: z.strictObject({
    ...pageQuery,
    /** One state or several, separated by commas. */
    states: z
      .string()
      .transform((text) => text.split(','))
      .pipe(z.array(orderStateSchema))
      .optional(),
    jobId: z.uuid().optional(),
    /** Order number, company, job, person or purchase-order number. */
    search: z.string().trim().max(80).optional(),
  }),
  answer: pageOf(orderSummarySchema),
})

export const getOrder = endpoint({
  method: 'GET',
  path: '/orders/:orderId',
  permission: 'orders.read',
  summary: 'One order with its drawings, pieces and events.',
  params,
  answer: orderSchema,
})

export const submitOrder = endpoint({
  method: 'POST',
  path: '/orders',
  permission: 'orders.submit',
  summary: 'Submit an order. Sent again with the same key it is the same order.',
  body: z.strictObject({ ...orderInputSchema.shape, jobId: z.uuid() }),
  answer: orderSchema,
  success: 201,
  idempotent: true,
})

export const amendOrder = endpoint({
  method: 'PUT',
  path: '/orders/:orderId',
  permission: 'orders.amend',
  summary: 'Amend an order that is not released; answers an open question and submits it again.',
  params,
  body: z.strictObject({
    ...orderInputSchema.shape,
    version,
    answer: z.string().trim().max(1000).optional(),
  }),
  answer: orderSchema,
  idempotent: true,
})

export const askAboutOrder = endpoint({
  method: 'POST',
  path: '/orders/:orderId/questions',
  permission: 'orders.ask',
  summary: 'Send an order back to the crew with a question.',
  params,
  body: z.strictObject({ version, text: textField(1000) }),
  answer: orderSchema,
  idempotent: true,
})

export const answerQuestion = endpoint({
  method: 'POST',
  path: '/orders/:orderId/answers',
  permission: 'orders.amend',
  summary: 'Answer the open question without changing the order; submits it again.',
  params,
  body: z.strictObject({ version, text: textField(1000) }),
  answer: orderSchema,
  idempotent: true,
})

export const releaseOrder = endpoint({
  method: 'POST',
  path: '/orders/:orderId/release',
  permission: 'orders.release',
  summary: 'Release an order: its pieces and runs come into being, frozen as drawn.',
  params,
  body: z.strictObject({
    version,
    /** For lines that no brake bends, and only for them: the brake all the same, and why. */
    overrides: z.array(overrideInputSchema).max(50).default([]),
  }),
  answer: orderSchema,
  idempotent: true,
})

export const withdrawOrder = endpoint({
  method: 'POST',
  path: '/orders/:orderId/withdrawal',
  permission: 'orders.withdraw',
  summary: 'Withdraw an order that is not released.',
  params,
  body: z.strictObject({ version, reason: textField(400) }),
  answer: orderSchema,
  idempotent: true,
})
