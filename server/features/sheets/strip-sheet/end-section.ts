import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import { drawText, drawTextBlock, wrapText } from '#server/adapters/pdf/pdf-text'
import {
  drawTable,
  heightOfTable,
  type TableColumn,
  type TableStyle,
} from '#server/adapters/pdf/pdf-table'
import type { SheetPiece } from '#server/features/sheets/sheet-line'
import { drawEndFigure } from '#server/features/sheets/strip-sheet/outline-figures'
import { placeOnStrip, type SheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import type { EndLayout, Mark } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'

const TITLE_HEIGHT = 24
const NOTE_LINE = 12
const GAP = 14
const FIGURE_PART = 0.47
const LEAST_FIGURE_HEIGHT = 190
const TABLE: TableStyle = {
  size: 9.5,
  rowHeight: 13,
  ink: INK.ink,
  quiet: INK.quiet,
  rule: INK.rule,
}
const noteStyle = { font: 'words', size: 9.5, color: INK.ink } as const

/** What is done to an end, in the order in which it is done. */
export function notesOf({ ends, layout }: SheetPiece, side: Side, speech: SheetSpeech): string[] {
  const { words, size, sheared } = speech
  const end = ends[side]
  const { tabs, openings, slits, cutAways } = layout[side]
  const isRelieved = end.kind === 'lap' && cutAways.length > 0
  return [
    end.kind === 'lap' ? words.end[end.side] : words.end[end.kind],
    ...(isRelieved ? [words.end.relief(size(end.length))] : []),
    ...tabs.map(({ leg, length }) => words.end.tab(leg, size(length))),
    ...(slits.length > 0 ? [words.end.slits(slits.length)] : []),
    ...openings.map(({ edge, gap, length }) => words.end.opening(edge, sheared(gap), size(length))),
  ]
}

const tableX = (box: Pick<Box, 'x' | 'width'>): number => box.x + box.width * FIGURE_PART + GAP

const noteLines = (pdf: Pdf, notes: readonly string[], width: number): string[] =>
  notes.flatMap((note) => wrapText(pdf, note, noteStyle, width))

export function heightOfEnd(
  pdf: Pdf,
  piece: SheetPiece,
  side: Side,
  speech: SheetSpeech,
  width: number,
): number {
  const notes = noteLines(pdf, notesOf(piece, side, speech), width)
  const table = heightOfTable(piece.layout[side].marks.length, TABLE)
  return TITLE_HEIGHT + notes.length * NOTE_LINE + GAP + Math.max(table, LEAST_FIGURE_HEIGHT)
}

/** One end: which it is and how high it lies, what is done to it, its outline and its marking table. */
export function drawEnd(
  pdf: Pdf,
  piece: SheetPiece,
  side: Side,
  speech: SheetSpeech,
  box: Box,
): void {
  drawTitle(pdf, piece, side, speech, box)
  const lines = noteLines(pdf, notesOf(piece, side, speech), box.width)
  pdf.element('P', () => {
    for (const [index, line] of lines.entries()) {
      drawText(pdf, line, noteStyle, {
        x: box.x,
        baseline: box.y + TITLE_HEIGHT + (index + 1) * NOTE_LINE - 2,
      })
    }
  })
  const y = box.y + TITLE_HEIGHT + lines.length * NOTE_LINE + GAP / 2
  const figure = { x: box.x, y, width: box.width * FIGURE_PART, height: box.y + box.height - y }
  drawEndFigure(pdf, piece, side, speech, figure)
  const x = tableX(box)
  drawMarks(pdf, piece.layout[side], piece, speech, { x, y, width: box.x + box.width - x })
}

/** Left or right by the strip, low or high on the roof: the latter in large letters. */
function drawTitle(
  pdf: Pdf,
  { ends }: SheetPiece,
  side: Side,
  { words }: SheetSpeech,
  box: Box,
): void {
  const title = { font: 'wordsBold', size: 13, color: INK.ink } as const
  const half = box.width / 2
  pdf.element('H2', () => {
    drawText(pdf, words.end.title[side], title, { x: box.x, baseline: box.y + 16 })
  })
  if (ends.lowEnd === null) return
  const height = ends.lowEnd === side ? words.end.low : words.end.high
  pdf.element('P', () =>
    drawTextBlock(
      pdf,
      height,
      { ...title, size: 22 },
      { x: box.x + half, y: box.y, width: half, height: TITLE_HEIGHT },
      { smallest: 12, align: 'right' },
    ),
  )
}

function drawMarks(
  pdf: Pdf,
  { marks }: EndLayout,
  { line }: SheetPiece,
  speech: SheetSpeech,
  at: { readonly x: number; readonly y: number; readonly width: number },
): void {
  const { words, size } = speech
  const place = placeOnStrip(speech, line.strip)
  const nameOf = ({ of, crease }: Mark): string => {
    if (of !== 'crease') return words.marks[of]
    const fold = line.strip.creases[crease ?? -1]?.fold
    if (fold === undefined) throw new Error(`The strip has no crease ${crease}.`)
    if (fold === 'hemA') return words.creases.hem('A')
    if (fold === 'hemB') return words.creases.hem('B')
    return words.creases.bend(fold)
  }
  const columns: TableColumn[] = [
    { title: words.marks.at, width: at.width * 0.34, align: 'left', font: 'words' },
    { title: words.marks.fromA, width: at.width * 0.33, align: 'right', font: 'figures' },
    { title: words.marks.fromEnd, width: at.width * 0.33, align: 'right', font: 'figuresBold' },
  ]
  const rows = marks.map((mark) => [nameOf(mark), place(mark.at), size(mark.along)])
  drawTable(pdf, columns, rows, TABLE, at)
}
