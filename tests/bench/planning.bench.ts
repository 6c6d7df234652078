import { monitorEventLoopDelay } from 'node:perf_hooks'
import { setTimeout as delay } from 'node:timers/promises'
import { systemClock } from '#server/adapters/clock'
import { startPlanning } from '#server/planning/start-planning'
import { DEMO_BRAKES } from '#shared/bend-plan/demo-brakes'
import type { Profile } from '#shared/profile/profile.schema'
import { STOCK_24 } from '../support/bend-plan-cases'
import { hardProfile } from '../support/hard-profile'
import type { BenchRow } from './bench-row'
import type { BenchShop } from './bench-shop'

const ASKERS = 4
const IDLE_MS = 3_000
const NANOSECONDS = 1e6

const builtWorker = { file: new URL('../../dist/server/plan-worker.js', import.meta.url) }
const brakes = DEMO_BRAKES.map((brake) => ({ id: brake.name, brake }))

export const planningTitle = `Event loop while ${ASKERS} ask for plans at once, made in threads`

/** How late the event loop of a process comes round, by what its threads are planning. */
export async function benchPlanning({ db }: BenchShop): Promise<BenchRow[]> {
  const planning = startPlanning(
    { program: builtWorker },
    {
      db,
      clock: systemClock,
      onError: (message, error) => {
        throw new Error(message, { cause: error })
      },
    },
  )
  const plan = (profile: Profile) => planning.planner.planOnAll(profile, STOCK_24, 120, brakes)
  const planAll = async (bends: number, count: number) => {
    const left = Array.from({ length: count }, (_, index) => hardProfile(index + 1, bends))
    await Promise.all(
      Array.from({ length: ASKERS }, async () => {
        for (let next = left.shift(); next; next = left.shift()) await plan(next)
      }),
    )
    return `${count} drawings`
  }
  try {
    await planAll(6, 40)
    return [
      await watchLoop('Nothing asked', async () => {
        await delay(IDLE_MS)
        return ''
      }),
      await watchLoop('Drawings of 8 bends', () => planAll(8, 200)),
      await watchLoop('Drawings of 18 shallow bends', () => planAll(18, 8)),
    ]
  } finally {
    await planning.close()
  }
}

async function watchLoop(name: string, work: () => Promise<string>): Promise<BenchRow> {
  const loop = monitorEventLoopDelay({ resolution: 1 })
  loop.enable()
  const begin = performance.now()
  const what = await work()
  const seconds = ((performance.now() - begin) / 1000).toFixed(1)
  loop.disable()
  const at = (percent: number) => loop.percentile(percent) / NANOSECONDS
  const note = [`max ${(loop.max / NANOSECONDS).toFixed(1)}`, what, `${seconds} s`]
  return {
    name,
    unit: 'ms',
    p50: at(50),
    p95: at(95),
    p99: at(99),
    note: note.filter(Boolean).join(', '),
  }
}
