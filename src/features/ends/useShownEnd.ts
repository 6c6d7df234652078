import { useMemo, useState } from 'react'
import type { StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { EndOfPiece } from '#shared/ends/folded-end'
import { mirrorEnds } from '#shared/ends/hands'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import { layComplete, type EndsCheck } from './model/check-ends'
import type { DraftHands } from './model/draft-end'
import { otherHand } from './model/hand-edits'

interface Asked {
  readonly profile: Profile
  readonly sheet: Sheet
  readonly pieceLength: Inches
  readonly check: EndsCheck | null
  readonly side: Side
  readonly hands: DraftHands | null
}

export interface ShownEnd {
  /** Null while the ends cannot be laid out. */
  readonly own: EndOfPiece | null
  readonly layout: StripLayout | null
  /** The hand that can be shown besides the drawn one; null where there is none. */
  readonly other: Side | null
  readonly mirrored: boolean
  readonly setMirrored: (mirrored: boolean) => void
}

/** An end as the pictures show it: as it is drawn, or that of the other hand. */
export function useShownEnd({ profile, sheet, pieceLength, check, side, hands }: Asked): ShownEnd {
  const [wanted, setMirrored] = useState(false)
  const other = otherHand(hands)
  const mirrored = wanted && other !== null
  const drawn = check?.layout ? check.ends : null
  const shown = useMemo(() => {
    if (drawn === null) return null
    return layComplete(mirrored ? mirrorEnds(drawn) : drawn, profile, sheet, pieceLength)
  }, [drawn, mirrored, profile, sheet, pieceLength])
  const end = shown?.ends?.[side]
  const layout = shown?.layout ?? null
  const own = useMemo<EndOfPiece | null>(
    () => (end && layout ? { profile, sheet, end, side } : null),
    [end, layout, profile, sheet, side],
  )
  return { own, layout, other, mirrored, setMirrored }
}
