import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { isEqual } from '#shared/geometry/tolerance'
import type { Follows } from '#shared/profile/profile.schema'
import type { Degrees } from '#shared/units/brands'
import { printSlope } from '#shared/units/print-slope'
import { Choice } from '@/components/Choice'
import { TextField } from '@/components/TextField'
import {
  needsSecond,
  readSlope,
  SLOPE_READINGS,
  slopeText,
  type SlopeReading,
} from '../model/second-slope'

interface Props {
  readonly rule: Follows['rule']
  /** Absent: the job's. */
  readonly value: Degrees | undefined
  /** Of the job's roof; null without a job. */
  readonly jobSlope: Degrees | null
  readonly onChange: (second: Degrees | undefined) => void
}

const readingOf = (slope: Degrees | undefined): SlopeReading =>
  slope === undefined || printSlope(slope).endsWith('/12') ? 'rise' : 'degrees'

/** The slope of the other roof, as its rise in 12 or in degrees; empty is the job's. */
export function SecondSlope({ rule, value, jobSlope, onChange }: Props) {
  const { t } = useTranslation('drawing')
  const [reading, setReading] = useState(() => readingOf(value))
  const [typed, setTyped] = useState<string | null>(null)
  const [seen, setSeen] = useState(value)
  const entered = readSlope(typed ?? '', reading)

  if (seen !== value) {
    setSeen(value)
    // Undone or chosen elsewhere: what was typed is no longer so.
    const same = entered.ok && value !== undefined && isEqual(entered.degrees, value)
    if (!same) setTyped(null)
  }

  function enter(text: string) {
    setTyped(text)
    const slope = readSlope(text, reading)
    if (slope.ok) onChange(slope.degrees)
    else if (slope.refusal === 'empty') onChange(undefined)
  }

  const refused = typed !== null && !entered.ok && entered.refusal !== 'empty'
  const hint =
    jobSlope === null || needsSecond(rule)
      ? t('second.needed')
      : t('second.usual', { slope: printSlope(jobSlope) })
  return (
    <div className="flex flex-wrap items-start gap-3">
      <TextField
        label={t('second.label')}
        className="w-44"
        value={typed ?? (value === undefined ? '' : slopeText(value, reading))}
        inputMode="decimal"
        autoComplete="off"
        hint={value === undefined && !refused ? hint : undefined}
        error={refused ? t(`second.refused.${entered.refusal}`, { context: reading }) : undefined}
        onChange={(event) => enter(event.target.value)}
      />
      <Choice
        legend={t('second.reading')}
        value={reading}
        options={SLOPE_READINGS.map((known) => ({ value: known, label: t(`second.${known}`) }))}
        onChange={(next) => {
          setReading(next)
          setTyped(null)
        }}
      />
    </div>
  )
}
