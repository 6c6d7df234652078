import { useQuery } from '@tanstack/react-query'
import { useMemo, type ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { orderNumber, type OrderSummary } from '#shared/orders/order.schema'
import { DataTable, type TablePaging } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { NeededBy } from '@/features/orders/components/NeededBy'
import { OrderStateWord } from '@/features/orders/components/OrderStateWord'
import { PieceProgress } from '@/features/orders/components/PieceProgress'
import { rackQuery } from '@/features/rack/api/rack.queries'
import { bundleMark } from '@/features/rack/bundle-words'

interface Props {
  readonly orders: readonly OrderSummary[] | undefined
  readonly orderPath: (orderId: string) => string
  readonly empty: ReactNode
  readonly error: Error | null
  readonly onRetry: () => void
  readonly paging?: TablePaging
}

const column = columnsOf<OrderSummary>()

/** Orders that somebody may come for: how far they are, and which bundles lie where. */
export function HandOffOrders({ orders, orderPath, ...table }: Props) {
  const { t } = useTranslation('hand-off')
  const { data: rack } = useQuery(rackQuery())
  const columns = useMemo(
    () =>
      column.columns([
        column.display({
          id: 'number',
          header: t('list.order'),
          cell: ({ row }) => orderNumber(row.original.number),
          meta: { figure: true },
        }),
        column.display({
          id: 'company',
          header: t('list.company'),
          cell: ({ row: { original } }) => (
            <>
              {original.company.name}
              <span className="block text-small text-scribe">
                {t('orderOf', { job: original.job.name, name: original.orderedBy })}
              </span>
            </>
          ),
        }),
        column.display({
          id: 'neededBy',
          header: t('list.neededBy'),
          cell: ({ row }) => <NeededBy order={row.original} />,
        }),
        column.display({
          id: 'state',
          header: t('list.state'),
          cell: ({ row }) => <OrderStateWord state={row.original.state} />,
        }),
        column.display({
          id: 'progress',
          header: t('list.pieces'),
          cell: ({ row }) => <PieceProgress progress={row.original.progress} />,
        }),
        column.display({
          id: 'bundles',
          header: t('list.bundles'),
          cell: ({ row }) => (
            <ul className="flex flex-wrap gap-x-4 font-figure">
              {rack?.bundles
                .filter(({ orderId }) => orderId === row.original.id)
                .map((bundle) => (
                  <li key={bundle.code} className="whitespace-nowrap">
                    <span className="font-bold">{bundleMark(bundle)}</span> {bundle.rackPlace}
                  </li>
                ))}
            </ul>
          ),
        }),
      ]),
    [t, rack],
  )
  return (
    <DataTable
      {...table}
      caption={t('list.caption')}
      captionHidden
      rows={orders}
      columns={columns}
      rowId={({ id }) => id}
      rowLink={({ id }) => orderPath(id)}
    />
  )
}
