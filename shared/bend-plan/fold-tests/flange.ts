import { isLess } from '#shared/geometry/tolerance'
import type { FoldTest } from './fold-test'

/** Straight sheet in front of the bend line for the apron to take. */
export const flange: FoldTest = {
  check: 'flange',
  sees: 'front',
  neverEases: true,
  find: ({ bend, front, brake }) => {
    const least = bend.hem === null ? brake.minFlange : brake.hemMin
    return isLess(front.chain.firstRun, least)
      ? { found: front.chain.firstRun, limit: least }
      : undefined
  },
}
