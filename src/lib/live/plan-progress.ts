import { useSyncExternalStore } from 'react'
import { livePlanSchema, type LivePlan } from '#shared/live/live'

/** The last that was heard of each request for a plan that takes long. */
const heard = new Map<string, LivePlan>()
const listeners = new Set<() => void>()

/** Takes in the data of a live event named `plan`. Throws what JSON and schema throw. */
export function hearPlanProgress(data: string): void {
  const progress = livePlanSchema.parse(JSON.parse(data))
  heard.set(progress.key, progress)
  for (const listener of listeners) listener()
}

/** A request that was answered or given up is heard of no more. */
export function forgetPlanProgress(key: string): void {
  if (heard.delete(key)) for (const listener of listeners) listener()
}

function follow(listener: () => void) {
  listeners.add(listener)
  return () => {
    listeners.delete(listener)
  }
}

/** How far the plan of a request has come; null while it is quick, or done. */
export const usePlanProgress = (key: string): LivePlan | null =>
  useSyncExternalStore(follow, () => heard.get(key) ?? null)
