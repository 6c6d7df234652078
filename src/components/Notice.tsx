import type { ReactNode } from 'react'

export type NoticeKind = 'done' | 'warn' | 'error' | 'info'

const EDGE: Record<NoticeKind, string> = {
  done: 'border-oxide bg-oxide/10',
  warn: 'border-ochre bg-ochre/10',
  error: 'border-chalk bg-chalk/10',
  info: 'border-scribe bg-scribe/10',
}

interface Props {
  readonly kind: NoticeKind
  readonly children: ReactNode
}

/** A remark inside a page, beside what it is about. Errors are read out at once, others in turn. */
export function Notice({ kind, children }: Props) {
  return (
    <div
      role={kind === 'error' ? 'alert' : 'status'}
      className={`border-l-4 px-4 py-3 ${EDGE[kind]}`}
    >
      {children}
    </div>
  )
}
