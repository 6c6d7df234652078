import { useSyncExternalStore } from 'react'

let answering = true
const listeners = new Set<() => void>()

/** Told by every request: did an answer of any kind come? */
export function reportAnswering(next: boolean): void {
  if (answering === next) return
  answering = next
  for (const listener of listeners) listener()
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener)
  window.addEventListener('online', listener)
  window.addEventListener('offline', listener)
  return () => {
    listeners.delete(listener)
    window.removeEventListener('online', listener)
    window.removeEventListener('offline', listener)
  }
}

const reachable = () => navigator.onLine && answering

/** True while the device has a network and the last request was answered. */
export const useReachable = (): boolean => useSyncExternalStore(subscribe, reachable)
