import { radians } from '#shared/geometry/vector'
import { meetsSwinging } from '../collision/swing'
import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/** The whole front, swung, against the rear: a thickness between sheet and sheet. */
export const meetsItself: FoldTest = {
  check: 'meetsItself',
  sees: 'all',
  neverEases: false,
  find: ({ front, rear, piece, swing }) =>
    meetsSwinging(front.outline, rear.outline, radians(swing), piece.thickness, true)
      ? NO_FIGURE
      : undefined,
}
