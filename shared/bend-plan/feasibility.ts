import { createAnswerTable } from './answer-table'
import type { AnswerTable } from './answer-table'
import { foldSetup } from './fold-setup'
import type { FoldGround } from './fold-setup'
import type { FoldFailure, FoldTest } from './fold-tests/fold-test'
import { FOLD_TESTS } from './fold-tests/fold-tests'
import { isEverOpen } from './open-orientation'
import { ORIENTATIONS, directionOf, frontSide, getOrientation, rearSide } from './orientation'
import type { PlanCheck } from './plan.schema'
import { hasSameToolsBothWays } from './tool-sets'
import type { PieceBend, Side } from './workpiece'

export interface FailedCheck extends FoldFailure {
  readonly check: PlanCheck
}

export interface Feasibility {
  /** May this fold be made, all tests taken together? Remembers what it has been asked. */
  readonly passes: (made: number, bend: PieceBend, orientation: number) => boolean
  /** False where no bends made before could let the fold pass in this orientation. */
  readonly isEverOpen: (bend: PieceBend, orientation: number) => boolean
  /** The orientations, by number, that can give different answers for a bend; none where none passes. */
  readonly orientationsToTry: (bend: PieceBend) => readonly number[]
  /** The first test, in their order, that this fold fails; of all tests or of those named. */
  readonly firstFailure: (
    made: number,
    bend: PieceBend,
    orientation: number,
    among?: (test: FoldTest) => boolean,
  ) => FailedCheck | undefined
}

/** Tests that see the same part of the made set: that part as a number, and what they answered. */
interface Group {
  readonly tests: readonly FoldTest[]
  readonly keyOf: (made: number) => number
  readonly known: AnswerTable
}

/** One bend in one orientation. */
interface Slot {
  /** False where no bends made before could let it pass. */
  readonly isOpen: boolean
  readonly groups: readonly Group[]
  /** Slots with equal answers carry equal numbers. */
  readonly answersLike: number
}

/**
 * The tests of section and brake as one question, cheapest part first. A test that sees one side only
 * is remembered by that side's made bits, which the many made sets of a search share.
 */
export const createFeasibility = (
  ground: FoldGround,
  tests: readonly FoldTest[] = FOLD_TESTS,
): Feasibility => {
  const { piece, brake } = ground
  const count = piece.bends.length
  const sharesTools = hasSameToolsBothWays(brake)
  const testsOf = (sees: FoldTest['sees']) => tests.filter((test) => test.sees === sees)
  const testsByPart = {
    hems: testsOf('hems'),
    front: testsOf('front'),
    rear: testsOf('rear'),
    piece: testsOf('piece'),
    all: testsOf('all'),
  }

  const group = (
    of: readonly FoldTest[],
    bits: number,
    keyOf: (made: number) => number,
  ): readonly Group[] =>
    of.length === 0 ? [] : [{ tests: of, keyOf, known: createAnswerTable(2 ** bits) }]

  const sideGroup = (of: readonly FoldTest[], bend: PieceBend, side: Side): readonly Group[] => {
    const bits = side === 'A' ? bend.index : count - 1 - bend.index
    const mask = 2 ** bits - 1
    const shift = side === 'A' ? 0 : bend.index + 1
    return group(of, bits, (made) => (made >>> shift) & mask)
  }

  const wholeGroup = (of: readonly FoldTest[]) => group(of, count, (made) => made)

  const groupsOf = (
    bend: PieceBend,
    orientation: number,
    inEvery: readonly Group[],
  ): readonly Group[] => {
    const o = getOrientation(orientation)
    return [
      // Hems are the outermost bends.
      ...group(testsByPart.hems, 2, (made) => (made & 1) + 2 * ((made >>> (count - 1)) & 1)),
      ...sideGroup(testsByPart.front, bend, frontSide(o)),
      ...sideGroup(testsByPart.rear, bend, rearSide(o)),
      ...inEvery,
      ...wholeGroup(testsByPart.all),
    ]
  }

  const slots: Slot[][] = piece.bends.map((bend) => {
    const shared = new Map<number, readonly Group[]>()
    const inEvery = wholeGroup(testsByPart.piece)
    return ORIENTATIONS.map((o, orientation) => {
      const way = sharesTools || directionOf(bend, o) === 'up' ? 0 : 1
      const answersLike = way * 2 + (o.aBack ? 1 : 0)
      const groups = shared.get(answersLike) ?? groupsOf(bend, orientation, inEvery)
      shared.set(answersLike, groups)
      return { isOpen: isEverOpen(ground, bend, o, tests), groups, answersLike }
    })
  })

  const ask = (of: Group, made: number, bend: PieceBend, orientation: number): boolean => {
    const setup = foldSetup(ground, made, bend, getOrientation(orientation))
    return of.tests.every((test) => test.find(setup) === undefined)
  }

  const passes = (made: number, bend: PieceBend, orientation: number): boolean => {
    const slot = slots[bend.index]?.[orientation]
    if (slot === undefined || !slot.isOpen) return false
    for (const each of slot.groups) {
      const key = each.keyOf(made)
      let answer = each.known.find(key)
      if (answer === undefined) {
        answer = ask(each, made, bend, orientation)
        each.known.set(key, answer)
      }
      if (!answer) return false
    }
    return true
  }

  const tries = slots.map((of) =>
    [...of.keys()].filter(
      (o) =>
        of[o]?.isOpen === true &&
        !of.slice(0, o).some((x) => x.isOpen && x.answersLike === of[o]?.answersLike),
    ),
  )

  const firstFailure: Feasibility['firstFailure'] = (made, bend, orientation, among) => {
    const setup = foldSetup(ground, made, bend, getOrientation(orientation))
    for (const test of tests) {
      if (among !== undefined && !among(test)) continue
      const failure = test.find(setup)
      if (failure !== undefined) return { check: test.check, ...failure }
    }
    return undefined
  }

  return {
    passes,
    isEverOpen: (bend, orientation) => slots[bend.index]?.[orientation]?.isOpen ?? false,
    orientationsToTry: (bend) => tries[bend.index] ?? [],
    firstFailure,
  }
}
