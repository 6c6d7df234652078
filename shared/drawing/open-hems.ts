import type { Vector } from '#shared/geometry/vector'
import { add, distance, dot, lengthOf, scale, subtract } from '#shared/geometry/vector'

const pointsBack = (before: Vector, after: Vector): boolean =>
  dot(before, after) < -0.9 * lengthOf(before) * lengthOf(after)

/**
 * Draws folds of 180 wide enough to be seen: where a chain turns back on itself over a short step,
 * the step is lengthened to `room` by moving the shorter end of the chain (the lip).
 */
export const openHems = (chain: readonly Vector[], room: number): Vector[] => {
  const points = [...chain]
  for (let index = 1; index + 2 < points.length; index += 1) {
    const [a, b, c, d] = points.slice(index - 1, index + 3)
    if (a === undefined || b === undefined || c === undefined || d === undefined) continue
    const step = distance(b, c)
    if (step >= room || !pointsBack(subtract(b, a), subtract(d, c))) continue
    const along = step === 0 ? { x: 0, y: 1 } : scale(subtract(c, b), 1 / step)
    const by = scale(along, room - step)
    const lipIsFirst = index === 1 && index + 3 < points.length
    points.forEach((point, at) => {
      if (lipIsFirst && at <= index) points[at] = subtract(point, by)
      if (!lipIsFirst && at > index) points[at] = add(point, by)
    })
  }
  return points
}
