import { receiveMessageOnPort } from 'node:worker_threads'
import type { WorkerAnswer, WorkerReport, WorkerTask } from '#server/planning/worker-messages'
import { planProfile } from '#shared/bend-plan/plan-profile'

/** Folds between two looks at clock and port: well below a millisecond of planning each. */
const LOOK_EVERY = 16

/**
 * The entry of a worker thread: one plan. Says on the port that it began and how far it is; anything
 * that comes in on it ends the search.
 */
export default function planInWorker(task: WorkerTask): WorkerAnswer {
  const { profile, sheet, brake, pieceLength, port, timeLimit, reportEvery } = task
  const tell = (report: WorkerReport) => port.postMessage(report)
  tell({ kind: 'started' })
  const begin = performance.now()
  let nodes = 0
  let reported = begin
  let cutShort = false
  const isOver = (): boolean => {
    nodes += 1
    if (cutShort || nodes % LOOK_EVERY !== 0) return cutShort
    const now = performance.now()
    if (now - reported >= reportEvery) {
      reported = now
      tell({ kind: 'progress', nodes })
    }
    cutShort = now - begin >= timeLimit || receiveMessageOnPort(port) !== undefined
    return cutShort
  }
  try {
    return { plan: planProfile(profile, sheet, brake, pieceLength, { isOver }), cutShort }
  } finally {
    port.close()
  }
}
