import { z } from 'zod'

const point = z.tuple([z.number(), z.number()])
const polygon = z.array(point).min(3)

/** Tools of one fold direction in the fold frame: bend line at the origin, front at x > 0. Inches. */
export const toolSetSchema = z.strictObject({
  inner: polygon,
  outer: polygon,
  apron: polygon,
})

/**
 * A folding brake as data. Lengths in inches, angles in degrees of bend. An up-only brake has no
 * `down` tools.
 */
export const brakeSchema = z.strictObject({
  name: z.string().min(1),
  length: z.number().positive(),
  maxFold: z.number().positive().max(180),
  hemAngle: z.number().positive().max(180),
  hemMin: z.number().nonnegative(),
  hemMax: z.number().positive(),
  minFlange: z.number().nonnegative(),
  minClamp: z.number().nonnegative(),
  throat: z.number().positive(),
  opening: z.number().positive(),
  gauge: z.strictObject({ min: z.number().nonnegative(), max: z.number().positive() }).nullable(),
  safety: z.number().nonnegative(),
  noseZone: z.number().nonnegative(),
  bigFront: z.number().positive(),
  hemsFirst: z.boolean(),
  checkRemoval: z.boolean(),
  up: toolSetSchema,
  down: toolSetSchema.nullable(),
  /** Greatest nominal thickness by metal; null where the brake does not bend that metal at all. */
  capacity: z
    .strictObject({
      steel: z.number().positive().nullable(),
      stainless: z.number().positive().nullable(),
      aluminum: z.number().positive().nullable(),
      copper: z.number().positive().nullable(),
      zinc: z.number().positive().nullable(),
    })
    .partial()
    .optional(),
})

export type ToolSet = z.infer<typeof toolSetSchema>
export type Brake = z.infer<typeof brakeSchema>
