import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Inches } from '#shared/units/brands'
import { DimensionField } from '@/components/keypad/DimensionField'
import { useUnits } from '@/features/people/useUnits'

interface Props {
  readonly label: string
  readonly hint?: string
  readonly value: Inches | null
  /** The most that the shop takes here. */
  readonly most: Inches
  readonly disabled: boolean
  readonly onChange: (length: Inches | null) => void
}

/** A length that must be there: says so once the field is left empty. */
export function EndLengthField({ label, hint, value, most, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  const { units, size } = useUnits()
  const [left, setLeft] = useState(false)
  const error =
    value === null
      ? left
        ? t('missing.length')
        : undefined
      : value <= 0 || value > most
        ? t('missing.lengthUpTo', { most: size(most) })
        : undefined
  return (
    <DimensionField
      label={label}
      hint={hint}
      units={units}
      value={value}
      disabled={disabled}
      error={error}
      onChange={onChange}
      onBlur={() => setLeft(true)}
    />
  )
}
