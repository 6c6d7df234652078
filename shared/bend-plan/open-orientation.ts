import { foldSetup } from './fold-setup'
import type { FoldGround } from './fold-setup'
import type { FoldTest } from './fold-tests/fold-test'
import { FOLD_TESTS } from './fold-tests/fold-tests'
import type { Orientation } from './orientation'
import type { PieceBend } from './workpiece'

/**
 * False where a fold fails on the flat sheet in a way that no bend made before could mend: in this
 * orientation it is never made.
 */
export const isEverOpen = (
  ground: FoldGround,
  bend: PieceBend,
  orientation: Orientation,
  tests: readonly FoldTest[] = FOLD_TESTS,
): boolean => {
  const setup = foldSetup(ground, 0, bend, orientation)
  return tests.every((test) => !test.neverEases || test.find(setup) === undefined)
}
