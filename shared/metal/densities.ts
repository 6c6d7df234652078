import type { Metal } from '#shared/stock/stock.schema'
import type { Inches, Pounds } from '#shared/units/brands'

/**
 * Pounds per cubic inch. Steel: 490 lb/ft³ (Gere, Mechanics of Materials). Stainless (300 series)
 * and aluminum sheet: Elements of Metric Gear Technology, table 18-10. Copper, cold rolled:
 * Copper Development Association, table 1.1A. Zinc-titanium: 7.18 g/cm³, a roofing zinc's
 * technical data.
 */
export const DENSITIES: Readonly<Record<Metal, number>> = {
  steel: 0.2836,
  stainless: 0.287,
  aluminum: 0.098,
  copper: 0.322,
  zinc: 0.2594,
}

/**
 * Pounds per square foot of a sheet of a thickness in inches, by the metal's true density. The
 * catalogs of gauged steel list another figure, which `findGauge` gives: their thickness was made
 * from a weight by 40 or 41.82 lb/ft² per inch.
 */
export const weightPerSquareFoot = (metal: Metal, thickness: Inches): Pounds =>
  thickness * 144 * DENSITIES[metal]
