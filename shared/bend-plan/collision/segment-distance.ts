import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'

/** Square of the distance of the point (x, y) from a segment. */
const squareToSegment = (x: number, y: number, a: Vector, b: Vector): number => {
  const dx = b.x - a.x
  const dy = b.y - a.y
  const square = dx * dx + dy * dy
  const t = square === 0 ? 0 : ((x - a.x) * dx + (y - a.y) * dy) / square
  const at = t < 0 ? 0 : t > 1 ? 1 : t
  const offX = x - a.x - at * dx
  const offY = y - a.y - at * dy
  return offX * offX + offY * offY
}

/** Distance of the point (x, y) from a segment. */
export const pointToSegment = (x: number, y: number, a: Vector, b: Vector): Inches =>
  Math.sqrt(squareToSegment(x, y, a, b))

const side = (a: Vector, b: Vector, p: Vector): number =>
  (b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x)

const cross = (a: Vector, b: Vector, c: Vector, d: Vector): boolean => {
  const c1 = side(a, b, c)
  const c2 = side(a, b, d)
  if (!((c1 > 0 && c2 < 0) || (c1 < 0 && c2 > 0))) return false
  const d1 = side(c, d, a)
  const d2 = side(c, d, b)
  return (d1 > 0 && d2 < 0) || (d1 < 0 && d2 > 0)
}

/** Distance between two segments; 0 where they cross. Otherwise an end point of one is nearest. */
export const segmentToSegment = (a: Vector, b: Vector, c: Vector, d: Vector): Inches =>
  cross(a, b, c, d)
    ? 0
    : Math.sqrt(
        Math.min(
          squareToSegment(a.x, a.y, c, d),
          squareToSegment(b.x, b.y, c, d),
          squareToSegment(c.x, c.y, a, b),
          squareToSegment(d.x, d.y, a, b),
        ),
      )

/** Whether the boxes about two segments are further apart than a clearance: then the segments are. */
export const areFarApart = (
  a: Vector,
  b: Vector,
  c: Vector,
  d: Vector,
  clearance: Inches,
): boolean =>
  (a.x < b.x ? a.x : b.x) > (c.x > d.x ? c.x : d.x) + clearance ||
  (a.x > b.x ? a.x : b.x) < (c.x < d.x ? c.x : d.x) - clearance ||
  (a.y < b.y ? a.y : b.y) > (c.y > d.y ? c.y : d.y) + clearance ||
  (a.y > b.y ? a.y : b.y) < (c.y < d.y ? c.y : d.y) - clearance
