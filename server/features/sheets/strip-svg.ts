import { isDressed, type SheetPiece } from '#server/features/sheets/sheet-line'
import { outlineLabels, sheetColors } from '#server/features/sheets/strip-sheet/outline-figures'
import { figureLabels, type SheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import { drawingBoxes, stripDrawing } from '#shared/drawing/strip-drawing'
import { toSvg } from '#shared/drawing/svg'
import { orderNumber } from '#shared/orders/order.schema'

/** Pixels; a piece with dressed ends has more to show. */
const WIDTH = 1000
const HEIGHT = { plain: 720, dressed: 1500 }

/** Section, strip and ends of a piece with their dimensions as one SVG document. */
export function stripSvg(piece: SheetPiece, speech: SheetSpeech): string {
  const { line, layout } = piece
  const isAnyDressed = isDressed(piece.ends, 'left') || isDressed(piece.ends, 'right')
  const frame = { width: WIDTH, height: isAnyDressed ? HEIGHT.dressed : HEIGHT.plain }
  const { profile, stock, strip } = line
  const drawing = stripDrawing(
    { profile, sheet: stock.sheet, strip, layout },
    {
      ...frame,
      labels: { ...figureLabels(speech), ...outlineLabels(piece, speech) },
      boxes: drawingBoxes(layout, frame),
    },
  )
  const title = `${line.mark} ${line.name}, ${orderNumber(line.orderNumber)}`
  return toSvg(drawing, sheetColors(piece), title)
}
