import { canDrawOut } from '../collision/draw-out'
import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/** The piece before the fold, a hem's lip still flat, must go into the clamp from the front. */
export const cannotLoad: FoldTest = {
  check: 'cannotLoad',
  sees: 'all',
  neverEases: false,
  find: ({ brake, rear, front, tools, clearance }) =>
    !brake.checkRemoval || canDrawOut(rear.outline, front.pastNose, tools, brake.opening, clearance)
      ? undefined
      : NO_FIGURE,
}
