import { setImmediate } from 'node:timers/promises'
import { Pdf, type PageSize } from '#server/adapters/pdf/pdf'
import { drawLabel, LABEL_SIZE } from '#server/features/labels/draw-label'
import type { LabelContent } from '#server/features/labels/label-content'
import type { LabelPaper } from '#shared/labels/labels.contract'
import { labelWords } from '#shared/labels/words/label-words'
import type { Language } from '#shared/people/people.contract'

/** Where labels lie on a page, points. */
interface Grid {
  readonly page: PageSize
  readonly columns: number
  readonly rows: number
  /** Between two columns. */
  readonly gap: number
}

/**
 * On letter paper as on die-cut sheets of ten with 3/16 in. between the columns; on A4 side by side.
 * Common practice, no source.
 */
const GRIDS: Readonly<Record<LabelPaper, Grid>> = {
  roll4x2: { page: LABEL_SIZE, columns: 1, rows: 1, gap: 0 },
  letter: { page: { width: 612, height: 792 }, columns: 2, rows: 5, gap: 13.5 },
  a4: { page: { width: 595.28, height: 841.89 }, columns: 2, rows: 5, gap: 0 },
}

/** After so many labels other requests get their turn. */
const AT_A_TIME = 20

const TICK = { length: 6, color: '#808080', width: 0.3 }

export interface LabelsToDraw {
  readonly labels: readonly LabelContent[]
  readonly paper: LabelPaper
  readonly language: Language
  /** The moment of the print. */
  readonly at: Date
  readonly signal: AbortSignal
}

/**
 * The labels as a PDF: a page each on a roll, ten on a sheet. Same labels, same bytes. Gives up when
 * nobody waits for it any more.
 */
export async function labelPages(draw: LabelsToDraw): Promise<Uint8Array<ArrayBuffer>> {
  const { labels, paper, language, at, signal } = draw
  const words = labelWords(language)
  const grid = GRIDS[paper]
  const perPage = grid.columns * grid.rows
  const pdf = new Pdf({ title: words.title, language, at })
  for (const [index, label] of labels.entries()) {
    if (index % AT_A_TIME === 0) {
      await setImmediate()
      signal.throwIfAborted()
    }
    if (index % perPage === 0) {
      pdf.addPage(grid.page)
      if (perPage > 1) drawCutMarks(pdf, grid)
    }
    drawLabel(pdf, label, words, cornerOf(grid, index % perPage))
  }
  return pdf.finish()
}

/** Borders of the columns and rows, the grid in the middle of the page. */
function bordersOf({ page, columns, rows, gap }: Grid) {
  const { width, height } = LABEL_SIZE
  const left = (page.width - columns * width - (columns - 1) * gap) / 2
  const top = (page.height - rows * height) / 2
  const lefts = Array.from({ length: columns }, (_, column) => left + column * (width + gap))
  return {
    lefts,
    rights: lefts.map((x) => x + width),
    tops: Array.from({ length: rows + 1 }, (_, row) => top + row * height),
  }
}

/** Row by row. */
function cornerOf(grid: Grid, place: number): { x: number; y: number } {
  const { lefts, tops } = bordersOf(grid)
  return {
    x: lefts[place % grid.columns] ?? 0,
    y: tops[Math.floor(place / grid.columns)] ?? 0,
  }
}

/** Short lines outside the labels, for paper that is cut by hand. */
function drawCutMarks(pdf: Pdf, grid: Grid): void {
  const { lefts, rights, tops } = bordersOf(grid)
  const { page } = grid
  const first = lefts[0] ?? 0
  const last = rights.at(-1) ?? page.width
  const upper = tops[0] ?? 0
  const lower = tops.at(-1) ?? page.height
  pdf.artifact(() => {
    const { document } = pdf
    for (const y of tops) {
      document.moveTo(first - 2 - TICK.length, y).lineTo(first - 2, y)
      document.moveTo(last + 2, y).lineTo(last + 2 + TICK.length, y)
    }
    for (const x of [...lefts, ...rights]) {
      document.moveTo(x, upper - 2 - TICK.length).lineTo(x, upper - 2)
      document.moveTo(x, lower + 2).lineTo(x, lower + 2 + TICK.length)
    }
    document.lineWidth(TICK.width).stroke(TICK.color)
  })
}
