import type { StripPoint } from '#shared/ends/end-layout'
import { TOLERANCE } from '#shared/geometry/tolerance'

/** A point that the way between its neighbors passes anyway, or that repeats one of them. */
const isIdle = (before: StripPoint, point: StripPoint, after: StripPoint): boolean => {
  const along = after.along - before.along
  const at = after.at - before.at
  const length = Math.hypot(along, at)
  if (length <= TOLERANCE) return true
  const aside = (point.along - before.along) * at - (point.at - before.at) * along
  return Math.abs(aside) <= TOLERANCE * length
}

/**
 * A closed polygon without repeats and without corners on a straight side. Its first point and its
 * last are taken for corners as they stand.
 */
export const tidyPolygon = (points: readonly StripPoint[]): StripPoint[] => {
  const kept: StripPoint[] = []
  for (const point of points) {
    const last = kept.at(-1)
    const beforeLast = kept.at(-2)
    if (last && Math.hypot(point.along - last.along, point.at - last.at) <= TOLERANCE) continue
    if (last && beforeLast && isIdle(beforeLast, last, point)) kept.pop()
    kept.push(point)
  }
  return kept
}

/**
 * What a border leaves over of the blank, between it and the blank's square end at along 0: a
 * closed polygon for each part. The border runs from edge A to edge B, `at` never falls and `along`
 * is never negative.
 */
export const beyondBorder = (border: readonly StripPoint[]): StripPoint[][] => {
  const parts: StripPoint[][] = []
  let part: StripPoint[] = []
  border.forEach((point, index) => {
    const before = border[index - 1]
    const raised = before !== undefined && (before.along > 0 || point.along > 0)
    if (!raised || before.along === 0) {
      if (part.length > 1) parts.push(part)
      part = raised && before ? [before] : []
    } else if (part.length === 0) {
      part = [{ at: before.at, along: 0 }, before]
    }
    if (raised) part.push(point)
  })
  const last = part.at(-1)
  if (last && last.along > 0) part.push({ at: last.at, along: 0 })
  if (part.length > 1) parts.push(part)
  return parts.map(tidyPolygon).filter((polygon) => polygon.length > 2)
}

/** How deep a border's segment goes at a place it spans; of a step across the place the deeper end. */
const depthOn = (near: StripPoint, far: StripPoint, at: number): number => {
  const wide = far.at - near.at
  return wide > 0
    ? near.along + ((far.along - near.along) * (at - near.at)) / wide
    : Math.max(near.along, far.along)
}

/**
 * The deepest that a border goes at a place; at a step the deeper side counts. Starts at segment
 * `from` and gives back the first one that reaches the place, since the places are asked in order.
 */
const depthAt = (
  border: readonly StripPoint[],
  at: number,
  from: number,
): { readonly depth: number; readonly segment: number } => {
  let segment = from
  while ((border[segment + 1]?.at ?? Infinity) < at) segment += 1
  let depth = 0
  for (let index = segment; index < border.length - 1; index += 1) {
    const [near, far] = [border[index], border[index + 1]]
    if (!near || !far || near.at > at) break
    depth = Math.max(depth, depthOn(near, far, at))
  }
  return { depth, segment }
}

export interface Narrowest {
  readonly at: number
  /** What both borders together take there. */
  readonly taken: number
}

/** Where two borders over one strip come nearest: the place where together they take the most. */
export const narrowest = (left: readonly StripPoint[], right: readonly StripPoint[]): Narrowest => {
  let most: Narrowest = { at: 0, taken: -Infinity }
  let [leftSegment, rightSegment] = [0, 0]
  const places = [...left, ...right].map(({ at }) => at).toSorted((a, b) => a - b)
  for (const at of places) {
    const near = depthAt(left, at, leftSegment)
    const far = depthAt(right, at, rightSegment)
    leftSegment = near.segment
    rightSegment = far.segment
    if (near.depth + far.depth > most.taken) most = { at, taken: near.depth + far.depth }
  }
  return most
}
