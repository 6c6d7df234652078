import type { Clock } from '#server/adapters/clock'
import { KeptValues } from '#server/planning/kept-values'
import type { PlanCache } from '#server/planning/plan-cache.store'
import { planKey } from '#server/planning/plan-key'
import type { PlanTask } from '#server/planning/plan-task'
import type { PlanWorkers } from '#server/planning/plan-workers'
import type { Planner, PlanningOptions } from '#server/planning/planner'
import { SharedTasks } from '#server/planning/shared-tasks'
import type { Plan } from '#shared/bend-plan/plan.schema'
import { sheetOn } from '#shared/stock/sheet-on'

const MOST_PLANS = 1000
/** A plan cut short by the clock might become better on a quieter machine. */
const CUT_SHORT_KEPT_FOR = 10 * 60 * 1000

interface KeptPlan {
  readonly plan: Plan
  /** Null for a plan that stays true. */
  readonly until: Date | null
}

export interface WorkerPlannerDeps {
  readonly workers: PlanWorkers
  readonly cache: PlanCache
  readonly clock: Clock
  /** Milliseconds before an asker is first told of progress, and between two times. */
  readonly reportEvery: number
  readonly onError: (message: string, error: unknown) => void
}

/**
 * Plans in worker threads, a task a brake. A plan is looked for in memory, then in the database,
 * then among the tasks under way; the same task gives the same plan in every process.
 */
export function createWorkerPlanner(deps: WorkerPlannerDeps): Planner {
  const { workers, cache, clock, reportEvery, onError } = deps
  const kept = new KeptValues<KeptPlan>(MOST_PLANS)
  const underWay = new SharedTasks<Plan>()

  const findKept = (key: string): Plan | undefined => {
    const found = kept.find(key)
    if (!found || (found.until !== null && found.until <= clock.now())) return undefined
    return found.plan
  }

  /** Plans that the clock cut short depend on the machine: only this process keeps them, not for long. */
  async function keep(key: string, plan: Plan, cutShort: boolean): Promise<void> {
    const until = cutShort ? new Date(clock.now().getTime() + CUT_SHORT_KEPT_FOR) : null
    kept.keep(key, { plan, until })
    if (cutShort) return
    try {
      await cache.keepPlan(key, plan)
    } catch (error) {
      onError('a plan could not be kept', error)
    }
  }

  const start =
    (key: string, task: PlanTask) =>
    async (signal: AbortSignal, onNodes: (nodes: number) => void): Promise<Plan> => {
      const { plan, cutShort } = await workers.run(task, { signal, onNodes })
      // What was given up is no plan at all.
      signal.throwIfAborted()
      await keep(key, plan, cutShort)
      return plan
    }

  return {
    planOnAll: async (profile, stock, pieceLength, brakes, { signal, onProgress } = {}) => {
      const tellProgress = watchProgress(onProgress, reportEvery)
      const asked = brakes.map(({ id, brake }) => {
        const task = { profile, sheet: sheetOn(stock, id), brake, pieceLength }
        return { id, brake, task, key: planKey(task) }
      })
      const unknown = asked.map(({ key }) => key).filter((key) => !findKept(key))
      for (const [key, plan] of await cache.findPlans(unknown))
        kept.keep(key, { plan, until: null })

      const leaving = new AbortController()
      const gone = signal ? AbortSignal.any([signal, leaving.signal]) : leaving.signal
      const planOf = (key: string, task: PlanTask) => {
        const asker = { signal: gone, onNodes: (nodes: number) => tellProgress(key, nodes) }
        return findKept(key) ?? underWay.join(key, asker, start(key, task))
      }
      try {
        return await Promise.all(
          asked.map(async ({ id, brake, task, key }) => ({
            brakeId: id,
            brakeName: brake.name,
            plan: await planOf(key, task),
          })),
        )
      } catch (error) {
        // One brake failed: nobody waits for the others.
        leaving.abort()
        throw error
      }
    },
  }
}

/** Gathers the folds looked at by task and tells their sum, first and then every so often. */
function watchProgress(onProgress: PlanningOptions['onProgress'], reportEvery: number) {
  const begin = performance.now()
  const nodesByTask = new Map<string, number>()
  let told = begin
  return (key: string, nodes: number): void => {
    nodesByTask.set(key, nodes)
    const now = performance.now()
    if (!onProgress || now - told < reportEvery) return
    told = now
    const sum = [...nodesByTask.values()].reduce((total, each) => total + each, 0)
    onProgress({ nodes: sum, elapsed: Math.round(now - begin) })
  }
}
