import type { Inches } from '#shared/units/brands'
import type { LengthUnits } from '#shared/units/length-units'
import { INCHES_PER_FOOT, MM_PER_INCH } from '#shared/units/length-units'

export type LengthStyle = 'feetInches' | 'fraction' | 'decimal' | 'millimeters'

export type Denominator = 16 | 32 | 64

/** Decimal inches to a ten-thousandth: the least that shows every 1/16 exactly. */
const DECIMALS = 4
/** Millimeters to a tenth, finer than a tape. */
const MM_DECIMALS = 1

const checkFinite = (inches: Inches): void => {
  if (!Number.isFinite(inches)) throw new RangeError(`A length must be a number, not ${inches}.`)
}

/** Rounded half away from zero, so that a length and its negative print alike. */
const roundTo = (value: number, parts: number): number =>
  (Math.sign(value) * Math.round(Math.abs(value) * parts)) / parts

/** The value that `printLength` shows, in inches. Throws RangeError on NaN and infinity. */
export const roundLength = (
  inches: Inches,
  style: LengthStyle,
  denominator: Denominator = 16,
): Inches => {
  checkFinite(inches)
  switch (style) {
    case 'feetInches':
    case 'fraction':
      return roundTo(inches, denominator)
    case 'decimal':
      return roundTo(inches, 10 ** DECIMALS)
    case 'millimeters':
      return roundTo(inches * MM_PER_INCH, 10 ** MM_DECIMALS) / MM_PER_INCH
  }
}

/** `5 3/4`, `3/4`, `5` or `0`; the fraction in lowest terms. */
const mixedNumber = (inches: Inches, denominator: Denominator): string => {
  const whole = Math.floor(inches)
  let above = Math.round((inches - whole) * denominator)
  let below: number = denominator
  if (above === 0) return `${whole}`
  while (above % 2 === 0) {
    above /= 2
    below /= 2
  }
  return whole === 0 ? `${above}/${below}` : `${whole} ${above}/${below}`
}

const feetAndInches = (inches: Inches, denominator: Denominator): string => {
  const feet = Math.floor(inches / INCHES_PER_FOOT)
  const rest = inches - feet * INCHES_PER_FOOT
  if (feet === 0) return `${mixedNumber(rest, denominator)}"`
  return rest === 0 ? `${feet}'` : `${feet}' ${mixedNumber(rest, denominator)}"`
}

/**
 * Prints a length in inches: `5' 3 1/2"`, `63 1/2"`, `63.5"` or `1612.9 mm`. Rounded by
 * `roundLength`; `parseLength` of the result gives the rounded value. Throws RangeError on NaN
 * and infinity.
 */
export const printLength = (
  inches: Inches,
  style: LengthStyle,
  denominator: Denominator = 16,
): string => {
  const rounded = roundLength(inches, style, denominator)
  const sign = rounded < 0 ? '-' : ''
  const size = Math.abs(rounded)
  switch (style) {
    case 'feetInches':
      return `${sign}${feetAndInches(size, denominator)}`
    case 'fraction':
      return `${sign}${mixedNumber(size, denominator)}"`
    case 'decimal':
      return `${sign}${size}"`
    case 'millimeters':
      return `${sign}${roundTo(size * MM_PER_INCH, 10 ** MM_DECIMALS)} mm`
  }
}

const SIZE_STYLES: Record<LengthUnits, LengthStyle> = {
  fraction: 'fraction',
  decimal: 'decimal',
  mm: 'millimeters',
}

/** A dimension of a profile: always in inches (or mm), never in feet. */
export const printSize = (
  inches: Inches,
  units: LengthUnits,
  denominator: Denominator = 16,
): string => printLength(inches, SIZE_STYLES[units], denominator)

/** A length along the piece or the roof: in feet and inches where fractions are read. */
export const printRun = (
  inches: Inches,
  units: LengthUnits,
  denominator: Denominator = 16,
): string =>
  printLength(inches, units === 'fraction' ? 'feetInches' : SIZE_STYLES[units], denominator)
