import { useState } from 'react'
import type { FieldLabels } from '@/components/field-style'
import { TextField } from '@/components/TextField'
import { parsePlainNumber } from '#shared/units/typed-number'

interface Props extends FieldLabels {
  readonly value: number | null
  /** Said of what cannot be read as a number. */
  readonly malformed: string
  readonly onChange: (value: number | null) => void
}

/** A bare number, such as degrees or a rise in 12, as typed text; null while it cannot be read. */
export function NumberField({ label, hint, error, value, malformed, onChange }: Props) {
  const [typed, setTyped] = useState<string | null>(null)
  return (
    <TextField
      label={label}
      hint={value === null ? undefined : hint}
      error={value === null ? malformed : error}
      value={typed ?? String(value)}
      inputMode="decimal"
      autoComplete="off"
      onChange={(event) => {
        const text = event.target.value
        setTyped(text)
        // No such number has thousands: a comma is a decimal point, as for a pitch.
        const number = parsePlainNumber(text.trim().replace(/ ?°$/, '').replace(',', '.'))
        onChange(number.ok ? number.value : null)
      }}
      onBlur={() => value !== null && setTyped(null)}
    />
  )
}
