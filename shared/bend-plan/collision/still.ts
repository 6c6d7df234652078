import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import { boxesMeet } from './outline'
import type { Outline } from './outline'
import { areFarApart, segmentToSegment } from './segment-distance'

/** Inside by the number of sides that a ray to the right crosses. */
const isInside = ({ x, y }: Vector, solid: Outline): boolean =>
  solid.sides.reduce(
    (inside, { a, b }) =>
      a.y > y !== b.y > y && x < a.x + ((y - a.y) / (b.y - a.y)) * (b.x - a.x) ? !inside : inside,
    false,
  )

const startsInside = (of: Outline, solid: Outline): boolean => {
  const [first] = of.points
  return solid.isSolid && first !== undefined && isInside(first, solid)
}

/**
 * Whether two outlines lie within a clearance of each other, or one inside the other. With
 * `skipFirst` the first sides of both, which join at the bend line, are not compared.
 */
export const meetsStill = (
  one: Outline,
  other: Outline,
  clearance: Inches,
  skipFirst = false,
): boolean => {
  if (!boxesMeet(one.box, other.box, clearance)) return false
  return (
    one.sides.some((p, i) =>
      other.sides.some(
        (q, j) =>
          !(skipFirst && i === 0 && j === 0) &&
          !areFarApart(p.a, p.b, q.a, q.b, clearance) &&
          segmentToSegment(p.a, p.b, q.a, q.b) <= clearance,
      ),
    ) ||
    startsInside(one, other) ||
    startsInside(other, one)
  )
}
