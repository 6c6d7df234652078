import { queryOptions } from '@tanstack/react-query'
import { getBundle, getRack } from '#shared/bundles/bundles.contract'
import { call } from '@/lib/api/call'

export const rackQuery = () =>
  queryOptions({
    queryKey: ['rack', 'all'],
    queryFn: ({ signal }) => call(getRack, { signal }),
  })

export const bundleQuery = (code: string) =>
  queryOptions({
    queryKey: ['rack', 'bundle', code],
    queryFn: ({ signal }) => call(getBundle, { params: { code }, signal }),
  })
