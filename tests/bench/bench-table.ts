import type { BenchRow } from './bench-row'

export interface BenchGroup {
  readonly title: string
  readonly rows: readonly BenchRow[]
}

const HEAD = ['', 'unit', 'p50', 'p95', 'p99', ''] as const

/** Three figures that count, and no more places than a clock resolves. */
const figure = (value: number): string =>
  value >= 100 ? value.toFixed(0) : value >= 10 ? value.toFixed(1) : value.toFixed(3)

const cellsOf = ({ name, unit, p50, p95, p99, note }: BenchRow): string[] => [
  `  ${name}`,
  unit,
  figure(p50),
  figure(p95),
  figure(p99),
  note ?? '',
]

/** Lines in columns: words to the left, figures to the right. */
export function tableLines(groups: readonly BenchGroup[]): string[] {
  const lines = groups.flatMap(({ title, rows }) => [[title], ...rows.map(cellsOf)])
  const all = [[...HEAD], ...lines.filter((cells) => cells.length > 1)]
  const widths = HEAD.map((_, column) =>
    Math.max(...all.map((cells) => cells[column]?.length ?? 0)),
  )
  const pad = (cell: string, column: number): string => {
    const width = widths[column] ?? 0
    return column >= 2 && column <= 4 ? cell.padStart(width) : cell.padEnd(width)
  }
  const print = (cells: readonly string[]) => cells.map(pad).join('  ').trimEnd()
  return [print(HEAD), ...lines.map((cells) => (cells.length > 1 ? print(cells) : cells.join('')))]
}
