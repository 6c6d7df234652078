import type { Side } from '#shared/ends/end.schema'
import { mirrorEnds } from '#shared/ends/hands'
import type { Inches } from '#shared/units/brands'
import {
  completeEnd,
  type DraftEnd,
  type DraftEnds,
  type DraftMiter,
  type DraftPlane,
} from './draft-end'

/** What a lap begins with, inches. Common practice, no source. */
export const USUAL_LAP: Inches = 4
/** What a tab begins with, inches. Common practice, no source. */
export const USUAL_TAB: Inches = 1

export const SQUARE: DraftEnd = { kind: 'square', tabs: [] }
export const BOTH_SQUARE: DraftEnds = { left: SQUARE, right: SQUARE, lowEnd: null }

export const otherSide = (side: Side): Side => (side === 'left' ? 'right' : 'left')

/** The plane that cuts straight across the piece. */
export const SQUARE_PLANE: DraftPlane = { normal: [1, 0, 0] }

const isPlainSquare = (end: DraftEnd): boolean => end.kind === 'square' && end.tabs.length === 0

/** Ends that say no more than "square and level" are no ends. */
export const endsToKeep = (ends: DraftEnds): DraftEnds | null =>
  ends.lowEnd === null && isPlainSquare(ends.left) && isPlainSquare(ends.right) ? null : ends

export const withEnd = (ends: DraftEnds, side: Side, end: DraftEnd): DraftEnds => ({
  ...ends,
  [side]: end,
})

/** Another kind of end; its tabs stay. A miter begins with `miter`. */
export function withKind(
  end: DraftEnd,
  kind: DraftEnd['kind'],
  miter: Pick<DraftMiter, 'plane' | 'lay'>,
): DraftEnd {
  const { tabs } = end
  switch (kind) {
    case 'square':
      return { kind, tabs }
    case 'lap':
      return { kind, side: 'over', length: USUAL_LAP, tabs }
    case 'miter':
      return { kind, ...miter, legs: [], tabs }
  }
}

export const tabOf = (end: DraftEnd, leg: number) => end.tabs.find((tab) => tab.leg === leg)

/** `length` undefined takes the tab away; null is one whose length is still to be typed. */
export function withTab(end: DraftEnd, leg: number, length: Inches | null | undefined): DraftEnd {
  const others = end.tabs.filter((tab) => tab.leg !== leg)
  const tabs = length === undefined ? others : [...others, { leg, length }]
  return { ...end, tabs: tabs.toSorted((a, b) => a.leg - b.leg) }
}

export const planeOfLeg = (end: DraftMiter, leg: number): DraftPlane | undefined =>
  end.legs.find((own) => own.leg === leg)?.plane

/** `plane` null cuts the leg by the end's own plane again. */
export function withLegPlane(end: DraftMiter, leg: number, plane: DraftPlane | null): DraftMiter {
  const others = end.legs.filter((own) => own.leg !== leg)
  const legs = plane === null ? others : [...others, { leg, plane }]
  return { ...end, legs: legs.toSorted((a, b) => a.leg - b.leg) }
}

/** The piece lies one way on the roof, so both its miters have the same lay. */
export const withLay = (ends: DraftEnds, lay: number | null): DraftEnds => {
  const laid = (end: DraftEnd): DraftEnd => (end.kind === 'miter' ? { ...end, lay } : end)
  return { ...ends, left: laid(ends.left), right: laid(ends.right) }
}

/** Undefined where no end is a miter. */
export const layOf = ({ left, right }: DraftEnds): number | null | undefined =>
  left.kind === 'miter' ? left.lay : right.kind === 'miter' ? right.lay : undefined

/**
 * The end of `from` on the other end too, as its mirror image. Null while it is not complete.
 */
export function copiedMirrored(ends: DraftEnds, from: Side): DraftEnds | null {
  const end = completeEnd(ends[from])
  if (end === null) return null
  const mirrored = mirrorEnds({ left: end, right: end, lowEnd: null })
  const to = otherSide(from)
  return withEnd(ends, to, mirrored[to])
}
