import type { Degrees } from '#shared/units/brands'
import { parseAngle, printAngle } from '#shared/units/angle'

export interface AngleState {
  readonly text: string
  /** The value was there before: the first key replaces it. */
  readonly fresh: boolean
}

/** To a hundredth, since a pitch gives angles such as 26.57°. */
export const openAngle = (angle: Degrees | null): AngleState =>
  angle === null
    ? { text: '', fresh: false }
    : { text: printAngle(angle, 2).replace('°', ''), fresh: true }

export const pressAngleDigit = ({ text, fresh }: AngleState, digit: number): AngleState => ({
  text: fresh || text === '0' ? String(digit) : `${text}${digit}`,
  fresh: false,
})

export function pressAnglePoint({ text, fresh }: AngleState): AngleState {
  const begun = fresh ? '' : text
  return { text: begun.includes('.') ? begun : `${begun === '' ? '0' : begun}.`, fresh: false }
}

export const pressAngleErase = ({ text }: AngleState): AngleState => ({
  text: text.slice(0, -1),
  fresh: false,
})

export const angleOf = (state: AngleState) => parseAngle(state.text)
