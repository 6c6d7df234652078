import { degrees } from '#shared/geometry/vector'
import type { Degrees } from '#shared/units/brands'
import type { TypedRefusal } from '#shared/units/typed-number'
import { findRefusal, parsePlainNumber, plainText, refusal } from '#shared/units/typed-number'

export type AngleResult = { readonly ok: true; readonly degrees: Degrees } | TypedRefusal

/** How a person reads a bend: the angle between the faces, or how far the sheet is turned. */
export const ANGLE_READINGS = ['included', 'bend'] as const

export type AngleReading = (typeof ANGLE_READINGS)[number]

const ANGLE = /^(-?)(.+?) ?(?:°|º|deg\.?|degrees?|grados?)?$/

/** A whole turn and no more. */
const MOST_DEGREES: Degrees = 360

/**
 * Reads `135`, `135°`, `45 deg`, `22.5` or `-45`, in degrees. Which angles a bend may have is not
 * decided here. `45,5` is refused as ambiguous, as for lengths. Never throws.
 */
export const parseAngle = (text: string): AngleResult => {
  const plain = plainText(text)
  const refused = findRefusal(plain, (cure) => parseAngle(cure).ok)
  if (refused) return refused
  const [, minus, numberText] = ANGLE.exec(plain) ?? []
  const number = parsePlainNumber(numberText ?? '')
  if (!number.ok) return number
  if (number.value > MOST_DEGREES) return refusal('tooLarge')
  return { ok: true, degrees: minus === '-' ? 0 - number.value : number.value }
}

/** The value that `printAngle` shows. */
export const roundAngle = (angle: Degrees, decimals = 1): Degrees => {
  const parts = 10 ** decimals
  return (Math.sign(angle) * Math.round(Math.abs(angle) * parts)) / parts
}

/** `135°`, `116.6°`; rounded to a tenth unless told. Throws RangeError on NaN and infinity. */
export const printAngle = (angle: Degrees, decimals = 1): string => {
  if (!Number.isFinite(angle)) throw new RangeError(`An angle must be a number, not ${angle}.`)
  const rounded = roundAngle(angle, decimals)
  return `${rounded === 0 ? 0 : rounded}°`
}

/** The angle between the faces of a bend: 180 less what the sheet is turned, whichever way. */
export const includedAngle = (turn: Degrees): Degrees => 180 - Math.abs(turn)

/** A bend of an included angle that turns to the side of `side`; left where `side` is 0. */
export const turnOfIncluded = (included: Degrees, side: number): Degrees =>
  side < 0 ? included - 180 : 180 - included

/** A bend as the person reads it, without its side. */
export const printBend = (turn: Degrees, reading: AngleReading, decimals = 1): string =>
  printAngle(reading === 'included' ? includedAngle(turn) : Math.abs(turn), decimals)

/** The slope in degrees of a roof that rises `rise` inches in 12: atan(rise / 12). */
export const pitchAngle = (rise: number): Degrees => degrees(Math.atan2(rise, 12))
