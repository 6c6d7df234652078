import type { ReactNode } from 'react'
import { LiveContext } from '@/lib/live/live-context'
import { useLive } from '@/lib/live/useLive'

/**
 * One connection for live events, as long as `follow` holds: it is closed with the session, since
 * an ended session would only be refused again and again.
 */
export function LiveProvider({
  follow,
  children,
}: {
  readonly follow: boolean
  readonly children: ReactNode
}) {
  return <LiveContext value={useLive(follow)}>{children}</LiveContext>
}
