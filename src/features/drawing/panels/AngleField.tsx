import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { includedAngle, parseAngle, printAngle, turnOfIncluded } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'
import { TextField } from '@/components/TextField'
import { useRefusalWords } from '@/components/keypad/useRefusalWords'

interface Props {
  readonly label: string
  readonly turn: Degrees
  readonly onChange: (turn: Degrees) => void
}

/** The included angle of a bend as typed text; the side it folds to stays. */
export function AngleField({ label, turn, onChange }: Props) {
  const { t } = useTranslation('drawing')
  const words = useRefusalWords()
  const printed = printAngle(includedAngle(turn), 4)
  const [typed, setTyped] = useState<string | null>(null)
  const entered = parseAngle(typed ?? printed)
  const isBend = entered.ok && entered.degrees > 0 && entered.degrees < 180
  const error = entered.ok ? (isBend ? undefined : t('angleFault')) : words(entered, true)

  return (
    <TextField
      label={label}
      value={typed ?? printed}
      inputMode="decimal"
      autoComplete="off"
      error={typed === null ? undefined : error}
      onChange={(event) => {
        const text = event.target.value
        setTyped(text)
        const angle = parseAngle(text)
        if (angle.ok && angle.degrees > 0 && angle.degrees < 180)
          onChange(turnOfIncluded(angle.degrees, turn))
      }}
      onBlur={() => isBend && setTyped(null)}
    />
  )
}
