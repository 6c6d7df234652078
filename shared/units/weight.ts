import type { Pounds } from '#shared/units/brands'
import type { LengthUnits } from '#shared/units/length-units'

/** Exact by definition (international pound, 1959). */
export const KG_PER_POUND = 0.45359237

/** `12.4 lb`, or `5.6 kg` where lengths are read in millimeters. Throws RangeError on NaN. */
export const printWeight = (pounds: Pounds, units: LengthUnits): string => {
  if (!Number.isFinite(pounds)) throw new RangeError(`A weight must be a number, not ${pounds}.`)
  const [value, unit] = units === 'mm' ? [pounds * KG_PER_POUND, 'kg'] : [pounds, 'lb']
  return `${Math.round(value * 10) / 10} ${unit}`
}
