import type { End, Hands, PieceEnds } from '#shared/ends/end.schema'
import { pitchAngle } from '#shared/units/angle'

/** What a line of a story says beyond its length: ends, hands, the girth the crew expects. */
export interface Dressing {
  readonly ends?: PieceEnds
  readonly hands?: Hands
  readonly statedGirth?: number
}

const square = (tabs: End['tabs'] = []): End => ({ kind: 'square', tabs })

const lap = (side: 'under' | 'over', length: number): End => ({
  kind: 'lap',
  side,
  length,
  tabs: [],
})

/** Rises to the right: its face is closed by a tab at the eave, and cut plumb where it meets its twin. */
export const gableEnds = (pitchRise: number): PieceEnds => ({
  left: square([{ leg: 2, length: 1 }]),
  right: { kind: 'miter', plane: { plumb: pitchAngle(pitchRise) }, lay: 0, legs: [], tabs: [] },
  lowEnd: 'left',
})

/** Level, and goes round a square corner of the building at its right end. */
export const cornerEnds: PieceEnds = {
  left: square(),
  right: {
    kind: 'miter',
    plane: { corner: { slopeIn: 0, slopeOut: 0, plan: 90 } },
    lay: 0,
    legs: [],
    tabs: [],
  },
  lowEnd: null,
}

/** Pieces of a level line, laid from its left: each slips under the next one. */
export const lappedEnds = (length: number) => ({
  first: { left: square(), right: lap('under', length), lowEnd: null },
  middle: { left: lap('over', length), right: lap('under', length), lowEnd: null },
  last: { left: lap('over', length), right: square(), lowEnd: null },
})
