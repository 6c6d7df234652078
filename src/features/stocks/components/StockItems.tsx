import { useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { StockItem } from '#shared/stock/stock-items.contract'
import { EmptyState } from '@/components/EmptyState'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { useUnits } from '@/features/people/useUnits'
import { useFormats } from '@/lib/format/useFormats'
import { stockItemsQuery } from '../api/stock-items.queries'

const column = columnsOf<StockItem>()
const figure = { figure: true, align: 'end' } as const

/** What lies in the shop of a stock: every coil, stack of sheets and drop with its lot. */
export function StockItems({ stockId }: { readonly stockId: string }) {
  const { t } = useTranslation('stock-items')
  const { size, run } = useUnits()
  const { day, count } = useFormats()
  const { data, error, refetch } = useQuery(stockItemsQuery(stockId))
  const columns = useMemo(
    () =>
      column.columns([
        column.accessor(({ kind }) => t(`kind.${kind}`), { id: 'kind', header: t('what') }),
        column.accessor('lot', { header: t('lot'), meta: { figure: true } }),
        column.accessor(({ width }) => size(width), {
          id: 'width',
          header: t('width'),
          meta: figure,
        }),
        column.accessor(({ length }) => run(length), {
          id: 'length',
          header: t('length'),
          meta: figure,
        }),
        column.accessor(({ kind, count: pieces }) => (kind === 'sheet' ? count(pieces) : '–'), {
          id: 'count',
          header: t('count'),
          meta: figure,
        }),
        column.accessor(({ film }) => t(`film.${film}`), { id: 'film', header: t('filmOn') }),
        column.accessor(({ rackMark }) => rackMark ?? '–', {
          id: 'rackMark',
          header: t('rackMark'),
          meta: { figure: true },
        }),
        column.accessor(({ receivedOn }) => day(receivedOn), {
          id: 'receivedOn',
          header: t('received'),
        }),
      ]),
    [t, size, run, day, count],
  )
  return (
    <section className="flex flex-col gap-3">
      <h2 className="text-title font-bold">{t('title')}</h2>
      <DataTable
        caption={t('title')}
        captionHidden
        rows={data?.items}
        columns={columns}
        rowId={({ id }) => id}
        error={error}
        onRetry={() => void refetch()}
        empty={<EmptyState title={t('empty')} hint={t('emptyHint')} />}
      />
    </section>
  )
}
