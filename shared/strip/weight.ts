import type { ColorSide } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import type { Inches, Pounds } from '#shared/units/brands'

/** Strip width x length x thickness x density, in pounds. */
export const pieceWeight = (
  strip: Pick<Strip, 'stripWidth'>,
  sheet: Pick<Sheet, 'thickness' | 'density'>,
  length: Inches,
): Pounds => strip.stripWidth * length * sheet.thickness * sheet.density

const PAINTED_FACES: Record<ColorSide, number> = { left: 1, right: 1, both: 2, none: 0 }

/** The painted area of one piece in square inches; a sheet painted on both faces counts twice. */
export const paintedArea = (
  strip: Pick<Strip, 'stripWidth'>,
  colorSide: ColorSide,
  length: Inches,
): number => strip.stripWidth * length * PAINTED_FACES[colorSide]
