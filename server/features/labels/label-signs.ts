import type { Pdf } from '#server/adapters/pdf/pdf'

const BLACK = '#000000'
const HEAD = { length: 6, half: 3.5 }

/** An arrow along the label at the height `y`, its head at `to`. */
export function drawArrow(
  { document }: Pdf,
  { from, to }: { readonly from: number; readonly to: number },
  y: number,
): void {
  const neck = to + Math.sign(from - to) * HEAD.length
  document.lineWidth(1.4).moveTo(from, y).lineTo(neck, y).stroke(BLACK)
  document
    .moveTo(to, y)
    .lineTo(neck, y - HEAD.half)
    .lineTo(neck, y + HEAD.half)
    .closePath()
    .fill(BLACK)
}

/** A small head that points down, its tip at a place. */
export function drawPointer(
  { document }: Pdf,
  tip: { readonly x: number; readonly y: number },
): void {
  document
    .moveTo(tip.x, tip.y)
    .lineTo(tip.x - 2.8, tip.y - 5)
    .lineTo(tip.x + 2.8, tip.y - 5)
    .closePath()
    .fill(BLACK)
}
