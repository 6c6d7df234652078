import { describe, expect, it } from 'vitest'
import { findFreest, listCheapest, type BrakeLoad } from '#server/planning/choose-brake'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import type { PlanCost } from '#shared/bend-plan/plan.schema'
import { planProfile } from '#shared/bend-plan/plan-profile'
import type { BrakePlan } from '#shared/plans/plans.contract'
import { STEEL_24 } from '../../support/bend-plan-cases'
import { zProfile } from '../../support/shop-factories'

const planned = planProfile(zProfile(), STEEL_24, DEMO_BRAKE.upAndDown, 120)

const plan = (name: string, cost: PlanCost | null): BrakePlan => ({
  brakeId: name,
  brakeName: name,
  plan: { ...planned, feasible: cost !== null, cost, lowerBound: cost },
})

const cost = (handling: number, wideFront: number, faceGauge: number): PlanCost => ({
  handling,
  wideFront,
  faceGauge,
})

const names = (plans: readonly BrakePlan[]) => plans.map(({ brakeName }) => brakeName)

describe('The brakes that a line may go to', () => {
  it.each([
    ['least handling, whatever the later figures are', cost(4, 0, 0), cost(2, 9, 9)],
    [
      'fewest hits with the wide part in front where handling is equal',
      cost(2, 3, 0),
      cost(2, 1, 5),
    ],
    ['least gauging on formed faces where the rest is equal', cost(2, 1, 2), cost(2, 1, 1)],
  ])('are those with the %s', (_what, dear, cheap) => {
    expect(names(listCheapest([plan('dear', dear), plan('cheap', cheap)]))).toEqual(['cheap'])
    expect(names(listCheapest([plan('cheap', cheap), plan('dear', dear)]))).toEqual(['cheap'])
  })

  it("are all that are equal, in the shop's order", () => {
    const plans = [
      plan('first', cost(2, 1, 1)),
      plan('dear', cost(3, 0, 0)),
      plan('second', cost(2, 1, 1)),
    ]
    expect(names(listCheapest(plans))).toEqual(['first', 'second'])
  })

  it('are never those that cannot bend it', () => {
    expect(names(listCheapest([plan('no', null), plan('yes', cost(9, 9, 9))]))).toEqual(['yes'])
    expect(listCheapest([plan('no', null)])).toEqual([])
  })
})

describe('Of equal brakes a run goes to', () => {
  const equal = ['first', 'second', 'third'].map((name) => plan(name, cost(2, 1, 1)))
  const freest = (loads: Record<string, BrakeLoad>) =>
    findFreest(equal, new Map(Object.entries(loads)))?.brakeName

  it('the first where all are without work', () => {
    expect(freest({})).toBe('first')
  })

  it('a free one before a busy one, however much waits there', () => {
    expect(
      freest({
        first: { busy: true, queued: 1 },
        second: { busy: false, queued: 500 },
        third: { busy: true, queued: 0 },
      }),
    ).toBe('second')
  })

  it('the one with the least to bend among free ones', () => {
    expect(
      freest({
        first: { busy: false, queued: 9 },
        second: { busy: false, queued: 8 },
        third: { busy: false, queued: 10 },
      }),
    ).toBe('second')
  })

  it('the one with the least to bend where all are busy', () => {
    expect(
      freest({
        first: { busy: true, queued: 9 },
        second: { busy: true, queued: 9 },
        third: { busy: true, queued: 3 },
      }),
    ).toBe('third')
  })

  it('none where there is none', () => {
    expect(findFreest([], new Map())).toBeUndefined()
  })
})
