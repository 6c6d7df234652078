import type { Inches } from '#shared/units/brands'
import { assumedUnit, INCHES_PER_FOOT, type LengthUnits } from '#shared/units/length-units'
import { parseLength, type LengthResult } from '#shared/units/parse-length'
import { printLength, roundLength } from '#shared/units/print-length'

/** Sixteenths are the keys of the tape. */
export const TICKS = 16

/** `size`: a dimension of a profile, in inches alone. `run`: a length, in feet and inches. */
export type KeypadPurpose = 'size' | 'run'

/** What has been entered: with the keys, or as text, which then stands for the whole. */
export interface KeypadState {
  readonly units: LengthUnits
  readonly purpose: KeypadPurpose
  /** Digits before the ft key; empty without feet. */
  readonly feet: string
  /** Digits of the inches or millimeters; with a point where decimals are entered. */
  readonly whole: string
  /** 0…15 */
  readonly sixteenths: number
  readonly typed: string | null
  /** The value was there before: the first digit replaces it, a tick only changes its fraction. */
  readonly fresh: boolean
}

const blank = { feet: '', whole: '', sixteenths: 0, typed: null, fresh: false } as const

const withoutUnit = (text: string): string => text.replace(/ ?(?:"|mm)$/, '')

/** The parts of a value, or its text where the keys have no sign for it (a 32nd). */
function partsOf(
  inches: Inches,
  units: LengthUnits,
  purpose: KeypadPurpose,
): Pick<KeypadState, 'feet' | 'whole' | 'sixteenths' | 'typed'> {
  if (units === 'mm') return { ...blank, whole: withoutUnit(printLength(inches, 'millimeters')) }
  if (units === 'decimal') return { ...blank, whole: withoutUnit(printLength(inches, 'decimal')) }
  if (!Number.isInteger(inches * TICKS)) {
    const exact = roundLength(inches, 'fraction', 64) === inches
    return { ...blank, typed: printLength(inches, exact ? 'fraction' : 'decimal', 64) }
  }
  const feet = purpose === 'run' ? Math.floor(inches / INCHES_PER_FOOT) : 0
  const rest = inches - feet * INCHES_PER_FOOT
  const whole = Math.floor(rest)
  return {
    ...blank,
    feet: feet === 0 ? '' : String(feet),
    whole: whole === 0 ? '' : String(whole),
    sixteenths: (rest - whole) * TICKS,
  }
}

export function openKeypad(
  inches: Inches | null,
  units: LengthUnits,
  purpose: KeypadPurpose,
): KeypadState {
  if (inches === null) return { ...blank, units, purpose }
  return { units, purpose, ...partsOf(inches, units, purpose), fresh: true }
}

const emptied = (state: KeypadState): KeypadState => ({ ...state, ...blank })

/** `0`…`9`. A digit after text, or on a value that was there before, begins anew. */
export function pressDigit(state: KeypadState, digit: number): KeypadState {
  const begun = state.fresh || state.typed !== null ? emptied(state) : state
  return { ...begun, whole: begun.whole === '0' ? String(digit) : `${begun.whole}${digit}` }
}

/** The decimal point; one in a number. */
export function pressPoint(state: KeypadState): KeypadState {
  const begun = state.fresh || state.typed !== null ? emptied(state) : state
  if (begun.whole.includes('.')) return begun
  return { ...begun, whole: `${begun.whole === '' ? '0' : begun.whole}.` }
}

/** What has been entered so far is feet; again, and it is inches once more. */
export function pressFeet(state: KeypadState): KeypadState {
  if (state.typed !== null) return state
  if (state.feet !== '') {
    return state.whole === '' ? { ...state, feet: '', whole: state.feet, fresh: false } : state
  }
  if (state.whole === '') return state
  return { ...state, feet: state.whole, whole: '', fresh: false }
}

/** A sixteenth on the tape; the zero of the tape takes the fraction away. */
export function pressTick(state: KeypadState, sixteenths: number): KeypadState {
  const begun = state.typed !== null ? emptied(state) : state
  return { ...begun, sixteenths, fresh: false }
}

/** Takes the last part away: the fraction, then digit by digit. */
export function pressErase(state: KeypadState): KeypadState {
  if (state.typed !== null) return emptied(state)
  if (state.sixteenths !== 0) return { ...state, sixteenths: 0, fresh: false }
  if (state.whole !== '') return { ...state, whole: state.whole.slice(0, -1), fresh: false }
  return { ...state, feet: state.feet.slice(0, -1), fresh: false }
}

export const typeText = (state: KeypadState, text: string): KeypadState => ({
  ...state,
  ...blank,
  typed: text,
})

/** `3/8`, `1/2`; empty for none. */
export function tickText(sixteenths: number): string {
  if (sixteenths === 0) return ''
  let above = sixteenths
  let below = TICKS
  while (above % 2 === 0) {
    above /= 2
    below /= 2
  }
  return `${above}/${below}`
}

/** What stands in the field, ready to be read by `parseLength`: `10' 6 1/2`, `4`, `146.1`. */
export function keypadText(state: KeypadState): string {
  if (state.typed !== null) return state.typed
  const inches = [state.whole, tickText(state.sixteenths)].filter((part) => part !== '').join(' ')
  const feet = state.feet === '' ? '' : `${state.feet}'`
  return [feet, inches].filter((part) => part !== '').join(' ')
}

/** The length entered, or why it cannot be read; the same rules as for any typed length. */
export const keypadLength = (state: KeypadState): LengthResult =>
  parseLength(keypadText(state), assumedUnit(state.units))

/** The tick under a touch at `x` on a tape `width` wide: each has an equal cell of the tape. */
export function tickAt(x: number, width: number): number {
  if (width <= 0) throw new RangeError('A tape needs a width.')
  return Math.min(TICKS - 1, Math.max(0, Math.floor((x / width) * TICKS)))
}
