import { isLess } from '#shared/geometry/tolerance'
import type { FoldTest } from './fold-test'

/** Straight sheet behind the bend line for the clamp to hold, hems too. */
export const clamp: FoldTest = {
  check: 'clamp',
  sees: 'rear',
  neverEases: true,
  find: ({ rear, brake }) =>
    isLess(rear.chain.firstRun, brake.minClamp)
      ? { found: rear.chain.firstRun, limit: brake.minClamp }
      : undefined,
}
