/** How a person reads lengths: inches with fractions, decimal inches, or millimeters. */
export const UNITS = ['fraction', 'decimal', 'mm'] as const

export type LengthUnits = (typeof UNITS)[number]

/** What a number typed without a unit means. */
export type AssumedUnit = 'inches' | 'millimeters'

export const assumedUnit = (units: LengthUnits): AssumedUnit =>
  units === 'mm' ? 'millimeters' : 'inches'

export const MM_PER_INCH = 25.4

export const INCHES_PER_FOOT = 12
