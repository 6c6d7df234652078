import { QueryClient } from '@tanstack/react-query'
import { retryDelay, retryRead } from '@/lib/api/retry'

/** Live events say when something is stale; the time here is for what they might have missed. */
export const createQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: { staleTime: 30_000, retry: retryRead, retryDelay },
      mutations: { retry: false },
    },
  })
