import { meetsStill } from '../collision/still'
import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/** The rear, clamped, against inner and outer tool. */
export const rearMeetsTool: FoldTest = {
  check: 'rearMeetsTool',
  sees: 'rear',
  neverEases: false,
  find: ({ rear, tools, clearance }) =>
    meetsStill(rear.outline, tools.inner, clearance) ||
    meetsStill(rear.outline, tools.outer, clearance)
      ? NO_FIGURE
      : undefined,
}
