import { FlexRender, type Row, type RowData } from '@tanstack/react-table'
import { Link } from 'react-router-dom'
import { moveBetweenRows } from '@/components/table/row-keys'
import type { TableFeatures } from '@/components/table/table-features'

interface Props<Data extends RowData> {
  readonly row: Row<TableFeatures, Data>
  readonly to: string | undefined
}

export function TableRow<Data extends RowData>({ row, to }: Props<Data>) {
  return (
    <tr data-linked={to !== undefined}>
      {row.getAllCells().map((cell, index) => {
        const { header, meta } = cell.column.columnDef
        const content = <FlexRender cell={cell} />
        return (
          <td
            key={cell.id}
            data-label={typeof header === 'string' && header !== '' ? header : undefined}
            data-figure={meta?.figure}
            data-align={meta?.align}
          >
            {index === 0 && to !== undefined ? (
              <Link to={to} data-row-link className="font-semibold" onKeyDown={moveBetweenRows}>
                {content}
              </Link>
            ) : (
              content
            )}
          </td>
        )
      })}
    </tr>
  )
}
