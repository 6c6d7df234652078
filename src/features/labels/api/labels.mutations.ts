import { useQueryClient } from '@tanstack/react-query'
import { labelsPdf, printLabels, type LabelPrint } from '#shared/labels/labels.contract'
import type { BodyInputOf } from '#shared/http/endpoint'
import { call } from '@/lib/api/call'
import { fileHref } from '@/lib/api/file-href'
import { useIdempotentMutation } from '@/lib/api/useIdempotentMutation'

/**
 * Writes down a print of labels; `labelsHref` of its answer is the PDF. Each wish has a key of its
 * own, so that the labels of two pieces can be asked for at once.
 *
 *     const print = usePrintLabels()
 *     print.mutate({ of: { kind: 'run', runId } }, { onSuccess: (made) => open(labelsHref(made)) })
 */
export function usePrintLabels() {
  const client = useQueryClient()
  return useIdempotentMutation({
    send: (body: BodyInputOf<typeof printLabels>, idempotencyKey) =>
      call(printLabels, { body, idempotencyKey }),
    oneKeyPer: (body) => JSON.stringify(body),
    onSuccess: () => client.invalidateQueries({ queryKey: ['pieces', 'label-prints'] }),
  })
}

/** Where the labels of a print lie, for a link that opens in a new tab. */
export const labelsHref = ({ id }: Pick<LabelPrint, 'id'>): string =>
  fileHref(labelsPdf, { params: { printId: id } })
