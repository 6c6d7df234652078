import type { Profile } from '#shared/profile/profile.schema'
import { findStarter, starterHeading, starterProfile } from '#shared/profile/starters'
import { resolveFollows } from '#shared/profile/follows'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import type { DraftLine, OrderDraft } from '@/features/orders/draft/order-draft'
import { parseParameters } from '@/features/shelf/starter/starter-address'
import { boardOf, EMPTY_BOARD, type BoardDocument } from '@/features/drawing/model/board-document'

/** What the board opens with: a line of the draft, a copy of a shelf profile, or an empty sheet. */
export interface DrawingStart {
  readonly document: BoardDocument
  readonly line: DraftLine | null
  /** The name taken over from the shelf; null for a drawing of one's own. */
  readonly shelfProfile: ShelfProfile | null
}

interface Wanted {
  readonly lineKey: string | null
  readonly shelfId: string | null
  /** What is set of a starter, as it stands in the address; null where all has its default. */
  readonly set: string | null
}

/** Null when something was asked for that is not there: a line, a shelf profile, a measure of a starter. */
export function drawingStart(
  { lineKey, shelfId, set }: Wanted,
  draft: OrderDraft,
  shelf: readonly ShelfProfile[],
  pitchRise: number,
): DrawingStart | null {
  if (lineKey !== null) {
    const line = draft.lines.find(({ key }) => key === lineKey)
    return line ? { document: onRoof(line.profile, pitchRise), line, shelfProfile: null } : null
  }
  if (shelfId !== null) {
    const shelfProfile = shelf.find(({ id }) => id === shelfId)
    const document = shelfProfile && madeOf(shelfProfile, set, pitchRise)
    return document ? { document, line: null, shelfProfile } : null
  }
  return { document: EMPTY_BOARD, line: null, shelfProfile: null }
}

/** A starter as it was made to the roof and lies on it; what a company saved as it is. */
function madeOf(
  { starterKey, profile }: ShelfProfile,
  set: string | null,
  pitchRise: number,
): BoardDocument | null {
  const starter = starterKey === null ? undefined : findStarter(starterKey)
  if (!starter) return set === null ? onRoof(profile, pitchRise) : null
  const parameters = set === null ? {} : parseParameters(starter, set)
  if (!parameters) return null
  const made = starterProfile(starter.key, parameters, pitchRise)
  return boardOf(made, starterHeading(starter.key, made, pitchRise))
}

/** Angles that follow the roof take the pitch of the job the piece is drawn for. */
const onRoof = (profile: Profile, pitchRise: number): BoardDocument =>
  boardOf(resolveFollows(profile, pitchRise))
