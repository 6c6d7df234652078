type Listener = () => void

const listeners = new Set<Listener>()

/** Called when a request that needs a session was answered with `not-signed-in`. */
export function announceSessionEnd(): void {
  for (const listener of listeners) listener()
}

export function onSessionEnd(listener: Listener): () => void {
  listeners.add(listener)
  return () => listeners.delete(listener)
}
