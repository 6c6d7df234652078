import { queryOptions } from '@tanstack/react-query'
import { resolveCode } from '#shared/pieces/lookup.contract'
import { getPiece } from '#shared/pieces/pieces.contract'
import { call } from '@/lib/api/call'

export const pieceQuery = (code: string) =>
  queryOptions({
    queryKey: ['pieces', 'one', code],
    queryFn: ({ signal }) => call(getPiece, { params: { code }, signal }),
  })

/** What a typed or scanned code is; asked anew at every scan. */
export const codeQuery = (code: string) =>
  queryOptions({
    queryKey: ['pieces', 'code', code],
    queryFn: ({ signal }) => call(resolveCode, { params: { code }, signal }),
    staleTime: 0,
  })
