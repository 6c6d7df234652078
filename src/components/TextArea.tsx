import { useId, type ComponentProps } from 'react'
import { Field } from '@/components/Field'
import { CONTROL, describedBy, type FieldLabels } from '@/components/field-style'

interface Props extends FieldLabels, Omit<ComponentProps<'textarea'>, 'id'> {}

export function TextArea({ label, hint, error, className, rows = 3, ...input }: Props) {
  const id = useId()
  return (
    <Field id={id} label={label} hint={hint} error={error} className={className}>
      <textarea
        id={id}
        rows={rows}
        className={`${CONTROL} py-2`}
        aria-invalid={error !== undefined || undefined}
        aria-describedby={describedBy(id, { hint, error })}
        {...input}
      />
    </Field>
  )
}
