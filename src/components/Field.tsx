import type { ReactNode } from 'react'
import type { FieldLabels } from '@/components/field-style'

interface Props extends FieldLabels {
  readonly id: string
  readonly children: ReactNode
  readonly className?: string
}

/** Label, control, hint and error of one field, tied together for the eye and for a screen reader. */
export function Field({ id, label, hint, error, children, className = '' }: Props) {
  return (
    <div className={`flex flex-col gap-1.5 ${className}`}>
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      {children}
      {hint !== undefined && (
        <p id={`${id}-hint`} className="text-small text-scribe">
          {hint}
        </p>
      )}
      {error !== undefined && (
        <p id={`${id}-error`} role="alert" className="text-small font-semibold text-chalk">
          {error}
        </p>
      )}
    </div>
  )
}
