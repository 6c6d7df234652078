import type { ReactNode } from 'react'

export interface FieldLabels {
  readonly label: string
  /** Help that is always shown. */
  readonly hint?: ReactNode
  /** What is wrong and what cures it; absent while nothing is. */
  readonly error?: string
}

export const CONTROL =
  'block min-h-target w-full rounded-control border border-edge bg-sheet px-3 text-body text-ink ' +
  'aria-invalid:border-2 aria-invalid:border-chalk disabled:bg-rule/40 disabled:text-scribe'

/** Names of what describes a control, for `aria-describedby`. */
export const describedBy = (id: string, { hint, error }: Pick<FieldLabels, 'hint' | 'error'>) =>
  [hint === undefined ? [] : `${id}-hint`, error === undefined ? [] : `${id}-error`]
    .flat()
    .join(' ') || undefined
