import { isLess } from '#shared/geometry/tolerance'
import { vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import { polarOf } from './polar'
import type { Polar } from './polar'

/** One straight side of an outline. */
export interface OutlineSide {
  readonly a: Vector
  readonly b: Vector
}

export interface Box {
  readonly left: Inches
  readonly right: Inches
  readonly bottom: Inches
  readonly top: Inches
}

/**
 * A tool (closed and solid) or a run of sheet (open, its centre line). Side i runs from point i to the
 * next. Coordinates lie in arrays of numbers, which the sweeps read; points and sides as objects are
 * made when they are first asked for.
 */
export class Outline {
  readonly box: Box
  readonly sideCount: number
  private madePoints: readonly Vector[] | undefined
  private madeSides: readonly OutlineSide[] | undefined
  private madePolar: Polar | undefined
  private madeSwung: { readonly swing: number; readonly outline: Outline } | undefined

  /** Throws RangeError where there are no two points. */
  constructor(
    readonly xs: readonly number[],
    readonly ys: readonly number[],
    readonly isSolid: boolean,
  ) {
    const count = xs.length
    if (count < 2) throw new RangeError(`An outline has two points or more, not ${count}.`)
    let left = Infinity
    let right = -Infinity
    let bottom = Infinity
    let top = -Infinity
    for (let i = 0; i < count; i++) {
      const x = xs[i] ?? NaN
      const y = ys[i] ?? NaN
      if (x < left) left = x
      if (x > right) right = x
      if (y < bottom) bottom = y
      if (y > top) top = y
    }
    this.box = { left, right, bottom, top }
    this.sideCount = isSolid ? count : count - 1
  }

  get points(): readonly Vector[] {
    return (this.madePoints ??= this.xs.map((x, i) => vector(x, this.ys[i] ?? NaN)))
  }

  get sides(): readonly OutlineSide[] {
    return (this.madeSides ??= this.points.flatMap((a, i) => {
      const b = this.points[i + 1] ?? (this.isSolid ? this.points[0] : undefined)
      return b === undefined ? [] : [{ a, b }]
    }))
  }

  /** Points and sides seen from the bend line at the origin. */
  get polar(): Polar {
    return (this.madePolar ??= polarOf(this.xs, this.ys, this.isSolid))
  }

  /** A run of sheet less its first inches; undefined when nothing is left. */
  withoutStart(length: Inches): Outline | undefined {
    const { xs, ys } = this
    let rest = length
    for (let i = 1; i < xs.length; i++) {
      const x = xs[i - 1] ?? NaN
      const y = ys[i - 1] ?? NaN
      const dx = (xs[i] ?? NaN) - x
      const dy = (ys[i] ?? NaN) - y
      const run = Math.sqrt(dx * dx + dy * dy)
      // What is left shorter than the tolerance is nothing: a lip as long as the nose zone has no rest.
      if (isLess(rest, run)) {
        const t = rest / run
        return new Outline([x + dx * t, ...xs.slice(i)], [y + dy * t, ...ys.slice(i)], this.isSolid)
      }
      rest -= run
    }
    return undefined
  }

  /** Turned counter-clockwise about the bend line, radians; the last answer is kept. */
  swung(swing: number): Outline {
    if (this.madeSwung?.swing === swing) return this.madeSwung.outline
    const c = Math.cos(swing)
    const s = Math.sin(swing)
    const { xs, ys } = this
    const outline = new Outline(
      xs.map((x, i) => x * c - (ys[i] ?? NaN) * s),
      ys.map((y, i) => (xs[i] ?? NaN) * s + y * c),
      this.isSolid,
    )
    this.madeSwung = { swing, outline }
    return outline
  }
}

const outlineOf = (points: readonly Vector[], isSolid: boolean): Outline =>
  new Outline(
    points.map(({ x }) => x),
    points.map(({ y }) => y),
    isSolid,
  )

export const sheetOutline = (points: readonly Vector[]): Outline => outlineOf(points, false)

export const toolOutline = (points: readonly Vector[]): Outline => outlineOf(points, true)

export const movedOutline = ({ xs, ys, isSolid }: Outline, dx: Inches, dy: Inches): Outline =>
  new Outline(
    xs.map((x) => x + dx),
    ys.map((y) => y + dy),
    isSolid,
  )

/**
 * What is left of a run of points after its first inches are cut off; undefined when nothing is.
 */
export const cutStart = (
  points: readonly Vector[],
  length: Inches,
): readonly Vector[] | undefined => sheetOutline(points).withoutStart(length)?.points
