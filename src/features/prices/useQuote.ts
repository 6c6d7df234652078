import { useQuery } from '@tanstack/react-query'
import { useCallback } from 'react'
import { quoteLine, type LineQuote } from '#shared/pricing/line-quote'
import type { LineToPrice } from '#shared/pricing/price-line'
import { useMay } from '@/features/people/person-context'
import { priceBookQuery } from './api/price-book.queries'

/** Gives null for a line that cannot be priced yet, and for all as long as the book is not read. */
export type Quote = (line: LineToPrice | null) => LineQuote | null

/**
 * Prices lines by the newest book with the server's own code, as fast as they are drawn. What an
 * order costs is the server's to say.
 */
export function useQuote(): Quote {
  const mayRead = useMay('prices.read')
  const { data } = useQuery({ ...priceBookQuery(), enabled: mayRead })
  return useCallback(
    (line) => (line && data ? quoteLine(line, data.current?.book ?? null) : null),
    [data],
  )
}
