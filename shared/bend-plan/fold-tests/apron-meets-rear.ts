import { radians } from '#shared/geometry/vector'
import { meetsSwinging } from '../collision/swing'
import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/** The apron, swung, against the rear. */
export const apronMeetsRear: FoldTest = {
  check: 'apronMeetsRear',
  sees: 'rear',
  neverEases: false,
  find: ({ rear, tools, clearance, swing }) =>
    meetsSwinging(tools.apron, rear.outline, radians(swing), clearance) ? NO_FIGURE : undefined,
}
