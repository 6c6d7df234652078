import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Inches } from '#shared/units/brands'
import type { LengthUnits } from '#shared/units/length-units'
import { MM_PER_INCH } from '#shared/units/length-units'

/** Steps in which a limit is told, in inches; a person reads it off a tape. */
const STEP: Record<LengthUnits, Inches> = { fraction: 1 / 16, decimal: 0.01, mm: 0.5 / MM_PER_INCH }

/** The nearest step of the tape, in inches, that is no less (`up`) or no more (`down`) than a length. */
export const tapeStep = (inches: Inches, way: 'up' | 'down', units: LengthUnits): Inches => {
  const steps = inches / STEP[units]
  return (
    (way === 'down' ? Math.floor(steps + TOLERANCE) : Math.ceil(steps - TOLERANCE)) * STEP[units]
  )
}
