import { useQuery } from '@tanstack/react-query'
import { brakesQuery } from '@/features/brakes/api/brakes.queries'
import { stocksQuery } from '@/features/stocks/api/stocks.queries'
import type { LineGround } from './check-line'

interface Asked {
  /** Undefined while it is read or where it could not be. */
  readonly ground: Omit<LineGround, 'pitchRise'> | undefined
  readonly error: Error | null
  readonly retry: () => void
}

/** The stocks and brakes that lines are checked against. */
export function useOrderGround(): Asked {
  const stocks = useQuery(stocksQuery())
  const brakes = useQuery(brakesQuery())
  return {
    ground:
      stocks.data && brakes.data
        ? { stocks: stocks.data.items, brakes: brakes.data.items }
        : undefined,
    error: (stocks.data ? null : stocks.error) ?? (brakes.data ? null : brakes.error),
    retry: () => {
      void stocks.refetch()
      void brakes.refetch()
    },
  }
}
