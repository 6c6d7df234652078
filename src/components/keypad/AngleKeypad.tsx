import { useState, type ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { Degrees } from '#shared/units/brands'
import { printAngle } from '#shared/units/angle'
import { Icon } from '@/components/Icon'
import {
  angleOf,
  openAngle,
  pressAngleDigit,
  pressAngleErase,
  pressAnglePoint,
  type AngleState,
} from '@/components/keypad/angle-model'
import { EntryLine } from '@/components/keypad/EntryLine'
import { Key } from '@/components/keypad/Key'
import { useRefusalWords } from '@/components/keypad/useRefusalWords'

export interface QuickAngle {
  readonly degrees: Degrees
  /** Words instead of the figure: "from pitch". */
  readonly label?: string
}

interface Props {
  readonly label: string
  readonly value: Degrees | null
  readonly unit?: string
  readonly aside?: ReactNode
  readonly problem?: string
  /** Angles one press away besides 90, 135 and 45. */
  readonly quick?: readonly QuickAngle[]
  readonly onChange: (angle: Degrees | null) => void
  readonly onDone?: () => void
  readonly children?: ReactNode
}

const UPPER = [1, 2, 3, 4, 5]
const LOWER = [6, 7, 8, 9, 0]
const USUAL: readonly QuickAngle[] = [{ degrees: 90 }, { degrees: 135 }, { degrees: 45 }]

/** The shop keypad for an angle: digits, a decimal point, and the usual angles one press away. */
export function AngleKeypad({
  label,
  value,
  unit,
  aside,
  problem,
  quick = [],
  onChange,
  onDone,
  children,
}: Props) {
  const { t } = useTranslation('components')
  const words = useRefusalWords()
  const [seen, setSeen] = useState(value)
  const [state, setState] = useState(() => openAngle(value))
  const entered = angleOf(state)

  if (seen !== value) {
    setSeen(value)
    if (!entered.ok || entered.degrees !== value) setState(openAngle(value))
  }

  function enter(after: AngleState) {
    setState(after)
    const angle = angleOf(after)
    const next = angle.ok ? angle.degrees : null
    if (next !== value) onChange(next)
  }

  const digit = (figure: number) => (
    <Key key={figure} onClick={() => enter(pressAngleDigit(state, figure))}>
      {figure}
    </Key>
  )

  return (
    <div className="flex max-w-3xl flex-col gap-2">
      <EntryLine
        label={label}
        text={state.text}
        unit={unit ?? t('keypad.degrees')}
        aside={aside}
        error={entered.ok ? problem : words(entered, true)}
        onType={(text) => enter({ text, fresh: false })}
        onDone={onDone}
      />
      <div role="group" aria-label={t('keypad.keys')} className="flex flex-col gap-2">
        <div className="grid grid-cols-6 gap-2">
          {UPPER.map(digit)}
          <Key label={t('keypad.point')} onClick={() => enter(pressAnglePoint(state))}>
            .
          </Key>
          {LOWER.map(digit)}
          <Key label={t('keypad.erase')} onClick={() => enter(pressAngleErase(state))}>
            <Icon name="erase" />
          </Key>
        </div>
        <div className="grid auto-cols-fr grid-flow-col gap-2">
          {[...USUAL, ...quick].map(({ degrees, label: word }) => (
            <Key
              key={word ?? degrees}
              aria-pressed={entered.ok && entered.degrees === degrees}
              onClick={() => enter({ ...openAngle(degrees), fresh: true })}
            >
              {word === undefined ? (
                printAngle(degrees)
              ) : (
                <span className="font-sans text-body leading-tight">{word}</span>
              )}
            </Key>
          ))}
        </div>
      </div>
      {children}
    </div>
  )
}
