import { radians } from '#shared/geometry/vector'
import { meetsSwinging } from '../collision/swing'
import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/**
 * The whole front, swung, against the rear: a thickness between sheet and sheet. It makes no difference
 * which of the two swings.
 */
export const meetsItself: FoldTest = {
  check: 'meetsItself',
  sees: 'piece',
  neverEases: false,
  find: ({ front, rear, piece, swing }) =>
    // Two straight runs from the bend line are not tested with each other.
    (front.outline.sideCount > 1 || rear.outline.sideCount > 1) &&
    meetsSwinging(front.outline, rear.outline, radians(swing), piece.thickness, true)
      ? NO_FIGURE
      : undefined,
}
