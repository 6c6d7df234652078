import { useState } from 'react'
import type { Inches } from '#shared/units/brands'
import type { LengthUnits } from '#shared/units/length-units'
import type { LengthResult } from '#shared/units/parse-length'
import {
  keypadLength,
  keypadText,
  openKeypad,
  type KeypadPurpose,
  type KeypadState,
} from '@/components/keypad/keypad-model'

export interface Keypad {
  readonly state: KeypadState
  readonly text: string
  readonly length: LengthResult
  /** Applies a press of the model and tells the owner the length, or null where none can be read. */
  readonly press: (next: (state: KeypadState) => KeypadState) => void
}

interface Options {
  readonly value: Inches | null
  readonly units: LengthUnits
  readonly purpose: KeypadPurpose
  readonly onChange: (inches: Inches | null) => void
}

/**
 * The state of an entry. The owner's value is taken over when it is another than the one entered:
 * when the next leg is chosen, or a crease is dragged meanwhile.
 */
export function useKeypad({ value, units, purpose, onChange }: Options): Keypad {
  const [seen, setSeen] = useState(value)
  const [state, setState] = useState(() => openKeypad(value, units, purpose))

  if (seen !== value || state.units !== units) {
    setSeen(value)
    const entered = keypadLength(state)
    const own = entered.ok ? entered.inches : null
    if (own !== value || state.units !== units) setState(openKeypad(value, units, purpose))
  }

  function press(next: (state: KeypadState) => KeypadState) {
    const after = next(state)
    const length = keypadLength(after)
    const inches = length.ok ? length.inches : null
    setState(after)
    if (inches !== value) onChange(inches)
  }

  return { state, text: keypadText(state), length: keypadLength(state), press }
}
