import { availableParallelism } from 'node:os'
import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { createPlanCache } from '#server/planning/plan-cache.store'
import { createPlanWorkers, type WorkerProgram } from '#server/planning/plan-workers'
import type { Planner } from '#server/planning/planner'
import { createWorkerPlanner } from '#server/planning/worker-planner'

/** Forty drawings on three brakes: at the usual pace a wait of a second or two. */
const MOST_WAITING = 120
const TIME_LIMIT_MS = 10_000
const REPORT_EVERY_MS = 500

export interface PlanningSettings {
  readonly program: WorkerProgram
  readonly threads?: number
  readonly mostWaiting?: number
  /** Milliseconds of planning a brake. */
  readonly timeLimit?: number
  /** Milliseconds before progress is first told, and between two times. */
  readonly reportEvery?: number
}

export interface PlanningDeps {
  /** The pool. */
  readonly db: Db
  readonly clock: Clock
  readonly onError: (message: string, error: unknown) => void
}

export interface Planning {
  readonly planner: Planner
  /** Ends the threads. */
  readonly close: () => Promise<void>
}

/** Planning with threads of its own: all processors but one, which is left to the event loop. */
export function startPlanning(settings: PlanningSettings, deps: PlanningDeps): Planning {
  const {
    program,
    threads = Math.max(1, availableParallelism() - 1),
    mostWaiting = MOST_WAITING,
    timeLimit = TIME_LIMIT_MS,
    reportEvery = REPORT_EVERY_MS,
  } = settings
  const { onError } = deps
  const workers = createPlanWorkers({
    program,
    threads,
    mostWaiting,
    timeLimit,
    reportEvery,
    onError,
  })
  const cache = createPlanCache(deps)
  const planner = createWorkerPlanner({ ...deps, workers, cache, reportEvery })
  return { planner, close: workers.close }
}
