import { useId } from 'react'
import { useTranslation } from 'react-i18next'
import { Field } from '@/components/Field'
import { CONTROL, describedBy } from '@/components/field-style'
import { Icon } from '@/components/Icon'
import { IconButton } from '@/components/IconButton'

interface Props {
  readonly value: number | null
  readonly error: string | undefined
  readonly disabled: boolean
  readonly onChange: (quantity: number | null) => void
}

/** How many pieces: typed, or one more and one less with a thumb. */
export function QuantityField({ value, error, disabled, onChange }: Props) {
  const { t } = useTranslation('orders')
  const id = useId()
  return (
    <Field id={id} label={t('line.quantity')} error={error}>
      <span className="flex gap-1">
        <IconButton
          label={t('line.fewer')}
          icon={<Icon name="minus" />}
          className="border border-edge bg-sheet"
          disabled={disabled || value === null || value <= 1}
          onClick={() => onChange((value ?? 2) - 1)}
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
            const digits = event.target.value.replace(/\D/g, '').slice(0, 4)
            onChange(digits === '' ? null : Number(digits))
          }}
        />
        <IconButton
          label={t('line.more')}
          icon={<Icon name="plus" />}
          className="border border-edge bg-sheet"
          disabled={disabled}
          onClick={() => onChange((value ?? 0) + 1)}
        />
      </span>
    </Field>
  )
}
