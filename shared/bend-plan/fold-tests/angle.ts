import { isAtMost, isLess } from '#shared/geometry/tolerance'
import { radians } from '#shared/geometry/vector'
import type { FoldTest } from './fold-test'

/**
 * A plain bend, overbend included, within the brake's greatest fold. A hem folds to the hem angle:
 * its lip within the brake's hems, and under the open clamp, which then flattens it.
 */
export const angle: FoldTest = {
  check: 'angle',
  sees: 'bend',
  neverEases: true,
  find: ({ bend, swing, brake }) => {
    if (bend.hem === null) {
      return isAtMost(swing, brake.maxFold) ? undefined : { found: swing, limit: brake.maxFold }
    }
    const { lip } = bend.hem
    if (isLess(lip, brake.hemMin)) return { found: lip, limit: brake.hemMin }
    if (isLess(brake.hemMax, lip)) return { found: lip, limit: brake.hemMax }
    const tallest = brake.opening / Math.sin(radians(brake.hemAngle))
    return isAtMost(lip, tallest) ? undefined : { found: lip, limit: tallest }
  },
}
