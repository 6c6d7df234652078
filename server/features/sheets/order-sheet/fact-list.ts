import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import type { Pdf } from '#server/adapters/pdf/pdf'
import type { PdfFont } from '#server/adapters/pdf/pdf-fonts'
import { drawText, widthOfText, wrapText } from '#server/adapters/pdf/pdf-text'

/** A label and what is said of it, over as many lines as it takes. */
export interface Fact {
  readonly label: string
  readonly values: readonly string[]
  readonly font: PdfFont
  /** Before the value, CSS hex. */
  readonly swatch?: string
  /** Something to ask about. */
  readonly odd?: boolean
}

export const figure = (label: string, value: string): Fact => ({
  label,
  values: [value],
  font: 'figures',
})
export const said = (label: string, ...values: string[]): Fact => ({ label, values, font: 'words' })

interface Column {
  readonly x: number
  readonly y: number
  readonly width: number
}

const LABEL = { font: 'words', size: 8.5, color: INK.quiet } as const
const SIZE = 9.5
const LINE = 12
const PADDING = 3.5
const GAP = 8
const SWATCH = 8
const SWATCH_ROOM = SWATCH + 4

interface LaidFact {
  readonly lines: readonly string[]
  /** The value stands in the label's own line. */
  readonly beside: boolean
  readonly height: number
}

const styleOf = ({ font, odd = false }: Fact) =>
  odd
    ? ({ font: 'wordsBold', size: SIZE, color: INK.warn } as const)
    : { font, size: SIZE, color: INK.ink }

function layFact(pdf: Pdf, fact: Fact, width: number): LaidFact {
  const style = styleOf(fact)
  const [first = '', ...more] = fact.values
  const room = fact.swatch === undefined ? 0 : SWATCH_ROOM
  const used = widthOfText(pdf, fact.label, LABEL) + GAP + room
  if (more.length === 0 && used + widthOfText(pdf, first, style) <= width) {
    return { lines: [first], beside: true, height: LINE + PADDING }
  }
  const lines = fact.values.flatMap((value) => wrapText(pdf, value, style, width - room))
  return { lines, beside: false, height: (lines.length + 1) * LINE + PADDING }
}

export const heightOfFacts = (pdf: Pdf, facts: readonly Fact[], width: number): number =>
  facts.reduce((sum, fact) => sum + layFact(pdf, fact, width).height, 0)

/** Labels at the left, values at the right or, where they need the room, below; a hairline each. */
export function drawFacts(pdf: Pdf, facts: readonly Fact[], { x, y, width }: Column): void {
  pdf.group('L', () => {
    let top = y
    for (const fact of facts) {
      const laid = layFact(pdf, fact, width)
      drawFact(pdf, fact, laid, { x, y: top, width })
      top += laid.height
    }
  })
}

function drawFact(pdf: Pdf, fact: Fact, laid: LaidFact, row: Column): void {
  const { lines, beside, height } = laid
  const { label, swatch } = fact
  const style = styleOf(fact)
  const baseline = row.y + LINE - 1.5
  const right = row.x + row.width
  const room = swatch === undefined ? 0 : SWATCH_ROOM
  let swatchX = row.x
  pdf.element('LI', () => {
    drawText(pdf, label, LABEL, { x: row.x, baseline })
    for (const [index, line] of lines.entries()) {
      const place = beside
        ? ({ x: right, baseline, align: 'right' } as const)
        : { x: row.x + room, baseline: baseline + (index + 1) * LINE }
      const used = drawText(pdf, line, style, place)
      if (beside) swatchX = right - used - SWATCH_ROOM
    }
  })
  const foot = row.y + height - 1
  pdf.artifact(() => {
    if (swatch !== undefined) drawSwatch(pdf, swatch, swatchX, beside ? baseline : baseline + LINE)
    pdf.document.lineWidth(0.5).undash().moveTo(row.x, foot).lineTo(right, foot).stroke(INK.rule)
  })
}

function drawSwatch({ document }: Pdf, color: string, x: number, baseline: number): void {
  const y = baseline - SWATCH + 1
  document.rect(x, y, SWATCH, SWATCH).fill(color)
  document.rect(x, y, SWATCH, SWATCH).lineWidth(0.5).undash().stroke(INK.quiet)
}
