import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { findGoodSequence } from '#shared/bend-plan/beam-search'
import { createHeap } from '#shared/bend-plan/heap'
import { ORIENTATIONS } from '#shared/bend-plan/orientation'
import { packCost } from '#shared/bend-plan/packed-cost'
import { planSteps } from '#shared/bend-plan/plan-steps'
import { planBends } from '#shared/bend-plan/planner'
import { replayPlan } from '#shared/bend-plan/replay'
import { searchGroundOf } from '#shared/bend-plan/search-ground-of'
import { allBends } from '#shared/bend-plan/workpiece'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import {
  CASES,
  SEEDS,
  request,
  requestArbitrary,
  wildBrake,
  wildRequest,
} from '../../support/bend-plan-cases'
import { sectionsOf } from '../../bench/plan-families'

describe.each(SEEDS)('the bound of the search ($name seed $seed)', ({ seed }) => {
  test('is consistent: a fold and its move never cost less than they take off it', () => {
    let edges = 0
    fc.assert(
      fc.property(wildRequest(7, 2, wildBrake), (asked) => {
        const { piece, cost, feasibility, lowerBound } = searchGroundOf(asked)
        const open = piece.bends.map((bend) =>
          [...ORIENTATIONS.keys()].filter((o) => feasibility.isEverOpen(bend, o)),
        )
        for (let made = 1; made <= allBends(piece); made++) {
          for (const bend of piece.bends.filter(({ index }) => (made & (1 << index)) !== 0)) {
            const rest = made & ~(1 << bend.index)
            for (const before of open[bend.index] ?? []) {
              const fold =
                cost.fixed(bend, before) + cost.gauge(rest, bend, before) + lowerBound(rest, before)
              for (const after of ORIENTATIONS.keys()) {
                edges++
                if (lowerBound(made, after) <= cost.move(before, after) + fold) continue
                expect({ made, bend: bend.index, before, after }).toBe('consistent')
              }
            }
          }
        }
      }),
      { seed, numRuns: 150 },
    )
    expect(edges).toBeGreaterThan(100_000)
  })

  test('never exceeds the cheapest sequence', () => {
    fc.assert(
      fc.property(fc.oneof(wildRequest(7, 2), requestArbitrary(7)), (asked) => {
        const plan = planBends(asked)
        fc.pre(plan.cost !== null)
        const { piece, lowerBound } = searchGroundOf(asked)
        const least = Math.min(...ORIENTATIONS.map((_, end) => lowerBound(allBends(piece), end)))
        expect(least).toBeLessThanOrEqual(plan.cost ? packCost(plan.cost) : NaN)
      }),
      { seed, numRuns: 150 },
    )
  })
})

describe('a good sequence', () => {
  test('may be made, costs what it says, and is no cheaper than the cheapest', () => {
    let found = 0
    fc.assert(
      fc.property(requestArbitrary(8), (asked) => {
        const plan = planBends(asked)
        const ground = searchGroundOf(asked)
        const good = findGoodSequence(ground, Infinity)
        if (good === undefined) return
        if (plan.cost === null) throw new Error('A sequence was found where there is none.')
        found++
        const replay = replayPlan({ ...plan, steps: planSteps(ground, good.operations) }, asked)
        expect(replay.problems).toEqual([])
        expect(packCost(replay.cost)).toBe(good.cost)
        expect(good.cost).toBeGreaterThanOrEqual(packCost(plan.cost))
      }),
      { ...CASES, numRuns: 200 },
    )
    expect(found).toBeGreaterThan(60)
  })

  test('none is offered that is not cheaper than asked for', () => {
    const asked = request(
      sectionsOf('panel', 6, 1)[0] ?? { legs: [1], turns: [], hemA: null, hemB: null },
      DEMO_BRAKE.upAndDown,
    )
    const ground = searchGroundOf(asked)
    const good = findGoodSequence(ground, Infinity)
    if (good === undefined) throw new Error('The panel bends')
    expect(findGoodSequence(ground, good.cost)).toBeUndefined()
  })
})

describe('heap', () => {
  test('gives the least key first, and of equals the entry put in first', () => {
    fc.assert(
      fc.property(fc.array(fc.nat(40), { maxLength: 600 }), (keys) => {
        const heap = createHeap()
        keys.forEach((key, entry) => {
          heap.push(entry, key)
        })
        const taken = keys.map(() => {
          const key = heap.leastKey()
          return [key, heap.pop()]
        })
        const sorted = keys
          .map((key, entry) => [key, entry])
          .sort(([a = 0, i = 0], [b = 0, j = 0]) => a - b || i - j)
        expect(taken).toEqual(sorted)
        expect([heap.leastKey(), heap.pop()]).toEqual([undefined, undefined])
      }),
      CASES,
    )
  })
})
