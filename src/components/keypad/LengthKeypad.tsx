import type { ReactNode } from 'react'
import type { Inches } from '#shared/units/brands'
import type { LengthUnits } from '#shared/units/length-units'
import { EntryLine } from '@/components/keypad/EntryLine'
import { typeText, type KeypadPurpose } from '@/components/keypad/keypad-model'
import { LengthKeys } from '@/components/keypad/LengthKeys'
import { useKeypad } from '@/components/keypad/useKeypad'
import { useRefusalWords } from '@/components/keypad/useRefusalWords'

interface Props {
  readonly label: string
  readonly value: Inches | null
  readonly units: LengthUnits
  readonly purpose?: KeypadPurpose
  readonly unit?: string
  readonly aside?: ReactNode
  /** What is wrong with a length that can be read: too short for its bends, for example. */
  readonly problem?: string
  /** Told with every press; null while what stands there cannot be read as a length. */
  readonly onChange: (inches: Inches | null) => void
  /** Enter in the field. */
  readonly onDone?: () => void
  /** Buttons below the keys, such as "next leg". */
  readonly children?: ReactNode
}

/**
 * The shop keypad for a length: digits and ft as keys, the fraction as one inch of a tape; typed
 * text and the native keyboard too. Open it for another length with another React `key`.
 *
 *     <LengthKeypad key={leg} label="Leg 2" value={4} units="fraction" onChange={setLeg} />
 */
export function LengthKeypad({
  label,
  value,
  units,
  purpose = 'size',
  unit,
  aside,
  problem,
  onChange,
  onDone,
  children,
}: Props) {
  const keypad = useKeypad({ value, units, purpose, onChange })
  const words = useRefusalWords()
  const { length } = keypad
  return (
    <div className="flex max-w-3xl flex-col gap-2">
      <EntryLine
        label={label}
        text={keypad.text}
        unit={unit}
        aside={aside}
        error={length.ok ? problem : words(length)}
        onType={(text) => keypad.press((state) => typeText(state, text))}
        onDone={onDone}
      />
      <LengthKeys {...keypad} />
      {children}
    </div>
  )
}
