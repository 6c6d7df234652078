import type { Metal } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'

export interface Expansion {
  readonly perFahrenheit: number
  readonly perCelsius: number
}

const CELSIUS_STEP = 1.8

const ofCelsius = (millionths: number): Expansion => ({
  perFahrenheit: (millionths * 1e-6) / CELSIUS_STEP,
  perCelsius: millionths * 1e-6,
})

const ofFahrenheit = (millionths: number): Expansion => ({
  perFahrenheit: millionths * 1e-6,
  perCelsius: millionths * 1e-6 * CELSIUS_STEP,
})

/**
 * Linear expansion as a part of the length for each degree. Each is kept as its source states it
 * and converted from there. Steel: Tecnocentro, coefficients of thermal expansion, 12e-6 per C.
 * Stainless (300 series): Elements of Metric Gear Technology, table 18-10, 9.6e-6 per F. Aluminum
 * (1100): Callister, Fundamentals of Materials Science and Engineering, app. B, 23.6e-6 per C.
 * Copper, cold rolled: Copper Development Association, table 1.1A, 9.8e-6 per F. Zinc-titanium: a
 * roofing zinc's technical data, 0.022 mm per m and C.
 */
export const EXPANSION: Readonly<Record<Metal, Expansion>> = {
  steel: ofCelsius(12),
  stainless: ofFahrenheit(9.6),
  aluminum: ofCelsius(23.6),
  copper: ofFahrenheit(9.8),
  zinc: ofCelsius(22),
}

/** A change of temperature; warmer is positive. */
export type TemperatureChange = { readonly fahrenheit: number } | { readonly celsius: number }

const checkFinite = (name: string, value: number): void => {
  if (!Number.isFinite(value)) throw new RangeError(`${name} must be a number, not ${value}.`)
}

/**
 * How much longer a free piece of a length in inches becomes with a change of temperature, in
 * inches; negative where it gets colder. Throws RangeError where a value is no number or the
 * length is negative.
 */
export const thermalMovement = ({
  metal,
  length,
  ...change
}: { readonly metal: Metal; readonly length: Inches } & TemperatureChange): Inches => {
  checkFinite('length', length)
  if (length < 0) throw new RangeError(`length must not be negative, but is ${length} in.`)
  const { perFahrenheit, perCelsius } = EXPANSION[metal]
  if ('fahrenheit' in change) {
    checkFinite('fahrenheit', change.fahrenheit)
    return length * perFahrenheit * change.fahrenheit
  }
  checkFinite('celsius', change.celsius)
  return length * perCelsius * change.celsius
}
