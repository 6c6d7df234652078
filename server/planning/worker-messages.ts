import type { MessagePort } from 'node:worker_threads'
import { z } from 'zod'
import { planSchema } from '#shared/bend-plan/plan.schema'
import type { PlanTask } from '#server/planning/plan-task'

/** What a worker thread is given; the port is transferred. */
export interface WorkerTask extends PlanTask {
  readonly port: MessagePort
  /** Milliseconds of planning after which the best so far is the answer. */
  readonly timeLimit: number
  /** Milliseconds between two reports. */
  readonly reportEvery: number
}

/** Sent to a worker at work on a task that nobody waits for any more. */
export const STOP = 'stop'

export const workerReportSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('started') }),
  z.strictObject({ kind: z.literal('progress'), nodes: z.int() }),
])

export const workerAnswerSchema = z.strictObject({
  plan: planSchema,
  /** True when the time was over: another run may find more. */
  cutShort: z.boolean(),
})

export type WorkerReport = z.infer<typeof workerReportSchema>
export type WorkerAnswer = z.infer<typeof workerAnswerSchema>
