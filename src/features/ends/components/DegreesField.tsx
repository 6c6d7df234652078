import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { parseAngle, printAngle } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'
import { TextField } from '@/components/TextField'
import { useRefusalWords } from '@/components/keypad/useRefusalWords'

interface Props {
  readonly label: string
  readonly hint?: string
  readonly value: Degrees | null
  /** The least and the most that may be typed, both allowed. */
  readonly within: readonly [least: Degrees, most: Degrees]
  readonly disabled?: boolean
  readonly onChange: (angle: Degrees | null) => void
}

/** An angle with its sign, typed; null while it cannot be read or is out of its bounds. */
export function DegreesField({ label, hint, value, within, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  const words = useRefusalWords()
  const [typed, setTyped] = useState<string | null>(null)
  const [left, setLeft] = useState(false)
  const text = typed ?? (value === null ? '' : printAngle(value, 4))
  const [least, most] = within

  const read = (next: string): Degrees | null => {
    const angle = parseAngle(next)
    return angle.ok && angle.degrees >= least && angle.degrees <= most ? angle.degrees : null
  }
  const angle = parseAngle(text)
  const error =
    left && value === null
      ? angle.ok
        ? t('missing.angle', { least: printAngle(least), most: printAngle(most) })
        : words(angle, true)
      : undefined

  return (
    <TextField
      label={label}
      hint={hint}
      value={text}
      disabled={disabled}
      autoComplete="off"
      error={error}
      onChange={(event) => {
        setTyped(event.target.value)
        onChange(read(event.target.value))
      }}
      onBlur={() => {
        setLeft(true)
        if (value !== null) setTyped(null)
      }}
    />
  )
}
