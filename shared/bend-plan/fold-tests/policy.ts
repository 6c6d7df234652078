import { NO_FIGURE } from './fold-test'
import type { FoldTest } from './fold-test'

/** Where the shop makes hems first: no plain bend while a hem is unmade. */
export const policy: FoldTest = {
  check: 'policy',
  sees: 'hems',
  neverEases: false,
  find: ({ bend, brake, piece, made }) =>
    brake.hemsFirst &&
    bend.hem === null &&
    piece.bends.some((other) => other.hem !== null && (made & (1 << other.index)) === 0)
      ? NO_FIGURE
      : undefined,
}
