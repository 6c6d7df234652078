import { useId } from 'react'
import { useTranslation } from 'react-i18next'
import { Field } from '@/components/Field'
import { CONTROL, describedBy } from '@/components/field-style'
import { Icon } from '@/components/Icon'
import { IconButton } from '@/components/IconButton'

interface Props {
  readonly label: string
  readonly value: number | null
  readonly error: string | undefined
  readonly disabled: boolean
  /** How many digits are taken. */
  readonly digits?: number
  /** What one less ends at. */
  readonly least?: number
  readonly onChange: (quantity: number | null) => void
}

/** How many: typed, or one more and one less with a thumb. */
export function QuantityField({
  label,
  value,
  error,
  disabled,
  digits = 4,
  least = 1,
  onChange,
}: Props) {
  const { t } = useTranslation('orders')
  const id = useId()
  return (
    <Field id={id} label={label} error={error}>
      <span className="flex gap-1">
        <IconButton
          label={t('line.fewerOf', { label })}
          icon={<Icon name="minus" />}
          className="border border-edge bg-sheet"
          disabled={disabled || value === null || value <= least}
          onClick={() => value !== null && onChange(value - 1)}
        />
        <input
          id={id}
          value={value ?? ''}
          inputMode="numeric"
          autoComplete="off"
          disabled={disabled}
          className={`${CONTROL} w-0 min-w-14 flex-1 text-center font-figure`}
          aria-invalid={error !== undefined || undefined}
          aria-describedby={describedBy(id, { hint: undefined, error })}
          onFocus={(event) => event.target.select()}
          onChange={(event) => {
            const typed = event.target.value.replace(/\D/g, '').slice(0, digits)
            onChange(typed === '' ? null : Number(typed))
          }}
        />
        <IconButton
          label={t('line.moreOf', { label })}
          icon={<Icon name="plus" />}
          className="border border-edge bg-sheet"
          disabled={disabled}
          onClick={() => onChange((value ?? 0) + 1)}
        />
      </span>
    </Field>
  )
}
