/*
 * Smallest inside radius of a cold bend.
 *
 * Aluminum: Aluminum Association table for bends of 90 degrees (copy dated January 2005), in
 * thicknesses, for sheet of 1/64, 1/32, 1/16 and 1/8 in.; null where the table has nothing. Steel:
 * DIN 6935 (1975-10), millimeters by thickness in millimeters, across the rolling direction and up
 * to 120 degrees of bend; along it more is needed.
 */

/** Thickness of the columns in inches. */
export const ALUMINUM_COLUMNS = [1 / 64, 1 / 32, 1 / 16, 1 / 8] as const

type AluminumRow = readonly [number, number, number, number | null]

export const ALUMINUM_ROWS = {
  '1100-O': [0, 0, 0, 0],
  '1100-H14': [0, 0, 0, 1],
  '3003-O': [0, 0, 0, 0],
  '3003-H12': [0, 0, 0, 0.5],
  '3003-H14': [0, 0, 0, 1],
  '3003-H16': [0.5, 1, 1, 1.5],
  '3105-H25': [0.5, 0.5, 0.5, null],
  '5052-O': [0, 0, 0, 0.5],
  '5052-H32': [0, 0, 1, 1.5],
  '5052-H34': [0, 1, 1.5, 2],
} as const satisfies Record<string, AluminumRow>

/** Up to a thickness of `upTo` mm and over that of the row before. */
export interface SteelRow {
  readonly upTo: number
  /** Millimeters, by the tensile strength of the sheet. */
  readonly upTo390: number
  readonly upTo490: number
}

export const STEEL_ROWS: readonly SteelRow[] = [
  { upTo: 1, upTo390: 1, upTo490: 1.2 },
  { upTo: 1.5, upTo390: 1.6, upTo490: 2 },
  { upTo: 2.5, upTo390: 2.5, upTo490: 3 },
  { upTo: 3, upTo390: 3, upTo490: 4 },
  { upTo: 4, upTo390: 5, upTo490: 5 },
  { upTo: 5, upTo390: 6, upTo490: 8 },
  { upTo: 6, upTo390: 8, upTo490: 10 },
]
