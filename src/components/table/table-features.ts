import {
  createColumnHelper,
  tableFeatures,
  type ColumnDef,
  type RowData,
} from '@tanstack/react-table'

/** How a column stands: figures are set in the mono face and line up at their end. */
export interface ColumnLook {
  readonly figure?: boolean
  readonly align?: 'start' | 'end'
}

const columnLook: ColumnLook = {}

/** Filtering, sorting and paging are the server's: the table needs rows and columns alone. */
export const TABLE_FEATURES = tableFeatures({ columnMeta: columnLook })

export type TableFeatures = typeof TABLE_FEATURES

export type Column<Row extends RowData> = ColumnDef<TableFeatures, Row>

/**
 * Columns of a table, typed by its rows.
 *
 *     const column = columnsOf<Job>()
 *     const columns = column.columns([
 *       column.accessor('name', { header: t('job') }),
 *       column.accessor('orderCount', { header: t('orders'), meta: { figure: true, align: 'end' } }),
 *     ])
 */
export const columnsOf = <Row extends RowData>() => createColumnHelper<TableFeatures, Row>()
