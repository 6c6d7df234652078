import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/** The brake must fold this way at all. */
export const direction: FoldTest = {
  check: 'direction',
  sees: 'bend',
  neverEases: true,
  find: ({ direction, brake }) =>
    direction === 'down' && brake.down === null ? NO_FIGURE : undefined,
}
