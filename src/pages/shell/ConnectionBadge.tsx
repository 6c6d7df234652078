import { useTranslation } from 'react-i18next'
import { useReachable } from '@/lib/api/reachability'
import { useLiveState } from '@/lib/live/live-context'

type Connection = 'live' | 'reconnecting' | 'offline'

const INK: Record<Connection, string> = {
  live: 'text-oxide',
  reconnecting: 'text-ochre',
  offline: 'text-chalk',
}

/** Whole dot, half ring, or ring struck through: readable without its color. */
function ConnectionGlyph({ connection }: { readonly connection: Connection }) {
  return (
    <svg viewBox="0 0 16 16" className="size-4 shrink-0" aria-hidden="true" focusable="false">
      {connection === 'live' && <circle cx="8" cy="8" r="4.5" fill="currentColor" />}
      {connection === 'reconnecting' && (
        <path d="M8 3a5 5 0 0 1 0 10" fill="none" stroke="currentColor" strokeWidth="2.5" />
      )}
      {connection === 'offline' && (
        <path
          d="M8 3a5 5 0 1 1 0 10A5 5 0 0 1 8 3M2 14 14 2"
          fill="none"
          stroke="currentColor"
          strokeWidth="2"
        />
      )}
    </svg>
  )
}

/** Whether what is on screen follows the shop as it changes. On a phone the good case is a dot. */
export function ConnectionBadge() {
  const { t } = useTranslation('shell')
  const reachable = useReachable()
  const live = useLiveState()
  const connection: Connection = !reachable ? 'offline' : live === 'live' ? 'live' : 'reconnecting'
  return (
    <p
      role="status"
      title={t(`connection.${connection}Hint`)}
      className={`flex shrink-0 items-center gap-1.5 text-small ${INK[connection]}`}
    >
      <ConnectionGlyph connection={connection} />
      <span className={connection === 'live' ? 'sr-only lg:not-sr-only' : ''}>
        {t(`connection.${connection}`)}
      </span>
    </p>
  )
}
