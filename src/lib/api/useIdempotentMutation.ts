import { useMutation, type UseMutationOptions, type UseMutationResult } from '@tanstack/react-query'
import { useRef } from 'react'
import { ApiProblem } from '@/lib/api/api-errors'
import { newKey } from '@/lib/api/idempotency'
import { retryChange, retryDelay } from '@/lib/api/retry'

interface IdempotentOptions<Answer, Variables> extends Omit<
  UseMutationOptions<Answer, Error, Variables>,
  'mutationFn' | 'retry' | 'retryDelay'
> {
  /** Sends the change with the key it is given. */
  readonly send: (variables: Variables, idempotencyKey: string) => Promise<Answer>
  /**
   * What one key stands for. Absent: one key for the form until it succeeds, so an order whose
   * answer was lost is never made twice, even if it was edited meanwhile. A scanner names the code
   * scanned, so that two scans in flight have a key each.
   */
  readonly oneKeyPer?: (variables: Variables) => string
}

/**
 * A change that is made once, however often it is sent. Its key is made at the first press and kept
 * across retries (automatic ones after a failing network, and the person's own) until the server
 * has answered: with success, or with a refusal, after which nothing was made.
 *
 *     const submit = useIdempotentMutation({
 *       send: (body: OrderBody, idempotencyKey) => call(submitOrder, { body, idempotencyKey }),
 *       onSuccess: () => queryClient.invalidateQueries({ queryKey: ['orders'] }),
 *     })
 */
export function useIdempotentMutation<Answer, Variables = void>({
  send,
  oneKeyPer,
  ...options
}: IdempotentOptions<Answer, Variables>): UseMutationResult<Answer, Error, Variables> {
  const keys = useRef(new Map<string, string>())

  return useMutation<Answer, Error, Variables>({
    ...options,
    mutationFn: async (variables) => {
      const name = oneKeyPer?.(variables) ?? ''
      const key = keys.current.get(name) ?? newKey()
      keys.current.set(name, key)
      try {
        const answer = await send(variables, key)
        keys.current.delete(name)
        return answer
      } catch (error) {
        if (error instanceof ApiProblem && error.refused) keys.current.delete(name)
        throw error
      }
    },
    retry: retryChange,
    retryDelay,
  })
}
