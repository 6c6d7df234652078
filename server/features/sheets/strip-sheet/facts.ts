import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import type { PdfFont } from '#server/adapters/pdf/pdf-fonts'
import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import { drawText } from '#server/adapters/pdf/pdf-text'
import type { SheetPiece } from '#server/features/sheets/sheet-line'
import { girthDifference } from '#shared/profile/stated-girth'
import type { SheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'

interface Fact {
  readonly label: string
  readonly value: string
  readonly font: PdfFont
  /** Beside the value, CSS hex. */
  readonly swatch?: string
  /** Something to ask about. */
  readonly odd?: boolean
}

const figure = (label: string, value: string): Fact => ({ label, value, font: 'figures' })
const said = (label: string, value: string): Fact => ({ label, value, font: 'words' })

export function factsOf({ line, layout }: SheetPiece, speech: SheetSpeech): Fact[] {
  const { words, run, size, sheared, weight } = speech
  const { fact } = words
  const { hands, stock, strip, statedGirth, profile } = line
  return [
    figure(fact.pieces, String(line.quantity)),
    ...(hands === null
      ? []
      : [figure(fact.left, String(hands.left)), figure(fact.right, String(hands.right))]),
    figure(fact.length, run(line.length)),
    figure(fact.blank, run(layout.blankLength)),
    figure(fact.stripWidth, sheared(strip.stripWidth)),
    figure(fact.girth, size(strip.girth)),
    ...(statedGirth === null
      ? []
      : [
          {
            ...figure(fact.statedGirth, size(statedGirth)),
            odd: girthDifference(profile, statedGirth) !== 0,
          },
        ]),
    figure(fact.weight, weight(line.pieceWeight)),
    {
      ...said(fact.stock, `${stock.thicknessName} · ${stock.colorName}`),
      swatch: stock.colorHex,
    },
    said(fact.colorSide, words.colorSide[profile.colorSide]),
    said(fact.brake, line.brakeName ?? fact.notReleased),
  ]
}

const MOST_ROW_HEIGHT = 19
const SWATCH = 9
const LABEL = { font: 'words', size: 9, color: INK.quiet } as const

/** Label and value, a hairline below each; the stock's color beside its name. */
export function drawFacts(pdf: Pdf, piece: SheetPiece, speech: SheetSpeech, box: Box): void {
  const facts = factsOf(piece, speech)
  const rowHeight = Math.min(MOST_ROW_HEIGHT, box.height / facts.length)
  pdf.group('L', () => {
    for (const [index, fact] of facts.entries()) {
      drawFact(pdf, fact, { ...box, y: box.y + index * rowHeight, height: rowHeight })
    }
  })
}

function drawFact(pdf: Pdf, fact: Fact, row: Box): void {
  const { label, value, swatch, odd = false } = fact
  const baseline = row.y + row.height * 0.7
  const right = row.x + row.width
  const foot = row.y + row.height
  const room = swatch === undefined ? 0 : SWATCH + 4
  pdf.element('LI', () => {
    const used = drawText(pdf, label, LABEL, {
      x: row.x,
      baseline,
      width: row.width * 0.6,
      smallest: 6,
    })
    const style = odd
      ? ({ font: 'figuresBold', size: 10, color: INK.warn } as const)
      : { font: fact.font, size: 10, color: INK.ink }
    drawText(pdf, value, style, {
      x: right - room,
      baseline,
      align: 'right',
      width: row.width - used - room - 6,
      smallest: 6,
    })
  })
  pdf.artifact(() => {
    if (swatch !== undefined) drawSwatch(pdf, swatch, right - SWATCH, baseline)
    pdf.document.lineWidth(0.5).undash().moveTo(row.x, foot).lineTo(right, foot).stroke(INK.rule)
  })
}

function drawSwatch({ document }: Pdf, color: string, x: number, baseline: number): void {
  document.rect(x, baseline - SWATCH + 1, SWATCH, SWATCH).fill(color)
  document
    .rect(x, baseline - SWATCH + 1, SWATCH, SWATCH)
    .lineWidth(0.5)
    .undash()
    .stroke(INK.quiet)
}
