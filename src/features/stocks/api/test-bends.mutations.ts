import { useQueryClient } from '@tanstack/react-query'
import type { AnswerOf } from '#shared/http/endpoint'
import type { FoldFit, listTestBends, TestBendInput } from '#shared/stock/stock.contract'
import { calibrateStock, recordTestBend, withdrawTestBend } from '#shared/stock/stock.contract'
import { call } from '@/lib/api/call'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'
import { testBendsQuery } from './test-bends.queries'

/** What a brake is to be reckoned with; `fit: null` goes back to the stock's own K. */
export interface Calibrating {
  readonly brakeId: string
  readonly fit: Pick<FoldFit, 'kFactor' | 'insideRadius'> | null
}

function useStoreBends(stockId: string) {
  const client = useQueryClient()
  return async (answer: AnswerOf<typeof listTestBends>) => {
    client.setQueryData(testBendsQuery(stockId).queryKey, answer)
    await client.invalidateQueries({ queryKey: ['stocks', 'list'] })
    await client.invalidateQueries({ queryKey: ['plans'] })
  }
}

export function useRecordTestBend(stockId: string) {
  return useIdempotentMutation({
    send: (body: TestBendInput, idempotencyKey) =>
      call(recordTestBend, { params: { stockId }, body, idempotencyKey }),
    onSuccess: useStoreBends(stockId),
  })
}

export function useWithdrawTestBend(stockId: string) {
  return useIdempotentMutation({
    send: ({ bendId, reason }: { bendId: string; reason: string }, idempotencyKey) =>
      call(withdrawTestBend, { params: { stockId, bendId }, body: { reason }, idempotencyKey }),
    oneKeyPer: ({ bendId }) => bendId,
    onSuccess: useStoreBends(stockId),
  })
}

export function useCalibrateStock(stockId: string) {
  return useIdempotentMutation({
    send: (body: Calibrating, idempotencyKey) =>
      call(calibrateStock, { params: { stockId }, body, idempotencyKey }),
    oneKeyPer: ({ brakeId }) => brakeId,
    onSuccess: useStoreBends(stockId),
  })
}
