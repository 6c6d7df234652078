import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { foldGroundOf, foldSetup } from '#shared/bend-plan/fold-setup'
import { FOLD_TESTS } from '#shared/bend-plan/fold-tests/fold-tests'
import type { PlanCheck } from '#shared/bend-plan/plan.schema'
import { PLAN_CHECKS } from '#shared/bend-plan/plan.schema'
import { SEEDS, wildBrake, wildRequest } from '../../support/bend-plan-cases'
import { naiveFold } from '../../support/naive-folds'

/** A fold of a random piece with a random set of its bends made. */
const foldArbitrary = fc.record({
  asked: wildRequest(6, 1, wildBrake),
  bits: fc.integer({ min: 0, max: 63 }),
  place: fc.nat(),
  leftUp: fc.boolean(),
  aBack: fc.boolean(),
})

describe.each(SEEDS)('each test of a fold, written twice ($name seed $seed)', ({ name, seed }) => {
  test('the exact one agrees with one by small steps', () => {
    const told = new Map<PlanCheck, { clear: number; meets: number; unsure: number }>(
      PLAN_CHECKS.map((check) => [check, { clear: 0, meets: 0, unsure: 0 }]),
    )
    fc.assert(
      fc.property(foldArbitrary, ({ asked, bits, place, leftUp, aBack }) => {
        const ground = foldGroundOf(asked.section, asked.sheet, asked.brake)
        const { bends } = ground.piece
        const bend = bends[place % bends.length]
        if (bend === undefined) throw new Error('A piece without bends')
        const made = bits & (2 ** bends.length - 1) & ~(1 << bend.index)
        const orientation = { leftUp, aBack }
        const setup = foldSetup(ground, made, bend, orientation)
        const naive = naiveFold(asked, {
          made: new Set(bends.flatMap(({ index }) => ((made >> index) & 1 ? [index] : []))),
          bend: bend.index,
          ...orientation,
        })
        for (const fold of FOLD_TESTS) {
          const verdict = naive.get(fold.check)
          if (verdict === undefined) continue
          const count = told.get(fold.check)
          if (count !== undefined) count[verdict]++
          if (verdict === 'unsure') continue
          const exact = fold.find(setup) === undefined ? 'clear' : 'meets'
          expect([fold.check, exact]).toEqual([fold.check, verdict])
        }
      }),
      { seed, numRuns: name === 'fixed' ? 400 : 200 },
    )
    if (name !== 'fixed') return
    for (const [check, { clear, meets, unsure }] of told) {
      // Both answers must occur, and nearly all be told, or the agreement says little.
      expect([check, clear > 5, meets > 5]).toEqual([check, true, true])
      expect([check, unsure < (clear + meets) / 20]).toEqual([check, true])
    }
  })
})
