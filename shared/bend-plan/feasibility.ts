import { isEqual } from '#shared/geometry/tolerance'
import type { ToolSet } from './brake.schema'
import { foldSetup } from './fold-setup'
import type { FoldGround } from './fold-setup'
import type { FoldFailure, FoldTest } from './fold-tests/fold-test'
import { FOLD_TESTS } from './fold-tests/fold-tests'
import { directionOf, frontSide, getOrientation, rearSide } from './orientation'
import type { PlanCheck } from './plan.schema'
import { bendsBeside } from './workpiece'
import type { PieceBend } from './workpiece'

export interface FailedCheck extends FoldFailure {
  readonly check: PlanCheck
}

export interface Feasibility {
  /** May this fold be made, all tests taken together? Remembers what it has been asked. */
  readonly passes: (made: number, bend: PieceBend, orientation: number) => boolean
  /** The first test, in their order, that this fold fails. */
  readonly firstFailure: (
    made: number,
    bend: PieceBend,
    orientation: number,
  ) => FailedCheck | undefined
}

const isSamePolygon = (a: ToolSet['inner'], b: ToolSet['inner']): boolean =>
  a.length === b.length &&
  a.every(([x, y], i) => {
    const other = b[i]
    return other !== undefined && isEqual(x, other[0]) && isEqual(y, other[1])
  })

const isSameToolSet = (a: ToolSet, b: ToolSet): boolean =>
  isSamePolygon(a.inner, b.inner) &&
  isSamePolygon(a.outer, b.outer) &&
  isSamePolygon(a.apron, b.apron)

/** A group of tests that see the same part of the made set, with what they answered. */
interface Group {
  readonly sees: FoldTest['sees']
  readonly tests: readonly FoldTest[]
  readonly known: Map<number, boolean>
}

const SEEN = ['bend', 'front', 'rear', 'all'] as const satisfies readonly FoldTest['sees'][]

/**
 * The tests of section and brake as one question, cheapest part first. A test that sees one side only
 * is remembered by that side's made bits, which the many made sets of a search share.
 */
export const createFeasibility = (
  ground: FoldGround,
  tests: readonly FoldTest[] = FOLD_TESTS,
): Feasibility => {
  const { piece, brake } = ground
  const groups: readonly Group[] = SEEN.map((sees) => ({
    sees,
    tests: tests.filter((test) => test.sees === sees),
    known: new Map<number, boolean>(),
  }))
  // The fold frame is the same for both directions, so equal tools give equal answers.
  const sharesTools = brake.down !== null && isSameToolSet(brake.up, brake.down)

  const seenBits = (group: Group, made: number, bend: PieceBend, orientation: number): number => {
    const o = getOrientation(orientation)
    switch (group.sees) {
      case 'bend':
        return 0
      case 'front':
        return made & bendsBeside(piece, bend, frontSide(o))
      case 'rear':
        return made & bendsBeside(piece, bend, rearSide(o))
      case 'all':
        return made
    }
  }

  const passes = (made: number, bend: PieceBend, orientation: number): boolean => {
    const o = getOrientation(orientation)
    const way = sharesTools || directionOf(bend, o) === 'up' ? 0 : 1
    const place = (bend.index * 2 + (o.aBack ? 1 : 0)) * 2 + way
    const setup = () => foldSetup(ground, made, bend, o)
    let built: ReturnType<typeof setup> | undefined
    return groups.every((group) => {
      if (group.tests.length === 0) return true
      const key = seenBits(group, made, bend, orientation) * 128 + place
      const known = group.known.get(key)
      if (known !== undefined) return known
      built ??= setup()
      const current = built
      const answer = group.tests.every((test) => test.find(current) === undefined)
      group.known.set(key, answer)
      return answer
    })
  }

  const firstFailure = (made: number, bend: PieceBend, orientation: number) => {
    const setup = foldSetup(ground, made, bend, getOrientation(orientation))
    for (const test of tests) {
      const failure = test.find(setup)
      if (failure !== undefined) return { check: test.check, ...failure }
    }
    return undefined
  }

  return { passes, firstFailure }
}
