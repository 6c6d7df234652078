import { thermalMovement } from '#shared/metal/thermal-movement'
import type { RoofPieces } from '#shared/roof-line/roof-pieces'
import type { Metal } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'

/**
 * Degrees Fahrenheit between the coldest and the hottest that roof metal was measured in a year,
 * -20 to 150. Source: Copper Flashings, a manual, p. 60.
 */
export const ROOF_TEMPERATURE_RANGE = 170

/**
 * How much the longest piece of a line grows over a year's range of temperatures, inches; the range
 * in degrees Fahrenheit. A piece that is fastened at both ends has to have this room. Throws
 * RangeError for a range that is no number.
 */
export const longestPieceMovement = (
  { pieces }: Pick<RoofPieces, 'pieces'>,
  metal: Metal,
  fahrenheit: number = ROOF_TEMPERATURE_RANGE,
): Inches =>
  thermalMovement({ metal, length: Math.max(...pieces.map(({ length }) => length)), fahrenheit })
