import { pointSquare } from './segment-distance'

/** An outline seen from the bend line at the origin: inches and radians, by number of point or side. */
export interface Polar {
  /** Of points: distance and direction. */
  readonly radius: readonly number[]
  readonly towards: readonly number[]
  /** Of sides: the nearest and the furthest distance. */
  readonly near: readonly number[]
  readonly far: readonly number[]
  /** Of sides: direction of the normal, and the distance of the side's line along it. */
  readonly normal: readonly number[]
  readonly offset: readonly number[]
  /** Of sides: the middle of the directions in which it is seen, and half their spread. */
  readonly middle: readonly number[]
  readonly spread: readonly number[]
}

/** An angle less whole turns, from -π to π. */
export const withinHalfTurn = (angle: number): number =>
  angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI))

export const polarOf = (xs: readonly number[], ys: readonly number[], isSolid: boolean): Polar => {
  const radius: number[] = []
  const towards: number[] = []
  xs.forEach((x, i) => {
    const y = ys[i] ?? NaN
    radius.push(Math.sqrt(x * x + y * y))
    towards.push(Math.atan2(y, x))
  })
  const near: number[] = []
  const far: number[] = []
  const normal: number[] = []
  const offset: number[] = []
  const middle: number[] = []
  const spread: number[] = []
  const count = xs.length
  for (let i = 0; i < (isSolid ? count : count - 1); i++) {
    const j = i + 1 === count ? 0 : i + 1
    const ax = xs[i] ?? NaN
    const ay = ys[i] ?? NaN
    const bx = xs[j] ?? NaN
    const by = ys[j] ?? NaN
    const length = Math.sqrt((bx - ax) * (bx - ax) + (by - ay) * (by - ay))
    const normalX = (ay - by) / length
    const normalY = (bx - ax) / length
    const turned = withinHalfTurn((towards[j] ?? NaN) - (towards[i] ?? NaN))
    near.push(Math.sqrt(pointSquare(0, 0, ax, ay, bx, by)))
    far.push(Math.max(radius[i] ?? NaN, radius[j] ?? NaN))
    normal.push(Math.atan2(normalY, normalX))
    offset.push(normalX * ax + normalY * ay)
    middle.push((towards[i] ?? NaN) + turned / 2)
    spread.push(Math.abs(turned) / 2)
  }
  return { radius, towards, near, far, normal, offset, middle, spread }
}
