import { useQueryClient, type QueryClient } from '@tanstack/react-query'
import { useEffect, useState } from 'react'
import { liveEventSchema, type LiveEvent } from '#shared/live/live'
import { hearPlanProgress } from '@/lib/live/plan-progress'
import { reportAnswering } from '@/lib/api/reachability'
import { STALE_ROOTS } from '@/lib/live/live-topics'

export type LiveState = 'off' | 'live' | 'reconnecting'

const RETRY_MS = 5000

function parseEvent(data: string): LiveEvent | undefined {
  try {
    return liveEventSchema.safeParse(JSON.parse(data)).data
  } catch {
    return undefined
  }
}

async function refresh(client: QueryClient, data: unknown): Promise<void> {
  const event = typeof data === 'string' ? parseEvent(data) : undefined
  // A server newer than this page may speak of things it does not know: then all may be stale.
  if (!event) return client.invalidateQueries()
  await Promise.all(
    STALE_ROOTS[event.topic].map((root) => client.invalidateQueries({ queryKey: [root] })),
  )
}

/**
 * Follows GET /api/live while `follow` is true. The browser reconnects by itself and names the last
 * event it saw; `reset` says that too much was missed. Where the browser gives up (an error answer)
 * a new source is opened, and as that one starts without a memory, everything is read again.
 */
export function useLive(follow: boolean): LiveState {
  const client = useQueryClient()
  const [connected, setConnected] = useState(false)

  useEffect(() => {
    if (!follow) return
    let source: EventSource
    let timer: ReturnType<typeof setTimeout> | undefined
    let missed = false

    const open = () => {
      source = new EventSource('/api/live')
      source.onopen = () => {
        setConnected(true)
        reportAnswering(true)
        if (missed) void client.invalidateQueries()
        missed = false
      }
      source.onmessage = (message) => void refresh(client, message.data)
      source.addEventListener('reset', () => void client.invalidateQueries())
      source.addEventListener('plan', (message: MessageEvent<string>) =>
        hearPlanProgress(message.data),
      )
      source.onerror = () => {
        setConnected(false)
        if (source.readyState !== EventSource.CLOSED) return
        missed = true
        timer = setTimeout(open, RETRY_MS)
      }
    }
    open()

    return () => {
      clearTimeout(timer)
      source.close()
      setConnected(false)
    }
  }, [follow, client])

  if (!follow) return 'off'
  return connected ? 'live' : 'reconnecting'
}
