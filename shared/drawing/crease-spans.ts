import type { StripPoint } from '#shared/ends/end-layout'
import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Inches } from '#shared/units/brands'

/** A stretch along the strip, `from` before `to`, inches from the blank's left end. */
export interface Span {
  readonly from: Inches
  readonly to: Inches
}

/**
 * Where the border passes `at` on the way to the far side of it (`towards` 1: edge B's, -1: edge
 * A's), rising. A corner that lies on the line belongs to the far side only when the border goes
 * there, so two of them always enclose metal of that side.
 */
const passes = (outline: readonly StripPoint[], at: Inches, towards: 1 | -1): Inches[] => {
  const off = (point: StripPoint): number => {
    const distance = (point.at - at) * towards
    return Math.abs(distance) <= TOLERANCE ? 0 : distance
  }
  return outline
    .flatMap((point, index) => {
      const next = outline[(index + 1) % outline.length] ?? point
      const [a, b] = [off(point), off(next)]
      if (a > 0 === b > 0) return []
      return point.along + ((next.along - point.along) * a) / (a - b)
    })
    .sort((a, b) => a - b)
}

const spansOf = (places: readonly Inches[]): Span[] =>
  places.flatMap((from, index) => {
    const to = places[index + 1]
    return index % 2 === 0 && to !== undefined ? { from, to } : []
  })

/** How far metal reaches along a line across the strip, on either side of it; undefined where none does. */
export const metalReach = (outline: readonly StripPoint[], at: Inches): Span | undefined => {
  const places = [...passes(outline, at, -1), ...passes(outline, at, 1)]
  return places.length === 0 ? undefined : { from: Math.min(...places), to: Math.max(...places) }
}

/**
 * Where metal stands on both sides of a line across the strip at a distance from edge A: what is
 * left of a crease when the ends are cut. Of the border itself nothing is left, of a crease beside a
 * cut-away lip only what lies behind it.
 */
export const creaseSpans = (outline: readonly StripPoint[], at: Inches): Span[] => {
  const near = spansOf(passes(outline, at, -1))
  const far = spansOf(passes(outline, at, 1))
  return near.flatMap((a) =>
    far.flatMap((b) => {
      const from = Math.max(a.from, b.from)
      const to = Math.min(a.to, b.to)
      return to - from > TOLERANCE ? { from, to } : []
    }),
  )
}
