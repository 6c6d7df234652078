import { z } from 'zod'
import { momentSchema } from '#shared/http/fields'

export const metalSchema = z.enum(['steel', 'stainless', 'aluminum', 'copper', 'zinc'])

/** What the geometry and the planner need to know of a sheet. Inches, lb/in³, degrees. */
export const sheetSchema = z.strictObject({
  metal: metalSchema,
  thickness: z.number().positive().max(0.5),
  insideRadius: z.number().nonnegative().max(1),
  kFactor: z.number().positive().max(1),
  /** lb per cubic inch. */
  density: z.number().positive().max(1),
  /** Degrees the sheet opens again per 90 degrees of bend. */
  springbackPer90: z.number().nonnegative().max(45),
})

/**
 * What a shop learned of a stock on one of its brakes from bends it measured: K and inside radius
 * in place of the stock's own.
 */
export const calibrationSchema = z.strictObject({
  brakeId: z.uuid(),
  brakeName: z.string(),
  kFactor: z.number().positive().max(1),
  insideRadius: z.number().nonnegative().max(1),
  /** How many test bends it rests on. */
  bends: z.int().positive(),
  by: z.string(),
  at: momentSchema,
})

/** Where a stock's own K comes from. The words live in the locales, namespace `stocks`. */
export const kSourceSchema = z.enum(['handbookHard', 'handbookSoft', 'din6935', 'shop'])

/** A stock the shop sells: a sheet in a color, from coils of a width. */
export const stockSchema = z.strictObject({
  id: z.uuid(),
  /** What the trade calls the thickness: `24 ga`, `.032`, `16 oz`. */
  thicknessName: z.string(),
  colorName: z.string(),
  /** CSS hex of the painted face; of the bare metal where nothing is painted. */
  colorHex: z.string().regex(/^#[0-9a-f]{6}$/i),
  painted: z.boolean(),
  /** The widest strip the shop can slit of it. */
  widestStrip: z.number().positive(),
  /** The longest piece the shop can shear of it. */
  longestPiece: z.number().positive(),
  sheet: sheetSchema,
  kSource: kSourceSchema,
  /** The paint's T-bend rating: how many thicknesses round which it shows no fracture; null unknown. */
  paintTBend: z.number().nonnegative().max(20).nullable(),
  /** The alloy or grade as a mill names it, where the shop knows it: `3105-H24`. */
  alloy: z.string().max(40).nullable(),
  /** At most one a brake. */
  calibrations: z.array(calibrationSchema),
})

export type Calibration = z.infer<typeof calibrationSchema>
export type KSource = z.infer<typeof kSourceSchema>
export type Metal = z.infer<typeof metalSchema>
export type Sheet = z.infer<typeof sheetSchema>
export type Stock = z.infer<typeof stockSchema>
