import type { ReactNode } from 'react'

interface Props {
  readonly title: string
  /** What to do next. */
  readonly hint?: ReactNode
  readonly action?: ReactNode
}

/** Nothing here yet, and what to do about it. */
export function EmptyState({ title, hint, action }: Props) {
  return (
    <div className="flex max-w-prose flex-col items-start gap-3 py-10">
      <p className="text-lead font-semibold">{title}</p>
      {hint !== undefined && <p className="text-scribe">{hint}</p>}
      {action}
    </div>
  )
}
