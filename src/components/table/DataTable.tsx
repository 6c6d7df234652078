import { useTable, type RowData } from '@tanstack/react-table'
import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { TABLE_FEATURES, type Column } from '@/components/table/table-features'
import { TableRow } from '@/components/table/TableRow'

export interface TablePaging {
  readonly hasMore: boolean
  readonly loading: boolean
  readonly onMore: () => void
}

interface Props<Row extends RowData> {
  /** What the table lists; shown above it unless `captionHidden`. */
  readonly caption: string
  readonly captionHidden?: boolean
  /** Undefined until the first answer; keep the array between renders. */
  readonly rows: readonly Row[] | undefined
  readonly columns: Column<Row>[]
  readonly rowId: (row: Row) => string
  /** Where a row leads; its first cell becomes the link. */
  readonly rowLink?: (row: Row) => string
  readonly error?: Error | null
  readonly onRetry?: () => void
  /** What is said when there are no rows: usually an EmptyState. */
  readonly empty: ReactNode
  readonly paging?: TablePaging
}

const NONE: never[] = []

/**
 * The one table of the product: it owns loading, empty, error and "more". With `rowLink` the arrow
 * keys, Home and End go from row to row.
 */
export function DataTable<Row extends RowData>({
  caption,
  captionHidden = false,
  rows,
  columns,
  rowId,
  rowLink,
  error,
  onRetry,
  empty,
  paging,
}: Props<Row>) {
  const { t } = useTranslation('components')
  const table = useTable({
    features: TABLE_FEATURES,
    columns,
    data: rows ?? NONE,
    getRowId: rowId,
  })

  if (!rows) {
    return error ? <ErrorState error={error} onRetry={onRetry} /> : <LoadingState />
  }
  if (rows.length === 0 && !paging?.hasMore) return empty

  return (
    <div>
      <table className="data-table">
        <caption className={captionHidden ? 'sr-only' : ''}>{caption}</caption>
        <thead>
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id}>
              {group.headers.map((header) => (
                <th key={header.id} scope="col" data-align={header.column.columnDef.meta?.align}>
                  {header.isPlaceholder ? null : <table.FlexRender header={header} />}
                </th>
              ))}
            </tr>
          ))}
        </thead>
        <tbody>
          {table.getRowModel().rows.map((row) => (
            <TableRow key={row.id} row={row} to={rowLink?.(row.original)} />
          ))}
        </tbody>
      </table>
      {error && <ErrorState error={error} onRetry={onRetry} />}
      {paging?.hasMore && (
        <Button className="mt-4" pending={paging.loading} onClick={paging.onMore}>
          {t('table.more')}
        </Button>
      )}
    </div>
  )
}
