import type { Vector3 } from '#shared/geometry/vector3'
import { add3, distance3, subtract3, vector3 } from '#shared/geometry/vector3'
import { isAtMost, isLess } from '#shared/geometry/tolerance'
import type { Inches } from '#shared/units/brands'

/**
 * Cut edges this near or nearer close. Our figure, no source: half of the 1/16 in. that marks are
 * laid out to.
 */
export const CLOSING_GAP: Inches = 1 / 32

/** How a leg's cut edge meets the other piece. */
export interface LegClosing {
  /** From 1 at edge A. */
  readonly leg: number
  /** The leg of the other piece whose cut edge lies nearest. */
  readonly nearest: number
  /** The same leg where the two close, else null. */
  readonly closesOn: number | null
  /** The greater of the distances between the two edges' corresponding ends. */
  readonly gap: Inches
}

/** A leg's cut edge in the world. */
export interface CutEdge {
  readonly leg: number
  readonly from: Vector3
  readonly to: Vector3
}

export interface EdgesClosed {
  /** How far the second piece is moved for it. */
  readonly shift: Vector3
  readonly a: readonly LegClosing[]
  readonly b: readonly LegClosing[]
}

const apart = (a: CutEdge, b: CutEdge): Inches =>
  Math.max(distance3(a.from, b.from), distance3(a.to, b.to))

const turned = ({ leg, from, to }: CutEdge): CutEdge => ({ leg, from: to, to: from })

/** One of the two may be drawn from the other edge, so that its legs run the other way. */
const gapBetween = (a: CutEdge, b: CutEdge): Inches => Math.min(apart(a, b), apart(a, turned(b)))

const closingOf = (edge: CutEdge, others: readonly CutEdge[]): LegClosing => {
  const gaps = others.map((other) => gapBetween(edge, other))
  const gap = Math.min(...gaps)
  const nearest = others[gaps.indexOf(gap)]?.leg ?? NaN
  return { leg: edge.leg, nearest, closesOn: isAtMost(gap, CLOSING_GAP) ? nearest : null, gap }
}

const moved = ({ leg, from, to }: CutEdge, shift: Vector3): CutEdge => ({
  leg,
  from: add3(from, shift),
  to: add3(to, shift),
})

const closedAt = (a: readonly CutEdge[], b: readonly CutEdge[], shift: Vector3): EdgesClosed => {
  const placed = b.map((edge) => moved(edge, shift))
  return {
    shift,
    a: a.map((edge) => closingOf(edge, placed)),
    b: placed.map((edge) => closingOf(edge, a)),
  }
}

/** The places of the second piece that lay one of its edges on an edge of the first. */
const placesOnEdges = (a: readonly CutEdge[], b: readonly CutEdge[]): Vector3[] =>
  a.flatMap((edge) =>
    b
      .flatMap((other) => [other, turned(other)])
      .flatMap((other) => {
        const shift = subtract3(edge.from, other.from)
        return isAtMost(apart(edge, moved(other, shift)), CLOSING_GAP) ? [shift] : []
      }),
  )

const closedLength = (edges: readonly CutEdge[], { a }: EdgesClosed): Inches =>
  edges.reduce(
    (sum, { from, to }, index) => (a[index]?.closesOn === null ? sum : sum + distance3(from, to)),
    0,
  )

/**
 * Which cut edges of two pieces close. The pieces stay as they lie unless another place of the
 * second one closes more inches of the first one's edges: where a corner's point lies on a section
 * depends on where it was begun to be drawn, and that must not decide.
 */
export const closeEdges = (a: readonly CutEdge[], b: readonly CutEdge[]): EdgesClosed => {
  let best = closedAt(a, b, vector3(0, 0, 0))
  if (best.a.every(({ closesOn }) => closesOn !== null)) return best
  let most = closedLength(a, best)
  for (const shift of placesOnEdges(a, b)) {
    const closed = closedAt(a, b, shift)
    const length = closedLength(a, closed)
    if (isLess(most, length)) {
      best = closed
      most = length
    }
  }
  return best
}
