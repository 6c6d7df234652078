import { afterEach, describe, expect, it } from 'vitest'
import {
  createPlanWorkers,
  type PlanWorkers,
  type PlanWorkersOptions,
} from '#server/planning/plan-workers'
import type { PlanTask } from '#server/planning/plan-task'
import { sourceWorker } from '#server/planning/source-worker'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planProfile } from '#shared/bend-plan/plan-profile'
import type { Profile } from '#shared/profile/profile.schema'
import { STEEL_24 } from '../../support/bend-plan-cases'
import { hardProfile } from '../../support/hard-profile'
import { zProfile } from '../../support/shop-factories'

/** Longer than any test may take: a search that is not ended goes on. */
const FOREVER = 3_600_000

const opened: PlanWorkers[] = []
const open = (given: Partial<PlanWorkersOptions> = {}): PlanWorkers => {
  const workers = createPlanWorkers({
    program: sourceWorker,
    threads: 1,
    mostWaiting: 10,
    timeLimit: FOREVER,
    reportEvery: 0,
    onError: (message, error) => {
      throw new Error(message, { cause: error })
    },
    ...given,
  })
  opened.push(workers)
  return workers
}
afterEach(async () => {
  await Promise.all(opened.splice(0).map((workers) => workers.close()))
})

const taskOf = (profile: Profile): PlanTask => ({
  profile,
  sheet: STEEL_24,
  brake: DEMO_BRAKE.upOnly,
  pieceLength: 120,
})

const run = (workers: PlanWorkers, profile: Profile, signal = new AbortController().signal) =>
  workers.run(taskOf(profile), { signal, onNodes: () => undefined })

/** Resolves with the run under way as soon as it has looked at some folds. */
const begin = (workers: PlanWorkers, profile: Profile, signal: AbortSignal) => {
  const ended = { done: false }
  let answer: Promise<unknown> | undefined
  return new Promise<{ answer: Promise<unknown>; ended: { done: boolean } }>((resolve) => {
    answer = workers
      .run(taskOf(profile), {
        signal,
        onNodes: () => {
          if (answer) resolve({ answer, ended })
        },
      })
      .finally(() => {
        ended.done = true
      })
  })
}

describe('Planning threads', () => {
  it("give the kernel's own plan", async () => {
    expect(await run(open(), zProfile())).toEqual({
      plan: planProfile(zProfile(), STEEL_24, DEMO_BRAKE.upOnly, 120),
      cutShort: false,
    })
  })

  it("pass the kernel's refusal of an impossible leg on", async () => {
    await expect(run(open(), { ...zProfile(), legs: [1, 0.001, 1] })).rejects.toThrow(RangeError)
  })

  it('say how many folds they have looked at, more each time', async () => {
    const heard: number[] = []
    await open().run(taskOf(hardProfile()), {
      signal: new AbortController().signal,
      onNodes: (nodes) => heard.push(nodes),
    })
    expect(heard.length).toBeGreaterThan(2)
    expect(heard).toEqual([...new Set(heard)].toSorted((a, b) => a - b))
  })

  it('answer with what they have when the time is over, and say so', async () => {
    const { plan, cutShort } = await run(open({ timeLimit: 0 }), hardProfile())
    expect(cutShort).toBe(true)
    expect(plan.proven).toBe(false)
  })

  it('stop a search that nobody waits for, and take the next plan', async () => {
    const workers = open()
    const leaving = new AbortController()
    const first = await begin(workers, hardProfile(), leaving.signal)
    expect(first.ended.done).toBe(false)
    leaving.abort()
    expect(await first.answer).toMatchObject({ cutShort: true })
    expect((await run(workers, zProfile())).cutShort).toBe(false)
  })

  it('refuse what is too much to wait for, and nothing else', async () => {
    const workers = open({ mostWaiting: 1 })
    const leaving = new AbortController()
    const first = await begin(workers, hardProfile(), leaving.signal)
    const waiting = run(workers, zProfile())
    await expect(run(workers, zProfile([1, 2, 1]))).rejects.toMatchObject({
      code: 'not-ready',
      status: 503,
      retryAfter: 5,
    })
    leaving.abort()
    await first.answer
    expect((await waiting).plan.feasible).toBe(true)
  })

  it('take a plan that nobody waits for out of the queue', async () => {
    const workers = open({ mostWaiting: 1 })
    const [leavingFirst, leavingSecond] = [new AbortController(), new AbortController()]
    const first = await begin(workers, hardProfile(), leavingFirst.signal)
    const second = run(workers, hardProfile(2), leavingSecond.signal)
    leavingSecond.abort()
    await expect(second).rejects.toThrow('aborted')
    const third = run(workers, zProfile())
    leavingFirst.abort()
    await first.answer
    expect((await third).plan.feasible).toBe(true)
  })
})
