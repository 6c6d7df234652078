import type { EndProblem, StripLayout } from '#shared/ends/end-layout'
import type { PieceEnds } from '#shared/ends/end.schema'
import { layStrip } from '#shared/ends/lay-strip'
import { SQUARE_ENDS } from '#shared/ends/strip-borders'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import { completeEnds, type DraftEnds } from './draft-end'

export interface EndsCheck {
  /** Null while a measure is missing or out of its bounds; no ends at all are square ones. */
  readonly ends: PieceEnds | null
  /** Null while the strip cannot be laid out. */
  readonly layout: StripLayout | null
  readonly problems: readonly EndProblem[]
}

/** The ends of a line that is being written, laid out with the server's own code. */
export function checkEnds(
  draft: DraftEnds | null,
  profile: Profile,
  sheet: Sheet,
  pieceLength: Inches,
): EndsCheck {
  const ends = draft && completeEnds(draft)
  if (draft !== null && ends === null) return { ends, layout: null, problems: [] }
  return layComplete(ends, profile, sheet, pieceLength)
}

/** The same for ends that are complete; null is square and level. */
export function layComplete(
  ends: PieceEnds | null,
  profile: Profile,
  sheet: Sheet,
  pieceLength: Inches,
): EndsCheck {
  const laid = layStrip({ profile, sheet, pieceLength, ends })
  return laid.ok
    ? { ends: ends ?? SQUARE_ENDS, layout: laid.layout, problems: [] }
    : { ends: ends ?? SQUARE_ENDS, layout: null, problems: laid.problems }
}
