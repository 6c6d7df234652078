import { MessageChannel } from 'node:worker_threads'
import { Piscina } from 'piscina'
import { planningBusy, planningTooLong } from '#server/planning/planning-problems'
import type { PlanTask } from '#server/planning/plan-task'
import {
  STOP,
  workerAnswerSchema,
  workerReportSchema,
  type WorkerAnswer,
  type WorkerTask,
} from '#server/planning/worker-messages'

/** A thread without work ends after this; one is always kept. */
const IDLE_MS = 60_000
/** Left to a thread that was told to stop before it is ended from outside. */
const GRACE_MS = 2_000

/** The program of a worker thread. */
export interface WorkerProgram {
  readonly file: URL
  /** Flags of Node for the thread; those of this process when left out. */
  readonly execArgv?: string[]
}

export interface PlanWorkersOptions {
  readonly program: WorkerProgram
  /** Plans made at the same time. */
  readonly threads: number
  /** Plans that may wait for a thread; one more is refused. */
  readonly mostWaiting: number
  /** Milliseconds of planning after which the best so far is the answer. */
  readonly timeLimit: number
  /** Milliseconds between two reports on one plan. */
  readonly reportEvery: number
  readonly onError: (message: string, error: unknown) => void
}

export interface RunOptions {
  /** Takes the plan out of the queue or ends its search. */
  readonly signal: AbortSignal
  /** Called with the folds looked at so far. */
  readonly onNodes: (nodes: number) => void
}

export interface PlanWorkers {
  /** @throws not-ready where too much waits already or a thread does not come to an end */
  readonly run: (task: PlanTask, options: RunOptions) => Promise<WorkerAnswer>
  /** Ends the threads; what is still at work fails. */
  readonly close: () => Promise<void>
}

/** Threads that plan, so that the event loop never does. */
export function createPlanWorkers(options: PlanWorkersOptions): PlanWorkers {
  const { program, threads, mostWaiting, timeLimit, reportEvery, onError } = options
  const pool = new Piscina({
    filename: program.file.href,
    minThreads: 1,
    maxThreads: threads,
    idleTimeout: IDLE_MS,
    ...(program.execArgv && { execArgv: program.execArgv }),
  })
  pool.on('error', (error: unknown) => onError('a planning thread failed', error))

  async function run(task: PlanTask, { signal, onNodes }: RunOptions): Promise<WorkerAnswer> {
    signal.throwIfAborted()
    if (pool.queueSize >= mostWaiting) throw planningBusy()
    const { port1: ours, port2: port } = new MessageChannel()
    const ending = new AbortController()
    let started = false
    let timer: NodeJS.Timeout | undefined
    const endWithin = (milliseconds: number) => {
      clearTimeout(timer)
      timer = setTimeout(() => ending.abort(), milliseconds)
    }
    ours.on('message', (message: unknown) => {
      const report = workerReportSchema.safeParse(message)
      if (!report.success) onError('a report of a planning thread cannot be read', report.error)
      else if (report.data.kind === 'progress') onNodes(report.data.nodes)
      else {
        started = true
        endWithin(timeLimit + GRACE_MS)
      }
    })
    const stop = () => {
      // Out of the queue at once; a thread at work is asked, since it is worth keeping.
      if (!started) return ending.abort()
      ours.postMessage(STOP)
      endWithin(GRACE_MS)
    }
    signal.addEventListener('abort', stop, { once: true })
    const message: WorkerTask = { ...task, port, timeLimit, reportEvery }
    try {
      const run: unknown = await pool.run(message, { transferList: [port], signal: ending.signal })
      return workerAnswerSchema.parse(run)
    } catch (error) {
      if (ending.signal.aborted && !signal.aborted) throw planningTooLong()
      throw error
    } finally {
      clearTimeout(timer)
      signal.removeEventListener('abort', stop)
      ours.close()
    }
  }

  return { run, close: () => pool.destroy() }
}
