import type { Profile } from '#shared/profile/profile.schema'
import { resolveFollows } from '#shared/profile/follows'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import type { DraftLine, OrderDraft } from '@/features/orders/draft/order-draft'
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
}

/** Null when a line or a shelf profile was asked for that is not there. */
export function drawingStart(
  { lineKey, shelfId }: Wanted,
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
    return shelfProfile
      ? { document: onRoof(shelfProfile.profile, pitchRise), line: null, shelfProfile }
      : null
  }
  return { document: EMPTY_BOARD, line: null, shelfProfile: null }
}

/** Angles that follow the roof take the pitch of the job the piece is drawn for. */
const onRoof = (profile: Profile, pitchRise: number): BoardDocument =>
  boardOf(resolveFollows(profile, pitchRise))
