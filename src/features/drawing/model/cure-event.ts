import { resolveFollows } from '#shared/profile/follows'
import type { ProfileCure } from '#shared/profile/profile-cure'
import type { Board, BoardEvent } from './board'
import { editProfile } from './board-document'

/** The press on a cure: one step of undo. A bend that is tied to the roof again takes its angle. */
export function cureEvent(
  { history }: Pick<Board, 'history'>,
  cure: ProfileCure,
  pitchRise: number | null,
): BoardEvent {
  const cured = editProfile(history.present, cure)
  const tied = cure.kind === 'setFollows' && cured.profile !== null
  return {
    type: 'change',
    document: tied ? { ...cured, profile: resolveFollows(cured.profile, pitchRise) } : cured,
  }
}
