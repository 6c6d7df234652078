import type { WorkerProgram } from '#server/planning/plan-workers'

/** The thread's program straight from the sources, for development and tests. */
export const sourceWorker: WorkerProgram = {
  file: new URL('./plan-worker.ts', import.meta.url),
  execArgv: ['--import', 'tsx'],
}
