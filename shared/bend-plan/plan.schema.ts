import { z } from 'zod'
import { foldSchema } from '#shared/strip/strip.schema'
import { contactSchema } from './explain/contact.schema'
import { cureEditSchema } from './explain/cure-edit.schema'

/** The tests of one fold, in the order in which they are made. */
export const PLAN_CHECKS = [
  'direction',
  'hemSide',
  'policy',
  'angle',
  'flange',
  'clamp',
  'throat',
  'gauge',
  'rearMeetsTool',
  'frontMeetsTool',
  'meetsItself',
  'apronMeetsRear',
  'cannotLoad',
  'trapped',
] as const

/** Reasons that hold for the whole piece on a brake, before any fold is looked at. */
export const PIECE_CHECKS = ['length', 'thickness', 'metal'] as const

export const planCheckSchema = z.enum(PLAN_CHECKS)
export const reasonCodeSchema = z.enum([...PIECE_CHECKS, ...PLAN_CHECKS, 'noOrder', 'limit'])

/** Compared in this order; integers. */
export const planCostSchema = z.strictObject({
  handling: z.int().nonnegative(),
  wideFront: z.int().nonnegative(),
  faceGauge: z.int().nonnegative(),
})

export const gaugeRestSchema = z.enum(['rawEdge', 'hem', 'formedFace'])

/** What is done with the whole piece before a hit. */
export const moveSchema = z.enum(['load', 'none', 'roll', 'endForEnd', 'both'])

export const planStepSchema = z.strictObject({
  bend: foldSchema,
  leftUp: z.boolean(),
  aBack: z.boolean(),
  /** The move of the whole piece before this hit; `load` for the first. */
  move: moveSchema,
  direction: z.enum(['up', 'down']),
  /** Degrees of bend of the finished fold; 180 for a hem. */
  angle: z.number(),
  /** Degrees the brake must swing, springback included; hemAngle for a hem's first hit. */
  swing: z.number(),
  /** 2 for a hem (fold, then flatten), otherwise 1. */
  hits: z.int().positive(),
  /** The model's gauge distance in inches; null on a brake without a gauge. */
  gauge: z.number().nullable(),
  /** What the gauge rests on; null on a brake without a gauge. */
  restsOn: gaugeRestSchema.nullable(),
  /**
   * What is set on the gauge, in inches: from the true strip or the true folded outside with the
   * brake's line offset. Of a bare section, which knows neither, the model's distance. Null on a brake
   * without a gauge.
   */
  gaugeSetting: z.number().nullable(),
  /** Degrees as the brake's scale reads them; of a hem, the angle of its first hit. */
  scaleAngle: z.number(),
  /** The move before, the hits, and the gauge where its setting changes; null where speeds are unknown. */
  seconds: z.number().nullable(),
})

export const planReasonSchema = z.strictObject({
  code: reasonCodeSchema,
  /** The fold concerned; null where the whole piece is. */
  bend: foldSchema.nullable(),
  /** What was found and the limit it breaks, in the unit of the check (inches or degrees). */
  found: z.number().nullable(),
  limit: z.number().nullable(),
  /**
   * Inches to cut off the outer end of the chain that is in the way, at `edge`, so that this test
   * passes (later ones may not); as found. Null where less would not help or was not looked for.
   */
  overlap: z.number().positive().nullable(),
  /** The edge on the side that is in the way or too short; null where no side is. */
  edge: z.enum(['A', 'B']).nullable(),
  /** The picture at first contact; null for a check that is not about contact. */
  contact: contactSchema.nullable(),
})

/**
 * A single change after which the piece was planned again and bends; offered, never applied by itself.
 *
 * `value` is the new length of the leg or hem (of a section, its planning length), the new signed turn,
 * the gap of an opened hem, or the length of the pieces; null where the code says it all.
 */
export const planCureSchema = z.strictObject({
  code: z.enum([
    'lengthenLeg',
    'shortenLeg',
    'openAngle',
    'changeHem',
    'openHem',
    'closeHem',
    'dropHem',
    'shortenPiece',
    'anotherBrake',
  ]),
  /** The fold concerned; null where a leg or the whole piece is. */
  bend: foldSchema.nullable(),
  /** The leg concerned, from 1 at edge A. */
  leg: z.int().positive().nullable(),
  value: z.number().nullable(),
  /** For `applyEdit` on the profile that was planned; null where no edit of a profile does it. */
  edit: cureEditSchema.nullable(),
})

/** Centre-line legs to sharp corners and signed turns, as the planner sees the piece. */
export const sectionSchema = z.strictObject({
  legs: z.array(z.number().positive()).min(1),
  turns: z.array(z.number()),
  hemA: z
    .strictObject({
      lip: z.number().positive(),
      gap: z.number().nonnegative(),
      turn: z.union([z.literal(1), z.literal(-1)]),
    })
    .nullable(),
  hemB: z
    .strictObject({
      lip: z.number().positive(),
      gap: z.number().nonnegative(),
      turn: z.union([z.literal(1), z.literal(-1)]),
    })
    .nullable(),
})

export const planSchema = z.strictObject({
  feasible: z.boolean(),
  /** True when no cheaper sequence (or, if infeasible, no sequence at all) exists under the checks made. */
  proven: z.boolean(),
  cost: planCostSchema.nullable(),
  lowerBound: planCostSchema.nullable(),
  steps: z.array(planStepSchema),
  /** Of one piece among others like it; null where the brake's speeds are unknown or nothing bends it. */
  seconds: z.number().nullable(),
  section: sectionSchema,
  reasons: z.array(planReasonSchema),
  cures: z.array(planCureSchema),
  /** Which tests of a fold were made: the screen says so. */
  checks: z.array(planCheckSchema),
})

export type PlanCheck = z.infer<typeof planCheckSchema>
export type ReasonCode = z.infer<typeof reasonCodeSchema>
export type PlanCost = z.infer<typeof planCostSchema>
export type PlanStep = z.infer<typeof planStepSchema>
export type PlanReason = z.infer<typeof planReasonSchema>
export type PlanCure = z.infer<typeof planCureSchema>
export type PieceMove = z.infer<typeof moveSchema>
export type Section = z.infer<typeof sectionSchema>
export type Plan = z.infer<typeof planSchema>
