import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { PLAN_CACHE } from '#server/db/tables/plan-cache'
import { removeOutdated } from '#server/jobs/housekeeping'
import { createPlanCache } from '#server/planning/plan-cache.store'
import type { PlanTask } from '#server/planning/plan-task'
import type { PlanWorkers } from '#server/planning/plan-workers'
import { createWorkerPlanner } from '#server/planning/worker-planner'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planProfile } from '#shared/bend-plan/plan-profile'
import type { Profile } from '#shared/profile/profile.schema'
import { startApi, type Api } from '../../support/api-app'
import { STEEL_24, STOCK_24 } from '../../support/bend-plan-cases'
import { FakeClock } from '../../support/fake-clock'
import { zProfile } from '../../support/shop-factories'

const DAY = 24 * 60 * 60 * 1000
const NOW = new Date('2026-03-02T15:00:00Z')

let api: Api
beforeAll(async () => {
  // The clean-up at its start must not take the plans of this file for old ones.
  api = await startApi({ clock: new FakeClock(NOW) })
})
afterAll(() => api.close())
beforeEach(() => api.db(PLAN_CACHE).delete())

const brakes = [
  { id: 'one', brake: DEMO_BRAKE.upOnly },
  { id: 'two', brake: DEMO_BRAKE.upAndDown },
]

const expected = brakes.map(({ id, brake }) => ({
  brakeId: id,
  brakeName: brake.name,
  plan: planProfile(zProfile(), STEEL_24, brake, 120),
}))

/** A process of the product: what it keeps in memory is its own, the database is everybody's. */
function openProcess(clock = new FakeClock(NOW), cutShort = false) {
  const made: PlanTask[] = []
  const errors: string[] = []
  const onError = (message: string) => errors.push(message)
  const workers: PlanWorkers = {
    run: (task) => {
      made.push(task)
      const { profile, sheet, brake, pieceLength } = task
      return Promise.resolve({ plan: planProfile(profile, sheet, brake, pieceLength), cutShort })
    },
    close: () => Promise.resolve(),
  }
  const cache = createPlanCache({ db: api.db, clock, onError })
  const planner = createWorkerPlanner({ workers, cache, clock, reportEvery: 0, onError })
  const plan = (profile: Profile = zProfile()) => planner.planOnAll(profile, STOCK_24, 120, brakes)
  return { plan, made, errors, clock }
}

describe('A plan that was made', () => {
  it('is not made again, neither by this process nor by another', async () => {
    const [first, second] = [openProcess(), openProcess()]
    expect(await first.plan()).toEqual(expected)
    expect(await first.plan()).toEqual(expected)
    expect(await second.plan()).toEqual(expected)
    expect(first.made).toHaveLength(2)
    expect(second.made).toEqual([])
  })

  it('is the same to the byte when it comes from the database', async () => {
    await openProcess().plan()
    expect(JSON.stringify(await openProcess().plan())).toBe(JSON.stringify(expected))
  })

  it('is made once where two ask at the same time', async () => {
    const { plan, made } = openProcess()
    await Promise.all([plan(), plan()])
    expect(made).toHaveLength(2)
  })

  it('is made anew for another drawing', async () => {
    const { plan, made } = openProcess()
    await plan()
    await plan(zProfile([1, 3, 1]))
    expect(made).toHaveLength(4)
  })

  it('is dropped, logged and made anew where it is no plan of today', async () => {
    await openProcess().plan()
    await api.db.raw(`update plan_cache set plan = plan - 'steps'`)
    const later = openProcess()
    expect(await later.plan()).toEqual(expected)
    expect(later.made).toHaveLength(2)
    expect(later.errors).toHaveLength(2)
    const another = openProcess()
    expect(await another.plan()).toEqual(expected)
    expect(another.errors).toEqual([])
    expect(another.made).toEqual([])
  })

  it('is kept by one process alone, and for a while, when the clock cut it short', async () => {
    const { plan, made, clock } = openProcess(undefined, true)
    await plan()
    await plan()
    expect(made).toHaveLength(2)
    expect(await api.db(PLAN_CACHE)).toEqual([])
    clock.moveBy(10 * 60 * 1000)
    await plan()
    expect(made).toHaveLength(4)
  })

  it('is given all the same where it cannot be kept', async () => {
    const broken = openProcess()
    await api.db.raw('alter table plan_cache add constraint closed check (false)')
    try {
      expect(await broken.plan()).toEqual(expected)
      expect(broken.errors).toHaveLength(2)
    } finally {
      await api.db.raw('alter table plan_cache drop constraint closed')
    }
  })
})

describe('Tidying up', () => {
  it('removes plans that nobody asked for in thirty days', async () => {
    const { plan, clock } = openProcess()
    await plan()
    clock.moveBy(30 * DAY)
    await removeOutdated(api.db, clock.now())
    expect(await api.db(PLAN_CACHE)).toHaveLength(2)
    clock.moveBy(1)
    await removeOutdated(api.db, clock.now())
    expect(await api.db(PLAN_CACHE)).toEqual([])
  })

  it('counts from the day on which a plan was last asked for', async () => {
    const { plan, clock } = openProcess()
    await plan()
    clock.moveBy(20 * DAY)
    await openProcess(clock).plan()
    clock.moveBy(20 * DAY)
    await removeOutdated(api.db, clock.now())
    expect(await api.db(PLAN_CACHE)).toHaveLength(2)
  })
})
