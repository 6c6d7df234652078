import type { EndLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Inches } from '#shared/units/brands'
import { SQUARE, otherSide } from '@/features/ends/model/end-edits'
import type { DraftEnd, DraftEnds } from '@/features/ends/model/draft-end'

/** What an end adds to the line on the roof: the point of a miter, and tabs beyond it. Inches. */
export interface EndExtra {
  readonly point: Inches
  readonly tab: Inches
}

export const NO_EXTRA: EndExtra = { point: 0, tab: 0 }

/** The point is how far the cut runs along the piece; tabs stand out before the least of it. */
export function extraOf({ marks }: EndLayout): EndExtra {
  const along = marks.map((mark) => mark.along)
  const least = Math.min(...along)
  return { point: Math.max(...along) - least, tab: least }
}

/** The end from which a line is counted: its low one, the left one of a level line. */
export const firstSide = (lowEnd: Side | null): Side => lowEnd ?? 'left'

/**
 * The ends of piece `index` of `count`, counted from the line's low or left end: outside as the
 * line's own, inside square or lapped. The uphill piece lies over the downhill one.
 */
export function endsOfPiece(
  outside: DraftEnds,
  index: number,
  count: number,
  lap: Inches | null,
): DraftEnds {
  const first = firstSide(outside.lowEnd)
  const last = otherSide(first)
  const inside = (side: 'over' | 'under'): DraftEnd =>
    lap === null || lap === 0 ? SQUARE : { kind: 'lap', side, length: lap, tabs: [] }
  return {
    ...outside,
    [first]: index === 0 ? outside[first] : inside('over'),
    [last]: index === count - 1 ? outside[last] : inside('under'),
  }
}
