import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { printAngle } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'
import { printSlope } from '#shared/units/print-slope'
import { Select } from '@/components/Select'
import { TextField } from '@/components/TextField'
import { parseSlope } from '../model/slope'

const HEADINGS = ['level', 'rises', 'falls'] as const
type Heading = (typeof HEADINGS)[number]

interface Props {
  readonly label: string
  /** Which way the slope is told: "into the corner", "to the right". */
  readonly value: Degrees | null
  /** What a slope begins with: the roof's. */
  readonly usual: Degrees
  readonly disabled: boolean
  readonly onChange: (slope: Degrees | null) => void
}

const headingOf = (slope: Degrees | null): Heading =>
  slope === 0 ? 'level' : slope !== null && slope < 0 ? 'falls' : 'rises'

/** Level, or how steeply it rises or falls: as a pitch or in degrees. */
export function SlopeField({ label, value, usual, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  // Which way it goes while what is typed cannot be read.
  const [chosen, setChosen] = useState<Heading | null>(null)
  const [typed, setTyped] = useState<string | null>(null)
  const way = value === null ? (chosen ?? 'rises') : headingOf(value)
  const text = typed ?? (value === null ? '' : printSlope(value))
  const entered = parseSlope(text)
  const refusal = entered.ok ? (entered.degrees === 0 ? 'outOfRange' : null) : entered.refusal

  function turn(heading: Heading) {
    setChosen(heading)
    setTyped(null)
    const size = value === null || value === 0 ? usual : Math.abs(value)
    onChange(heading === 'level' ? 0 : heading === 'rises' ? size : 0 - size)
  }

  return (
    <div className="grid grid-cols-2 items-start gap-3">
      <Select
        label={label}
        value={way}
        disabled={disabled}
        options={HEADINGS.map((heading) => ({ value: heading, label: t(`slope.${heading}`) }))}
        onChange={(event) =>
          turn(HEADINGS.find((heading) => heading === event.target.value) ?? 'level')
        }
      />
      {way !== 'level' && (
        <TextField
          label={t('slope.by')}
          hint={value === null ? undefined : printAngle(Math.abs(value), 2)}
          value={text}
          disabled={disabled}
          autoComplete="off"
          error={refusal === null ? undefined : t(`slope.refused.${refusal}`)}
          onChange={(event) => {
            setTyped(event.target.value)
            setChosen(way)
            const slope = parseSlope(event.target.value)
            // A slope of 0 would read as level while it is still being typed.
            if (!slope.ok || slope.degrees === 0) onChange(null)
            else onChange(way === 'falls' ? 0 - slope.degrees : slope.degrees)
          }}
          onBlur={() => value !== null && setTyped(null)}
        />
      )}
    </div>
  )
}
