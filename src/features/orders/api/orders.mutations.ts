import { useQueryClient } from '@tanstack/react-query'
import type { BodyInputOf } from '#shared/http/endpoint'
import type { Order } from '#shared/orders/order.schema'
import {
  answerQuestion,
  askAboutOrder,
  releaseOrder,
  withdrawOrder,
} from '#shared/orders/orders.contract'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'
import { orderQuery } from './orders.queries'

/**
 * Submitting and amending go through the drafts (`draft/useDelivery.ts`), which keep their key.
 * The answer of every change is the order as it now is; lists and the floor are read anew.
 */
export function useStoreOrder() {
  const client = useQueryClient()
  return async (order: Order) => {
    client.setQueryData(orderQuery(order.id).queryKey, order)
    await Promise.all([
      client.invalidateQueries({ queryKey: ['orders', 'list'] }),
      client.invalidateQueries({ queryKey: ['runs'] }),
      client.invalidateQueries({ queryKey: ['jobs'] }),
    ])
  }
}

/** After a refusal because somebody was faster, what is shown is what is there now. */
function useRereadOrder(orderId: string) {
  const client = useQueryClient()
  return () => client.invalidateQueries({ queryKey: orderQuery(orderId).queryKey })
}

export function useAskAboutOrder(orderId: string) {
  return useIdempotentMutation({
    send: (body: BodyInputOf<typeof askAboutOrder>, idempotencyKey) =>
      call(askAboutOrder, { params: { orderId }, body, idempotencyKey }),
    onSuccess: useStoreOrder(),
    onError: useRereadOrder(orderId),
  })
}

export function useAnswerQuestion(orderId: string) {
  return useIdempotentMutation({
    send: (body: BodyInputOf<typeof answerQuestion>, idempotencyKey) =>
      call(answerQuestion, { params: { orderId }, body, idempotencyKey }),
    onSuccess: useStoreOrder(),
    onError: useRereadOrder(orderId),
  })
}

export function useReleaseOrder(orderId: string) {
  return useIdempotentMutation({
    send: (body: BodyInputOf<typeof releaseOrder>, idempotencyKey) =>
      call(releaseOrder, { params: { orderId }, body, idempotencyKey }),
    onSuccess: useStoreOrder(),
    onError: useRereadOrder(orderId),
  })
}

export function useWithdrawOrder(orderId: string) {
  return useIdempotentMutation({
    send: (body: BodyInputOf<typeof withdrawOrder>, idempotencyKey) =>
      call(withdrawOrder, { params: { orderId }, body, idempotencyKey }),
    onSuccess: useStoreOrder(),
    onError: useRereadOrder(orderId),
  })
}
