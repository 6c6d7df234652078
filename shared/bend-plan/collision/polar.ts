import { pointSquare } from './segment-distance'

/** An outline seen from the bend line at the origin: inches and radians, by number of point or side. */
export interface Polar {
  /** Of points: distance and direction. */
  readonly radius: Float64Array
  readonly towards: Float64Array
  /** Of sides: the nearest and the furthest distance. */
  readonly near: Float64Array
  readonly far: Float64Array
  /** Of sides: direction of the normal, and the distance of the side's line along it. */
  readonly normal: Float64Array
  readonly offset: Float64Array
  /** Of sides: the middle of the directions in which it is seen, and half their spread. */
  readonly middle: Float64Array
  readonly spread: Float64Array
}

/** An angle less whole turns, from -π to π. */
export const withinHalfTurn = (angle: number): number =>
  angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI))

export const polarOf = (xs: Float64Array, ys: Float64Array, isSolid: boolean): Polar => {
  const count = xs.length
  const sides = isSolid ? count : count - 1
  const all = new Float64Array(2 * count + 6 * sides)
  let taken = 0
  const take = (length: number) => all.subarray(taken, (taken += length))
  const polar: Polar = {
    radius: take(count),
    towards: take(count),
    near: take(sides),
    far: take(sides),
    normal: take(sides),
    offset: take(sides),
    middle: take(sides),
    spread: take(sides),
  }
  const { radius, towards } = polar
  for (let i = 0; i < count; i++) {
    const x = xs[i] ?? NaN
    const y = ys[i] ?? NaN
    radius[i] = Math.sqrt(x * x + y * y)
    towards[i] = Math.atan2(y, x)
  }
  for (let i = 0; i < sides; i++) {
    const j = i + 1 === count ? 0 : i + 1
    const ax = xs[i] ?? NaN
    const ay = ys[i] ?? NaN
    const bx = xs[j] ?? NaN
    const by = ys[j] ?? NaN
    const length = Math.sqrt((bx - ax) * (bx - ax) + (by - ay) * (by - ay))
    const normalX = (ay - by) / length
    const normalY = (bx - ax) / length
    const turned = withinHalfTurn((towards[j] ?? NaN) - (towards[i] ?? NaN))
    polar.near[i] = Math.sqrt(pointSquare(0, 0, ax, ay, bx, by))
    polar.far[i] = Math.max(radius[i] ?? NaN, radius[j] ?? NaN)
    polar.normal[i] = Math.atan2(normalY, normalX)
    polar.offset[i] = normalX * ax + normalY * ay
    polar.middle[i] = (towards[i] ?? NaN) + turned / 2
    polar.spread[i] = Math.abs(turned) / 2
  }
  return polar
}
