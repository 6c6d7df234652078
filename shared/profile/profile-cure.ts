import type { ProfileEdit } from '#shared/profile/edits'

/** The edits that cure a problem; the others change more than one thing that was meant. */
export type ProfileCure = Extract<
  ProfileEdit,
  { kind: 'setLeg' | 'setTurn' | 'setFollows' | 'removeCorner' | 'setHem' }
>
