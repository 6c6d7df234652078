/** Questions about polygons answered the slow and plain way, for tests. */

export interface FlatPoint {
  readonly along: number
  readonly at: number
}

type Side = readonly [FlatPoint, FlatPoint]

const sidesOf = (polygon: readonly FlatPoint[]): Side[] =>
  polygon.map((point, index) => [point, polygon[(index + 1) % polygon.length] ?? point])

/** Twice the signed area of the triangle: 0 where the three lie on one line. */
const turn = (a: FlatPoint, b: FlatPoint, c: FlatPoint): number =>
  (b.along - a.along) * (c.at - a.at) - (b.at - a.at) * (c.along - a.along)

export const naiveArea = (polygon: readonly FlatPoint[]): number =>
  Math.abs(sidesOf(polygon).reduce((sum, [a, b]) => sum + a.along * b.at - b.along * a.at, 0) / 2)

const within = (value: number, a: number, b: number): boolean =>
  value >= Math.min(a, b) && value <= Math.max(a, b)

const liesOn = (point: FlatPoint, [a, b]: Side): boolean =>
  turn(a, b, point) === 0 && within(point.along, a.along, b.along) && within(point.at, a.at, b.at)

const touch = (a: Side, b: Side): boolean => {
  const crossing =
    turn(a[0], a[1], b[0]) * turn(a[0], a[1], b[1]) < 0 &&
    turn(b[0], b[1], a[0]) * turn(b[0], b[1], a[1]) < 0
  return crossing || liesOn(b[0], a) || liesOn(b[1], a) || liesOn(a[0], b) || liesOn(a[1], b)
}

/** True where a side runs back over the one before it. */
const runsBack = ([a, b]: Side, [, c]: Side): boolean =>
  turn(a, b, c) === 0 &&
  (b.along - a.along) * (c.along - b.along) + (b.at - a.at) * (c.at - b.at) <= 0

/** No two sides share more than the corner between neighbors. */
export const isSimple = (polygon: readonly FlatPoint[]): boolean => {
  const sides = sidesOf(polygon)
  const count = sides.length
  return sides.every((side, index) => {
    const next = sides[(index + 1) % count]
    if (next === undefined || runsBack(side, next)) return false
    return sides.every((other, place) => {
      const steps = (place - index + count) % count
      return steps <= 1 || steps === count - 1 || !touch(side, other)
    })
  })
}

const distanceToSide = (point: FlatPoint, [a, b]: Side): number => {
  const [along, at] = [b.along - a.along, b.at - a.at]
  const squared = along * along + at * at
  const part = ((point.along - a.along) * along + (point.at - a.at) * at) / (squared || 1)
  const near = Math.min(1, Math.max(0, part))
  return Math.hypot(point.along - a.along - near * along, point.at - a.at - near * at)
}

/** How far a point lies off the polygon's border. */
export const offBorder = (polygon: readonly FlatPoint[], point: FlatPoint): number =>
  Math.min(...sidesOf(polygon).map((side) => distanceToSide(point, side)))
