import { PAPER_INK as INK } from '#server/adapters/pdf/paper-ink'
import type { Pdf } from '#server/adapters/pdf/pdf'
import { drawText, wrapText } from '#server/adapters/pdf/pdf-text'
import type { SheetPiece } from '#server/features/sheets/sheet-line'
import type { SheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import { LIFT_RULE, liftOf } from '#shared/bundles/lift-rule'

const LINE = 11.5
const INDENT = 10
const style = { font: 'words', size: 9, color: INK.ink } as const

/** What can hurt the hand or the paint; how the piece is lifted, by the one rule. */
export function cautionsOf({ line, layout }: SheetPiece, speech: SheetSpeech): string[] {
  const { caution } = speech.words
  const lift = liftOf({ weight: line.pieceWeight, longest: layout.blankLength })
  const hasHem = line.profile.hemA !== null || line.profile.hemB !== null
  return [
    caution.edges,
    caution.brake,
    ...(lift === 'onePerson'
      ? []
      : [
          caution.lift[lift](
            speech.weight(LIFT_RULE.onePersonWeight),
            speech.run(LIFT_RULE.onePersonLength),
            speech.weight(LIFT_RULE.neverOneWeight),
          ),
        ]),
    ...(hasHem ? [caution.film] : []),
  ]
}

const linesOf = (pdf: Pdf, cautions: readonly string[], width: number): string[] =>
  cautions.flatMap((caution) => wrapText(pdf, caution, style, width - INDENT))

export const heightOfCautions = (pdf: Pdf, cautions: readonly string[], width: number): number =>
  (linesOf(pdf, cautions, width).length + 1) * LINE

/** A title and a line each, beside a thick rule. */
export function drawCautions(
  pdf: Pdf,
  cautions: readonly string[],
  title: string,
  box: { readonly x: number; readonly y: number; readonly width: number },
): void {
  const lines = linesOf(pdf, cautions, box.width)
  const height = (lines.length + 1) * LINE
  pdf.artifact(() => pdf.document.rect(box.x, box.y, 3, height).fill(INK.warn))
  pdf.element('P', () => {
    const place = (line: number) => ({ x: box.x + INDENT, baseline: box.y + line * LINE - 3 })
    drawText(pdf, title, { ...style, font: 'wordsBold' }, place(1))
    for (const [index, line] of lines.entries()) drawText(pdf, line, style, place(index + 2))
  })
}
