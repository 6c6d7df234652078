import type { Inches } from '#shared/units/brands'
import type { AssumedUnit } from '#shared/units/length-units'
import { INCHES_PER_FOOT, MM_PER_INCH } from '#shared/units/length-units'
import type { NumberResult, TypedRefusal } from '#shared/units/typed-number'
import { findRefusal, parsePlainNumber, plainText, refusal } from '#shared/units/typed-number'

export type LengthResult = { readonly ok: true; readonly inches: Inches } | TypedRefusal

/** Longer than any roof line; anything above is a slip of the finger. */
export const LONGEST_LENGTH: Inches = 100_000

const METRIC = /^([\d.]+) ?(mm|cm|m)\.?$/
const MM_PER: Record<string, number> = { mm: 1, cm: 10, m: 1000 }
const FEET = /^(.+?) ?(?:'|ft\.?|feet|foot) ?-? ?(.*)$/
const INCHES = /^(.+?) ?(?:"|in\.?|inch|inches)$/

const bounded = (number: NumberResult, inchesEach: (value: number) => Inches): LengthResult => {
  if (!number.ok) return number
  const inches = inchesEach(number.value)
  return inches <= LONGEST_LENGTH ? { ok: true, inches } : refusal('tooLarge')
}

/** `5' 3 1/2"`: feet before inches are whole, alone they may be `5.5'` or `5 1/2'`. */
const parseFeet = (feetText: string, inchText: string): LengthResult => {
  const feet = parsePlainNumber(feetText)
  if (inchText === '') return bounded(feet, (value) => value * INCHES_PER_FOOT)
  if (!feet.ok) return feet
  if (!Number.isInteger(feet.value)) return refusal('malformed')
  const inches = parsePlainNumber(INCHES.exec(inchText)?.[1] ?? inchText)
  return bounded(inches, (value) => feet.value * INCHES_PER_FOOT + value)
}

/**
 * Reads a length as people type it: `5 3/4`, `5-3/4`, `5.75`, `5' 3 1/2"`, `5ft 3in`, `63"`,
 * `146mm`, `14.6 cm`, with fractions in one character and real primes too. `assumed` is what a
 * number without a unit means. Fractions of 64ths come out exact.
 *
 * Nothing is guessed. `5,75` is refused as ambiguous, with what may have been meant as cures; so
 * is a fraction without a unit where millimeters are assumed. Never throws.
 */
export const parseLength = (text: string, assumed: AssumedUnit): LengthResult => {
  const plain = plainText(text)
  const refused = findRefusal(plain, (cure) => parseLength(cure, assumed).ok)
  if (refused) return refused
  if (plain.startsWith('-')) return refusal('negative')

  const [, metricText, metricUnit] = METRIC.exec(plain) ?? []
  if (metricText !== undefined && metricUnit !== undefined) {
    const each = MM_PER[metricUnit] ?? 1
    return bounded(parsePlainNumber(metricText), (value) => (value * each) / MM_PER_INCH)
  }
  const [, feetText, afterFeet] = FEET.exec(plain) ?? []
  if (feetText !== undefined) return parseFeet(feetText, afterFeet ?? '')

  const inchText = INCHES.exec(plain)?.[1]
  if (inchText !== undefined || assumed === 'inches') {
    return bounded(parsePlainNumber(inchText ?? plain), (value) => value)
  }
  const number = parsePlainNumber(plain)
  if (number.ok && plain.includes('/')) return refusal('fractionWithoutUnit', [`${plain}"`])
  return bounded(number, (value) => value / MM_PER_INCH)
}
