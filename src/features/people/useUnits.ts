import { useMemo } from 'react'
import type { Inches, Pounds } from '#shared/units/brands'
import { assumedUnit, type AssumedUnit, type LengthUnits } from '#shared/units/length-units'
import { printRun, printSize, type Denominator } from '#shared/units/print-length'
import { printWeight } from '#shared/units/weight'
import { usePerson } from '@/features/people/person-context'

export interface UnitFormats {
  readonly units: LengthUnits
  /** What a number typed without a unit means to this person. */
  readonly assumed: AssumedUnit
  /** A dimension of a profile: `3 1/2"`, `3.5"`, `88.9 mm`. To 16ths unless told. */
  readonly size: (inches: Inches, denominator?: Denominator) => string
  /** A length along the piece or the roof: `10' 6"`, `126"`, `3200.4 mm`. */
  readonly run: (inches: Inches) => string
  readonly weight: (pounds: Pounds) => string
}

/** Prints lengths and weights as the person who is signed in reads them. */
export function useUnits(): UnitFormats {
  const { units } = usePerson()
  return useMemo(
    () => ({
      units,
      assumed: assumedUnit(units),
      size: (inches, denominator) => printSize(inches, units, denominator),
      run: (inches) => printRun(inches, units),
      weight: (pounds) => printWeight(pounds, units),
    }),
    [units],
  )
}
