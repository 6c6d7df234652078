import { useId, type ComponentProps } from 'react'
import { Field } from '@/components/Field'
import { CONTROL, describedBy, type FieldLabels } from '@/components/field-style'

interface Props extends FieldLabels, Omit<ComponentProps<'input'>, 'id'> {}

/** One line of text. Takes what react-hook-form's `register` gives. */
export function TextField({ label, hint, error, className, ...input }: Props) {
  const id = useId()
  return (
    <Field id={id} label={label} hint={hint} error={error} className={className}>
      <input
        id={id}
        className={CONTROL}
        aria-invalid={error !== undefined || undefined}
        aria-describedby={describedBy(id, { hint, error })}
        {...input}
      />
    </Field>
  )
}
