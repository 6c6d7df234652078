import { QueryClient } from '@tanstack/react-query'
import { retryChange, retryDelay, retryRead } from '@/lib/api/retry'

/** Live events say when something is stale; the time here is for what they might have missed. */
export const createQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: { staleTime: 30_000, retry: retryRead, retryDelay },
      // What makes or moves something goes through useIdempotentMutation; all else may be repeated.
      mutations: { retry: retryChange, retryDelay },
    },
  })
