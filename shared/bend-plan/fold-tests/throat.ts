import { isAtMost } from '#shared/geometry/tolerance'
import type { FoldTest } from './fold-test'

/** The depth of the rear chain must find room behind the clamp. */
export const throat: FoldTest = {
  check: 'throat',
  sees: 'rear',
  neverEases: false,
  find: ({ rear, brake }) => {
    const depth = 0 - rear.outline.box.left
    return isAtMost(depth, brake.throat) ? undefined : { found: depth, limit: brake.throat }
  },
}
