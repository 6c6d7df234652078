import { editProfile, reverseWalk } from '../model/board-document'
import type { BoardAction } from './board-action'

export const flipColorAction: BoardAction = {
  id: 'flipColor',
  shortcuts: [],
  perform: ({ history }) =>
    history.present.profile?.colorSide === 'left' || history.present.profile?.colorSide === 'right'
      ? { type: 'change', document: editProfile(history.present, { kind: 'flipColorSide' }) }
      : null,
}

export const mirrorAction: BoardAction = {
  id: 'mirror',
  shortcuts: [],
  perform: ({ history }) =>
    history.present.profile === null
      ? null
      : { type: 'change', document: editProfile(history.present, { kind: 'mirror' }) },
}

export const reverseAction: BoardAction = {
  id: 'reverse',
  shortcuts: [],
  perform: ({ history }) =>
    history.present.profile === null
      ? null
      : {
          type: 'change',
          document: reverseWalk(history.present),
          selection: { kind: 'leg', leg: 1 },
        },
}
