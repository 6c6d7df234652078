import { useSyncExternalStore } from 'react'
import { recall, remember } from '@/lib/device/remembered'

const listeners = new Set<() => void>()
let muted = recall('sound') === 'off'

/** Sound is a matter of the device: the tablet at the brake, the desk beside the counter. */
export function setMuted(next: boolean): void {
  muted = next
  remember('sound', next ? 'off' : 'on')
  for (const listener of listeners) listener()
}

export const isMuted = (): boolean => muted

function subscribe(listener: () => void): () => void {
  listeners.add(listener)
  return () => listeners.delete(listener)
}

export const useMuted = (): boolean => useSyncExternalStore(subscribe, isMuted)
