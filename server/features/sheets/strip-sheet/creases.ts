import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import type { Pdf } from '#server/adapters/pdf/pdf'
import {
  drawTable,
  heightOfTable,
  type TableColumn,
  type TableStyle,
} from '#server/adapters/pdf/pdf-table'
import type { SheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import type { Fold, Strip } from '#shared/strip/strip.schema'

/** Side by side, so that a strip of many bends still fits below its figure. */
const TABLES = 3
const GAP = 12
const STYLE: TableStyle = {
  size: 9,
  rowHeight: 12,
  ink: INK.ink,
  quiet: INK.quiet,
  rule: INK.rule,
}

const rowsPerTable = ({ creases }: Strip): number => Math.ceil(creases.length / TABLES)

export const heightOfCreases = (strip: Strip): number =>
  strip.creases.length === 0 ? 0 : heightOfTable(rowsPerTable(strip), STYLE)

/** Every fold with its distance from edge A, which way it turns with the left side up, its angle. */
export function drawCreases(
  pdf: Pdf,
  strip: Strip,
  speech: SheetSpeech,
  at: { readonly x: number; readonly y: number; readonly width: number },
): void {
  const { words, size, angle } = speech
  const foldName = (fold: Fold): string => {
    if (fold === 'hemA') return words.creases.hem('A')
    if (fold === 'hemB') return words.creases.hem('B')
    return words.creases.bend(fold)
  }
  const rows = strip.creases.map(({ fold, at: place, turn }) => [
    foldName(fold),
    size(place),
    turn > 0 ? words.creases.up : words.creases.down,
    typeof fold === 'number' ? angle(turn) : '',
  ])
  const width = (at.width - (TABLES - 1) * GAP) / TABLES
  const count = rowsPerTable(strip)
  for (let table = 0; table * count < rows.length; table += 1) {
    const part = rows.slice(table * count, (table + 1) * count)
    drawTable(pdf, columnsOf(speech, width), part, STYLE, {
      x: at.x + table * (width + GAP),
      y: at.y,
    })
  }
}

const columnsOf = ({ words: { creases } }: SheetSpeech, width: number): TableColumn[] => [
  { title: creases.fold, width: width * 0.31, align: 'left', font: 'words' },
  { title: creases.fromA, width: width * 0.3, align: 'right', font: 'figures' },
  { title: creases.way, width: width * 0.19, align: 'left', font: 'words' },
  { title: creases.angle, width: width * 0.2, align: 'right', font: 'figures' },
]
