import { useId, type ComponentProps } from 'react'
import { Field } from '@/components/Field'
import { CONTROL, describedBy, type FieldLabels } from '@/components/field-style'
import { Icon } from '@/components/Icon'

export interface SelectOption {
  readonly value: string
  readonly label: string
  readonly disabled?: boolean
}

interface Props extends FieldLabels, Omit<ComponentProps<'select'>, 'id' | 'children'> {
  readonly options: readonly SelectOption[]
  /** Shown while nothing is chosen; absent where something always is. */
  readonly placeholder?: string
}

/** A choice of one. The browser's own list: the one that fits a gloved thumb on every device. */
export function Select({ label, hint, error, options, placeholder, className, ...select }: Props) {
  const id = useId()
  return (
    <Field id={id} label={label} hint={hint} error={error} className={className}>
      <span className="relative block">
        <select
          id={id}
          className={`${CONTROL} appearance-none pr-10`}
          aria-invalid={error !== undefined || undefined}
          aria-describedby={describedBy(id, { hint, error })}
          {...select}
        >
          {placeholder !== undefined && <option value="">{placeholder}</option>}
          {options.map((option) => (
            <option key={option.value} value={option.value} disabled={option.disabled}>
              {option.label}
            </option>
          ))}
        </select>
        <Icon
          name="down"
          className="pointer-events-none absolute top-1/2 right-3 size-5 -translate-y-1/2 text-scribe"
        />
      </span>
    </Field>
  )
}
