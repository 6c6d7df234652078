import { readFileSync } from 'node:fs'
import { expect } from 'vitest'

const PUBLISHED = new URL('../cases/published/', import.meta.url)

/** One row of a carried table. Asking for a column that is not there is an error. */
export interface PublishedRow {
  readonly text: (column: string) => string
  readonly number: (column: string) => number
}

/** Cells of a line; a cell in double quotes may hold commas. */
const cellsOf = (line: string): string[] =>
  [...line.matchAll(/(?:^|,)(?:"([^"]*)"|([^,"]*))/g)].map(
    ([, quoted, plain]) => quoted ?? plain ?? '',
  )

const rowOf = (heads: readonly string[], line: string): PublishedRow => {
  const cells = cellsOf(line)
  const text = (column: string): string => {
    const cell = cells[heads.indexOf(column)]
    if (cell === undefined) throw new Error(`No column ${column} in ${line}`)
    return cell
  }
  const number = (column: string): number => {
    const value = text(column)
    if (!/^-?\d+(\.\d+)?$/.test(value)) throw new Error(`${column} is no number in ${line}`)
    return Number(value)
  }
  return { text, number }
}

export const readPublished = (file: string): string =>
  readFileSync(new URL(file, PUBLISHED), 'utf8')

/** The rows of `tests/cases/published/<file>`; where they come from stands in SOURCES.md. */
export const publishedRows = (file: string): PublishedRow[] => {
  const [head, ...lines] = readPublished(file).trim().split('\n')
  const heads = cellsOf(head ?? '')
  return lines.map((line) => rowOf(heads, line))
}

/** Half of the last printed place: what rounding hides. */
const halfPlace = (printed: string): number => {
  const decimals = printed.split('.')[1]?.length ?? 0
  return 0.5 * 10 ** -decimals
}

/** The found value rounds to the printed one, in the places that are printed. */
export const expectPrinted = (found: number, printed: string): void => {
  const away = Math.abs(found - Number(printed))
  expect(away, `${found} against the printed ${printed}`).toBeLessThanOrEqual(
    halfPlace(printed) + 1e-9,
  )
}

/** One value printed in two units: they agree as far as the rounding of both lets one see. */
export const expectSameInUnits = (printed: string, factor: number, other: string): void => {
  const away = Math.abs(Number(printed) * factor - Number(other))
  expect(away, `${printed} times ${factor} against ${other}`).toBeLessThanOrEqual(
    halfPlace(printed) * factor + halfPlace(other) + 1e-9,
  )
}
