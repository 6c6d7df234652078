import { z } from 'zod'

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
})

export type Metal = z.infer<typeof metalSchema>
export type Sheet = z.infer<typeof sheetSchema>
export type Stock = z.infer<typeof stockSchema>
