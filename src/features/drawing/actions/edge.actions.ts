import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { Board, BoardEvent } from '../model/board'
import { editProfile, type Edge } from '../model/board-document'
import type { BoardAction } from './board-action'

/** The shop's usual closed hem and kick, in inches and degrees: common practice, no source. */
const HEM_LENGTH = 0.5
const KICK_LENGTH = 0.75
const KICK_TURN = 45

/** A hem is laid to the bare side, so that the color shows on the edge. */
const usualHem = ({ colorSide }: Profile): Hem => ({
  style: 'closed',
  length: HEM_LENGTH,
  turn: colorSide === 'right' ? 1 : -1,
})

function toggleHem({ history }: Board, edge: Edge): BoardEvent | null {
  const { profile } = history.present
  if (profile === null) return null
  const has = (edge === 'A' ? profile.hemA : profile.hemB) !== null
  const hem = has ? null : usualHem(profile)
  return {
    type: 'change',
    document: editProfile(history.present, { kind: 'setHem', edge, hem }),
    selection: has ? { kind: 'edge', edge } : { kind: 'hem', edge },
  }
}

export const hemAAction: BoardAction = {
  id: 'hemA',
  shortcuts: [],
  perform: (board) => toggleHem(board, 'A'),
  isOn: ({ history }) => (history.present.profile?.hemA ?? null) !== null,
}

export const hemBAction: BoardAction = {
  id: 'hemB',
  shortcuts: [],
  perform: (board) => toggleHem(board, 'B'),
  isOn: ({ history }) => (history.present.profile?.hemB ?? null) !== null,
}

/**
 * A short last leg at edge B that stands off: turned to the color side, away from the wall the
 * bare side lies on.
 */
export const addKickAction: BoardAction = {
  id: 'addKick',
  shortcuts: [],
  perform: ({ history }) => {
    const { profile } = history.present
    if (profile === null) return null
    const turn = profile.colorSide === 'right' ? -KICK_TURN : KICK_TURN
    const edit = { kind: 'addLeg', edge: 'B', length: KICK_LENGTH, turn } as const
    return {
      type: 'change',
      document: editProfile(history.present, edit),
      selection: { kind: 'leg', leg: profile.legs.length + 1 },
    }
  },
}
