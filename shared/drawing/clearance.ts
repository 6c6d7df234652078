import type { Bounds } from '#shared/geometry/bounds'
import type { Segment } from '#shared/geometry/segment'
import { boxOfSegment, distanceBetween, distanceToBox } from '#shared/geometry/segment'
import type { Vector } from '#shared/geometry/vector'
import { cross, dot, lengthOf, scale, subtract } from '#shared/geometry/vector'

/** Metal as drawn: the chords of its middle line and how far its bands reach to either side. */
export interface Metal {
  readonly chords: readonly Segment[]
  readonly half: number
}

/** True when the two boxes are at least `reach` apart along an axis. */
const isApart = (a: Bounds, { from, to }: Segment, reach: number): boolean =>
  Math.min(from.x, to.x) - reach >= a.maxX ||
  Math.max(from.x, to.x) + reach <= a.minX ||
  Math.min(from.y, to.y) - reach >= a.maxY ||
  Math.max(from.y, to.y) + reach <= a.minY

/** True when the box keeps `gap` away from the metal. */
export const isBoxClear = (metal: Metal, box: Bounds, gap: number): boolean => {
  const reach = metal.half + gap
  return metal.chords.every(
    (chord) => isApart(box, chord, reach) || distanceToBox(chord, box) >= reach,
  )
}

/** True when the line keeps `gap` away from the metal. */
export const isLineClear = (metal: Metal, line: Segment, gap: number): boolean => {
  const reach = metal.half + gap
  const box = boxOfSegment(line)
  return metal.chords.every(
    (chord) => isApart(box, chord, reach) || distanceBetween(chord, line) >= reach,
  )
}

/** Where a ray (unit direction) first comes within `reach` of a point. */
const meetCircle = (from: Vector, along: Vector, center: Vector, reach: number): number => {
  const offset = subtract(from, center)
  const b = dot(offset, along)
  const c = dot(offset, offset) - reach * reach
  if (c <= 0) return 0
  const root = b * b - c
  if (root < 0 || b > 0) return Infinity
  return -b - Math.sqrt(root)
}

const meetChord = (from: Vector, along: Vector, chord: Segment, reach: number): number => {
  const ends = Math.min(
    meetCircle(from, along, chord.from, reach),
    meetCircle(from, along, chord.to, reach),
  )
  const d = subtract(chord.to, chord.from)
  const length = lengthOf(d)
  if (length === 0) return ends
  const unit = scale(d, 1 / length)
  const offset = subtract(from, chord.from)
  const aside = cross(unit, offset)
  const inside = dot(unit, offset)
  if (Math.abs(aside) <= reach) return inside >= 0 && inside <= length ? 0 : ends
  const closing = cross(unit, along)
  if (closing === 0) return ends
  const t = (Math.sign(aside) * reach - aside) / closing
  const at = inside + t * dot(unit, along)
  return t >= 0 && at >= 0 && at <= length ? Math.min(ends, t) : ends
}

/** How far a ray (unit direction) runs before it is `gap` from the metal; Infinity if it never is. */
export const runToMetal = (metal: Metal, from: Vector, along: Vector, gap: number): number =>
  Math.min(
    Infinity,
    ...metal.chords.map((chord) => meetChord(from, along, chord, metal.half + gap)),
  )
