import { useEffect, useRef, type ReactNode } from 'react'
import { Icon, type IconName } from '@/components/Icon'
import { useBeep } from '@/lib/device/useBeep'

export type BandKind = 'done' | 'warn' | 'error'

export interface BandAnswer {
  /** Another id is another answer: it is sounded and read out again, even with the same words. */
  readonly id: string | number
  readonly kind: BandKind
  /** The mark of the piece or bundle, large. */
  readonly mark?: string
  /** What happened, or what it was. */
  readonly title: ReactNode
  /** The new state, or what was expected instead. */
  readonly detail?: ReactNode
  /** Usually "undo". */
  readonly action?: ReactNode
}

const FILL: Record<BandKind, string> = { done: 'bg-oxide', warn: 'bg-ochre', error: 'bg-chalk' }
const ICON: Record<BandKind, IconName> = { done: 'done', warn: 'warn', error: 'wrong' }

/**
 * The answer to a scan, across the whole width and by sound: two rising tones for done, two low
 * ones for anything else. Without an answer it takes no room.
 */
export function Band({ answer }: { readonly answer: BandAnswer | null }) {
  const beep = useBeep()
  const sounded = useRef<BandAnswer['id'] | null>(null)

  useEffect(() => {
    if (!answer || sounded.current === answer.id) return
    sounded.current = answer.id
    beep(answer.kind === 'done' ? 'done' : 'wrong')
  }, [answer, beep])

  return (
    <div role="status" aria-live="assertive" aria-atomic="true">
      {answer && (
        <div
          key={answer.id}
          data-band={answer.kind}
          className={`flex flex-wrap items-center gap-x-5 gap-y-2 px-(--gutter) py-4 text-paper forced-colors:border-2 ${FILL[answer.kind]}`}
        >
          <Icon name={ICON[answer.kind]} className="size-9" />
          {answer.mark !== undefined && (
            <span className="font-figure text-figure font-bold">{answer.mark}</span>
          )}
          <div className="min-w-48 flex-1">
            <p className="text-lead font-bold">{answer.title}</p>
            {answer.detail !== undefined && <p>{answer.detail}</p>}
          </div>
          {answer.action}
        </div>
      )}
    </div>
  )
}
