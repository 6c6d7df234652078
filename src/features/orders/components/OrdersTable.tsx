import { useMemo, type ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { orderNumber, type OrderSummary } from '#shared/orders/order.schema'
import { DataTable, type TablePaging } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { useFormats } from '@/lib/format/useFormats'
import { NeededBy } from './NeededBy'
import { OrderStateWord } from './OrderStateWord'

interface Props {
  readonly caption: string
  readonly captionHidden?: boolean
  readonly orders: readonly OrderSummary[] | undefined
  readonly orderPath: (orderId: string) => string
  readonly empty: ReactNode
  readonly error?: Error | null
  readonly onRetry?: () => void
  readonly paging?: TablePaging
}

const column = columnsOf<OrderSummary>()

/** Orders as the shop's people look them up: by number, whose, for which roof, when and how far. */
export function OrdersTable({ orders, orderPath, ...table }: Props) {
  const { t } = useTranslation('order-table')
  const { count } = useFormats()
  const columns = useMemo(
    () =>
      column.columns([
        column.display({
          id: 'number',
          header: t('number'),
          cell: ({ row }) => orderNumber(row.original.number),
          meta: { figure: true },
        }),
        column.accessor(({ company }) => company.name, { id: 'company', header: t('company') }),
        column.accessor(({ job }) => job.name, { id: 'job', header: t('job') }),
        column.accessor('orderedBy', { header: t('orderedBy') }),
        column.accessor('poNumber', { header: t('poNumber'), meta: { figure: true } }),
        column.display({
          id: 'neededBy',
          header: t('neededBy'),
          cell: ({ row }) => <NeededBy order={row.original} />,
        }),
        column.accessor(({ pieceCount }) => count(pieceCount), {
          id: 'pieces',
          header: t('pieces'),
          meta: { figure: true, align: 'end' },
        }),
        column.display({
          id: 'state',
          header: t('state'),
          cell: ({ row }) => <OrderStateWord state={row.original.state} />,
        }),
      ]),
    [t, count],
  )
  return (
    <DataTable
      {...table}
      rows={orders}
      columns={columns}
      rowId={({ id }) => id}
      rowLink={({ id }) => orderPath(id)}
    />
  )
}
