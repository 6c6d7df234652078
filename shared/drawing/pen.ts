/**
 * Line weights and type size of a drawing in the frame's pixels. Sheet metal is far thinner than
 * a line can be drawn, so a drawing shows it thicker than it is: the middle of the sheet is to
 * scale, its weight is the pen's.
 */
export interface Pen {
  /** Metal, without its bands. */
  readonly metal: number
  /** The band of color along a painted side. */
  readonly paint: number
  /** The band of plain metal along a bare side. */
  readonly bare: number
  readonly hairline: number
  readonly text: number
}

const within = (low: number, value: number, high: number): number =>
  Math.min(high, Math.max(low, value))

/** From the metal's middle to the outer border of a band. */
export const halfWeight = (pen: Pen): number => pen.metal / 2 + Math.max(pen.paint, pen.bare)

/** A pen for a frame; `textSize` overrules the type size that the frame would get. */
export const penFor = (width: number, height: number, textSize?: number): Pen => {
  const reach = Math.min(width, height * 1.3)
  // In a frame of a few pixels even the finest pen would be too broad.
  const finest = Math.min(1, reach / 40)
  const metal = within(1.6 * finest, reach / 115, 5.5)
  return {
    metal,
    paint: within(1.2 * finest, metal, 5.5),
    bare: within(0.8 * finest, metal * 0.5, 3),
    hairline: 1,
    text: textSize ?? within(10, reach / 26, 22),
  }
}

/** The same pen with all its metal weights multiplied. */
export const withWeight = (pen: Pen, factor: number): Pen => ({
  ...pen,
  metal: pen.metal * factor,
  paint: pen.paint * factor,
  bare: pen.bare * factor,
})
