import type { Pdf } from '#server/adapters/pdf/pdf'
import type { PdfFont } from '#server/adapters/pdf/pdf-fonts'
import { drawText } from '#server/adapters/pdf/pdf-text'

export interface TableColumn {
  readonly title: string
  /** Points. */
  readonly width: number
  readonly align: 'left' | 'right'
  readonly font: PdfFont
}

export interface TableStyle {
  readonly size: number
  readonly rowHeight: number
  readonly ink: string
  readonly quiet: string
  readonly rule: string
}

/** Room between a cell's text and its borders, points. */
const PADDING = 4

export const heightOfTable = (rows: number, { rowHeight }: TableStyle): number =>
  (rows + 1) * rowHeight

/**
 * Draws a table with its upper left corner at `at`: a line of titles, then the rows, a hairline below
 * each. The first cell of a row is its heading.
 */
export function drawTable(
  pdf: Pdf,
  columns: readonly TableColumn[],
  rows: readonly (readonly string[])[],
  style: TableStyle,
  at: { readonly x: number; readonly y: number },
): void {
  const width = columns.reduce((sum, column) => sum + column.width, 0)
  const line = (cells: readonly string[], row: number, isHead: boolean) =>
    pdf.group('TR', () => {
      let { x } = at
      for (const [index, column] of columns.entries()) {
        const cell = { x, y: at.y + row * style.rowHeight, width: column.width }
        const role = isHead || index === 0 ? 'TH' : 'TD'
        pdf.element(role, () => drawCell(pdf, cells[index] ?? '', column, style, cell, isHead))
        x += column.width
      }
    })
  pdf.group('Table', () => {
    line(
      columns.map((column) => column.title),
      0,
      true,
    )
    for (const [index, row] of rows.entries()) line(row, index + 1, false)
  })
  pdf.artifact(() => {
    for (let row = 1; row <= rows.length + 1; row += 1) {
      const y = at.y + row * style.rowHeight
      pdf.document.moveTo(at.x, y).lineTo(at.x + width, y)
    }
    pdf.document.lineWidth(0.5).undash().stroke(style.rule)
  })
}

function drawCell(
  pdf: Pdf,
  text: string,
  column: TableColumn,
  style: TableStyle,
  cell: { readonly x: number; readonly y: number; readonly width: number },
  isHead: boolean,
): void {
  drawText(
    pdf,
    text,
    {
      font: isHead ? 'words' : column.font,
      size: isHead ? style.size * 0.9 : style.size,
      color: isHead ? style.quiet : style.ink,
    },
    {
      x: column.align === 'left' ? cell.x + PADDING : cell.x + cell.width - PADDING,
      baseline: cell.y + style.rowHeight - style.rowHeight * 0.28,
      align: column.align,
      width: cell.width - 2 * PADDING,
      smallest: style.size * 0.6,
    },
  )
}
