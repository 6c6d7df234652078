import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/** A hem's lip must lie at the front. */
export const hemSide: FoldTest = {
  check: 'hemSide',
  sees: 'bend',
  neverEases: true,
  find: ({ bend, orientation }) =>
    bend.hem !== null && (bend.fold === 'hemB') !== orientation.aBack ? NO_FIGURE : undefined,
}
