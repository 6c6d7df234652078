import { queryOptions } from '@tanstack/react-query'
import { getHandOffSheet } from '#shared/hand-off/hand-off.contract'
import { call } from '@/lib/api/call'

/** Kept under `rack`: whatever moves on the rack changes what can be handed over. */
export const handOffQuery = (orderId: string) =>
  queryOptions({
    queryKey: ['rack', 'hand-off', orderId],
    queryFn: ({ signal }) => call(getHandOffSheet, { params: { orderId }, signal }),
  })
