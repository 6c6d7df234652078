import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import { CAP_HEIGHT } from '#server/adapters/pdf/pdf-fonts'
import { drawText } from '#server/adapters/pdf/pdf-text'
import type {
  CircleShape,
  DisplayItem,
  DisplayList,
  PathShape,
  TextShape,
} from '#shared/drawing/display-list'
import type { FigureColors } from '#shared/drawing/figure-colors'

/** How `list` lies in `box`: as large as it fits, in the middle. */
export function placeInBox(
  list: Pick<DisplayList, 'width' | 'height'>,
  box: Box,
): { readonly x: number; readonly y: number; readonly scale: number } {
  const scale = Math.min(box.width / list.width, box.height / list.height)
  return {
    x: box.x + (box.width - list.width * scale) / 2,
    y: box.y + (box.height - list.height * scale) / 2,
    scale,
  }
}

/**
 * Draws a display list as vectors into a box of the page, as one figure that `alt` describes. A box
 * of the list's own size draws it unscaled, one unit of the list a point.
 */
export function drawDisplayList(
  pdf: Pdf,
  list: DisplayList,
  box: Box,
  { colors, alt }: { readonly colors: FigureColors; readonly alt: string },
): void {
  const { x, y, scale } = placeInBox(list, box)
  const draw = () => {
    pdf.document.save().translate(x, y).scale(scale)
    for (const item of list.items) drawItem(pdf, item, colors)
    pdf.document.restore()
  }
  pdf.element('Figure', draw, alt)
}

const isUnseen = (color: string): boolean => color === 'none' || color === 'transparent'

function drawItem(pdf: Pdf, item: DisplayItem, { roles }: FigureColors): void {
  const color = roles[item.role]
  if (isUnseen(color)) return
  switch (item.kind) {
    case 'path':
      return drawPath(pdf, item, color)
    case 'circle':
      return drawCircle(pdf, item, color)
    case 'text':
      return drawTextShape(pdf, item, color)
  }
}

function drawPath(pdf: Pdf, shape: PathShape, color: string): void {
  const [first, ...rest] = shape.points
  if (!first) return
  const { document } = pdf
  document.moveTo(first.x, first.y)
  for (const { x, y } of rest) document.lineTo(x, y)
  if (shape.closed) document.closePath()
  paint(pdf, shape, color)
}

function drawCircle(pdf: Pdf, shape: CircleShape, color: string): void {
  pdf.document.circle(shape.center.x, shape.center.y, shape.radius)
  paint(pdf, shape, color)
}

/** Paints the path just made. */
function paint(
  { document }: Pdf,
  shape: { readonly width: number; readonly filled: boolean; readonly dash?: readonly number[] },
  color: string,
): void {
  if (shape.width > 0) {
    document.lineWidth(shape.width).lineJoin('round')
    // pdfkit's own `dash` knows one pair of lengths only.
    document.addContent(`[${(shape.dash ?? []).join(' ')}] 0 d`)
  }
  if (shape.width > 0 && shape.filled) document.fillAndStroke(color, color)
  else if (shape.filled) document.fill(color)
  else if (shape.width > 0) document.stroke(color)
}

function drawTextShape(pdf: Pdf, shape: TextShape, color: string): void {
  const font = shape.bold ? 'figuresBold' : 'figures'
  const { document } = pdf
  document.save().translate(shape.at.x, shape.at.y)
  if (shape.rotation !== 0) document.rotate(shape.rotation)
  drawText(
    pdf,
    shape.text,
    { font, size: shape.size, color },
    { x: 0, baseline: (CAP_HEIGHT[font] * shape.size) / 2, align: 'center' },
  )
  document.restore()
}
