import { radians } from '#shared/geometry/vector'
import { meetsSwinging } from '../collision/swing'
import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/** The front less its nose zone, swung to the overbent angle, against all tools at rest. */
export const frontMeetsTool: FoldTest = {
  check: 'frontMeetsTool',
  sees: 'front',
  neverEases: false,
  find: ({ front: { pastNose }, tools, clearance, swing }) =>
    pastNose !== undefined &&
    [tools.inner, tools.outer, tools.apron].some((tool) =>
      meetsSwinging(pastNose, tool, radians(swing), clearance),
    )
      ? NO_FIGURE
      : undefined,
}
