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
  const found: Inches[] = []
  let from = outline.at(-1)
  for (const to of outline) {
    const a = from === undefined ? 0 : offLine(from, at, towards)
    const b = offLine(to, at, towards)
    if (from !== undefined && a > 0 !== b > 0) {
      found.push(from.along + ((to.along - from.along) * a) / (a - b))
    }
    from = to
  }
  return found.sort((a, b) => a - b)
}

/** How far a point lies off a line across the strip, 0 within the tolerance. */
const offLine = (point: StripPoint, at: Inches, towards: 1 | -1): number => {
  const distance = (point.at - at) * towards
  return Math.abs(distance) <= TOLERANCE ? 0 : distance
}

/** How far metal reaches along a line across the strip, on either side of it; undefined where none does. */
export const metalReach = (outline: readonly StripPoint[], at: Inches): Span | undefined => {
  let from = Infinity
  let to = -Infinity
  const take = (along: Inches): void => {
    if (along < from) from = along
    if (along > to) to = along
  }
  let before = outline.at(-1)
  for (const point of outline) {
    const b = offLine(point, at, 1)
    if (b === 0) take(point.along)
    if (before !== undefined) {
      const a = offLine(before, at, 1)
      if (a * b < 0) take(before.along + ((point.along - before.along) * a) / (a - b))
    }
    before = point
  }
  return from <= to ? { from, to } : undefined
}

/**
 * Where metal stands on both sides of a line across the strip at a distance from edge A: what is
 * left of a crease when the ends are cut. Of the border itself nothing is left, of a crease beside a
 * cut-away lip only what lies behind it.
 */
export const creaseSpans = (outline: readonly StripPoint[], at: Inches): Span[] => {
  const near = passes(outline, at, -1)
  const far = passes(outline, at, 1)
  const spans: Span[] = []
  for (let i = 0; i + 1 < near.length; i += 2) {
    for (let j = 0; j + 1 < far.length; j += 2) {
      const from = Math.max(near[i] ?? 0, far[j] ?? 0)
      const to = Math.min(near[i + 1] ?? 0, far[j + 1] ?? 0)
      if (to - from > TOLERANCE) spans.push({ from, to })
    }
  }
  return spans
}
