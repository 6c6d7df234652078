import { describe, expect, test } from 'vitest'
import { DEMO_BRAKE, DEMO_BRAKES, findDemoBrake } from '#shared/bend-plan/demo-brakes'
import { brakeSchema } from '#shared/bend-plan/brake.schema'
import { findCapacity } from '#shared/bend-plan/capacity'
import { planProfile } from '#shared/bend-plan/plan-profile'
import { planBends } from '#shared/bend-plan/planner'
import { replayPlan } from '#shared/bend-plan/replay'
import { STEEL_24, hem, request, section } from '../../support/bend-plan-cases'

const { upOnly, upAndDown, site } = DEMO_BRAKE

describe('demo brakes', () => {
  test('keep their schema and are found by name and by key', () => {
    expect(DEMO_BRAKES).toHaveLength(3)
    for (const brake of DEMO_BRAKES) {
      expect(brakeSchema.parse(brake)).toEqual(brake)
      expect(findDemoBrake(brake.name.toUpperCase())).toBe(brake)
    }
    expect(findDemoBrake('upAndDown')).toBe(upAndDown)
    expect(findDemoBrake('no such brake')).toBeUndefined()
  })
})

describe('capacity', () => {
  test('is what the brake states', () => {
    expect(findCapacity(upOnly, 'steel')).toBe(0.04)
    expect(findCapacity(site, 'stainless')).toBeNull()
    expect(findCapacity({ ...upOnly, capacity: undefined }, 'steel')).toBeUndefined()
  })

  test('a metal left out is reckoned by its yield strength', () => {
    // t2 = t1 sqrt(yield1 / yield2), 33 and 15 ksi (from memory).
    expect(findCapacity(upOnly, 'zinc')).toBeCloseTo(0.04 * Math.sqrt(33 / 15), 12)
    expect(findCapacity({ ...upOnly, capacity: {} }, 'zinc')).toBeUndefined()
  })
})

const bare = { overlap: null, edge: null, contact: null }

describe('reasons', () => {
  const plain = section([3, 3], [90])

  test('longer than the brake and too thick, both told', () => {
    const sheet = { ...STEEL_24, thickness: 0.06 }
    const plan = planBends(request(plain, upOnly, { sheet, pieceLength: 130 }))
    expect(plan).toMatchObject({ feasible: false, proven: true, cost: null, steps: [] })
    expect(plan.reasons).toEqual([
      { code: 'length', bend: null, found: 130, limit: 126, ...bare },
      { code: 'thickness', bend: null, found: 0.06, limit: 0.04, ...bare },
    ])
  })

  test('a metal the brake does not bend', () => {
    const sheet = { ...STEEL_24, metal: 'stainless' as const }
    const { reasons } = planBends(request(plain, site, { sheet }))
    expect(reasons).toEqual([{ code: 'metal', bend: null, found: null, limit: null, ...bare }])
  })

  test('limits are inclusive', () => {
    const sheet = { ...STEEL_24, thickness: 0.04 }
    expect(planBends(request(plain, upOnly, { sheet, pieceLength: 126 })).feasible).toBe(true)
  })

  test('a bend beyond the largest fold, springback included', () => {
    const { reasons } = planBends(request(section([3, 3], [138]), upOnly))
    expect(reasons).toEqual([
      { code: 'angle', bend: 1, found: 138 * (1 + 2 / 90), limit: 140, ...bare },
    ])
  })

  test('a flange too short on either side', () => {
    const { reasons } = planBends(request(section([0.25, 3, 0.25], [90, 90]), upOnly))
    // Turned about, the short flange would have to be clamped: that orientation got further.
    expect(
      reasons.map(({ code, bend, found, limit, edge }) => [code, bend, found, limit, edge]),
    ).toEqual([
      ['clamp', 1, 0.25, 0.5, 'A'],
      ['clamp', 2, 0.25, 0.5, 'B'],
    ])
  })

  test('a hem lip outside the hems of the brake', () => {
    const short = planBends(request(section([3], [], { A: hem(1, 0.25) }), upOnly))
    expect(short.reasons).toEqual([
      { code: 'angle', bend: 'hemA', found: 0.25, limit: 0.375, ...bare },
    ])
    const long = planBends(request(section([3], [], { B: hem(1, 1.25) }), upOnly))
    expect(long.reasons).toEqual([{ code: 'angle', bend: 'hemB', found: 1.25, limit: 1, ...bare }])
  })

  test('no order: each bend alone can be made, the last one never', () => {
    // Two bends 0.4 apart: whichever is left for last has too little sheet to clamp and its flange
    // is needed by the apron.
    const plan = planBends(request(section([3, 0.3, 3], [90, 90]), upOnly))
    expect(plan.feasible).toBe(false)
    expect(plan.proven).toBe(true)
    expect(plan.reasons[0]).toEqual({
      code: 'noOrder',
      bend: null,
      found: null,
      limit: null,
      ...bare,
    })
    expect(plan.reasons.slice(1).map(({ bend }) => bend)).toEqual([1, 2])
  })
})

describe('steps', () => {
  test('a sheet without bends needs none', () => {
    const plan = planBends(request(section([6], []), upOnly))
    expect(plan).toMatchObject({ feasible: true, proven: true, steps: [] })
    expect(plan.cost).toEqual({ handling: 0, wideFront: 0, faceGauge: 0 })
  })

  test('a hem is one operation of two hits, before all else where the shop asks', () => {
    const { steps } = planBends(request(section([4, 4, 0.75], [-90, 45], { B: hem(-1) }), upOnly))
    expect(steps[0]).toMatchObject({ bend: 'hemB', hits: 2, angle: 180, swing: 135, move: 'load' })
    expect(steps.slice(1).every((step) => step.hits === 1)).toBe(true)
  })

  test('equal sequences: nearest to an edge first, painted side up, A at the back', () => {
    const { steps } = planBends(request(section([3, 6, 3], [90, 90]), upAndDown))
    expect(steps.map(({ bend }) => bend)).toEqual([1, 2])
    expect(steps[0]).toMatchObject({ leftUp: true })
    const right = planBends(
      request(section([3, 6, 3], [90, 90]), upAndDown, { paintedSide: 'right' }),
    )
    expect(right.steps[0]).toMatchObject({ leftUp: false, direction: 'down' })
  })

  test('without a gauge there is no figure to set', () => {
    const { steps } = planBends(request(section([3, 3], [90]), site))
    expect(steps[0]).toMatchObject({ gauge: null, restsOn: null })
  })

  test('a profile is planned by its centre line', () => {
    const plan = planProfile(
      {
        version: 1,
        legs: [4, 6],
        bends: [{ turn: 90 }],
        hemA: null,
        hemB: null,
        colorSide: 'left',
      },
      STEEL_24,
      upOnly,
      120,
    )
    expect(plan.section.legs[0]).toBeCloseTo(3.988, 12)
    // The wider part lies behind, against the gauge.
    expect(plan.steps[0]?.gauge).toBeCloseTo(5.988, 12)
  })
})

describe('limit on nodes', () => {
  const wide = section([2, 3, 4, 3, 2, 3, 2], [90, -90, 90, -45, 60, -90])

  test('answers with the best so far and an honest bound', () => {
    const limited = request(wide, upOnly, { limits: { nodes: 10 } })
    const plan = planBends(limited)
    const best = planBends(request(wide, upOnly))
    expect([plan.feasible, plan.proven, best.proven]).toEqual([true, false, true])
    const rank = ({ cost, lowerBound }: typeof plan) => [
      cost?.handling ?? NaN,
      lowerBound?.handling ?? NaN,
    ]
    const [cost, bound] = rank(plan)
    const [cheapest] = rank(best)
    expect(cost).toBeGreaterThanOrEqual(cheapest ?? NaN)
    expect(bound).toBeLessThanOrEqual(cheapest ?? NaN)
    expect(replayPlan(plan, limited).problems).toEqual([])
  })

  test('claims nothing when it found nothing', () => {
    const plan = planBends(request(wide, upOnly, { limits: { nodes: 1 } }))
    expect(plan).toMatchObject({ feasible: false, proven: false, cost: null })
    expect(plan.reasons.map(({ code }) => code)).toEqual(['limit'])
  })
})
