import { radians } from '#shared/geometry/vector'
import { canDrawOut } from '../collision/draw-out'
import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/** The piece after the fold, not overbent, must come out to the front; of a finished hem the rear alone. */
export const trapped: FoldTest = {
  check: 'trapped',
  sees: 'all',
  neverEases: false,
  find: ({ bend, brake, rear, front, tools, clearance }) => {
    if (!brake.checkRemoval) return undefined
    const folded =
      bend.hem === null ? front.pastNose?.swung(radians(Math.abs(bend.turn))) : undefined
    return canDrawOut(rear.outline, folded, tools, brake.opening, clearance) ? undefined : NO_FIGURE
  },
}
