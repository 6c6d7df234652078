import { z } from 'zod'

const point = z.tuple([z.number(), z.number()])
const polygon = z.array(point).min(3)

/** Tools of one fold direction in the fold frame: bend line at the origin, front at x > 0. Inches. */
export const toolSetSchema = z.strictObject({
  inner: polygon,
  outer: polygon,
  apron: polygon,
})

/** Seconds that each thing takes on a brake; moves are of the whole piece. */
export const brakeSpeedsSchema = z.strictObject({
  /** Laying the blank in, for the first hit of a piece. */
  load: z.number().nonnegative(),
  /** Clamp, fold, open; a hem takes two hits. */
  hit: z.number().nonnegative(),
  roll: z.number().nonnegative(),
  endForEnd: z.number().nonnegative(),
  both: z.number().nonnegative(),
  /** Setting the gauge anew. */
  gaugeMove: z.number().nonnegative(),
})

export const WEEKDAYS = ['mon', 'tue', 'wed', 'thu', 'fri', 'sat', 'sun'] as const

const clockTime = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/)

/** When the brake is run, by the shop's clock, `HH:MM` from 00:00 to 23:59. */
export const brakeHoursSchema = z
  .strictObject({ days: z.array(z.enum(WEEKDAYS)).min(1), from: clockTime, to: clockTime })
  .refine(({ from, to }) => from < to, { path: ['to'], error: 'Hours end after they begin.' })

/** What the brake's angle scale reads, and who adds the springback. */
export const brakeScaleSchema = z.strictObject({
  /** Degrees of bend from flat, or the included angle left between the legs. */
  reads: z.enum(['bend', 'included']),
  /** By hand: the overbent angle is set. By machine: the finished one is, and the machine adds to it. */
  overbend: z.enum(['hand', 'machine']),
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
  /** Absent: no times are told. */
  speeds: brakeSpeedsSchema.optional(),
  hours: z.array(brakeHoursSchema).optional(),
  /** Absent: degrees of bend, overbend set by hand. */
  scale: brakeScaleSchema.optional(),
  /**
   * From the start of a bend zone (its border towards the gauge) to the nose when the bend comes out
   * right, by a test bend on this brake: what a gauge setting is more than the sheet behind the zone.
   * Absent: 0.
   */
  lineOffset: z.number().optional(),
})

export type ToolSet = z.infer<typeof toolSetSchema>
export type Brake = z.infer<typeof brakeSchema>
