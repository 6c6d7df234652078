import type { LiveTopic } from '#shared/live/live'

/**
 * Which query keys a change makes stale, by their first word. A moved piece changes the progress of
 * its order and run and what lies on the rack; a stock changes the plans made with it and what an
 * order that is not released takes.
 */
export const STALE_ROOTS: Record<LiveTopic, readonly string[]> = {
  jobs: ['jobs'],
  shelf: ['shelf'],
  orders: ['orders', 'jobs'],
  pieces: ['pieces', 'orders', 'runs', 'rack'],
  runs: ['runs', 'pieces'],
  rack: ['rack', 'pieces', 'orders'],
  stocks: ['stocks', 'plans', 'orders'],
  brakes: ['brakes', 'plans'],
  // Every change to people is in the log.
  people: ['people', 'audit'],
  mails: ['mails'],
}
