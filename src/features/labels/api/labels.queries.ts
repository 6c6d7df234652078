import { queryOptions } from '@tanstack/react-query'
import { listLabelPrints } from '#shared/labels/labels.contract'
import { call } from '@/lib/api/call'

/** When labels of a piece were printed, newest first. */
export const labelPrintsQuery = (code: string) =>
  queryOptions({
    queryKey: ['pieces', 'label-prints', code],
    queryFn: ({ signal }) => call(listLabelPrints, { params: { code }, signal }),
  })
