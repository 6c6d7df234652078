import { z } from 'zod'

/** A bend tied to the roof: its turn is resolved again when the pitch of the job changes. */
export const followsSchema = z.strictObject({
  rule: z.enum([
    'ridge',
    'hip',
    'valley',
    'valleyRib',
    'highSidePeak',
    'eave',
    'eaveSquare',
    'gable',
    'headwall',
    'sidewall',
    'transition',
  ]),
  /** `job`, or degrees of slope, from 0 to less than 90. */
  pitch: z.union([z.literal('job'), z.number()]),
  /** The second slope in degrees, where the rule takes two. */
  second: z.number().optional(),
})

export const bendSchema = z.strictObject({
  /** Signed change of direction in degrees; positive turns left, towards the left side of the walk. */
  turn: z.number(),
  follows: followsSchema.nullable().optional(),
})

const hemTurn = z.union([z.literal(1), z.literal(-1)])

/** `turn` +1 lays the lip on the left side of the walk, -1 on the right. */
export const hemSchema = z.discriminatedUnion('style', [
  z.strictObject({ style: z.literal('closed'), length: z.number(), turn: hemTurn }),
  z.strictObject({ style: z.literal('open'), length: z.number(), gap: z.number(), turn: hemTurn }),
])

export const colorSideSchema = z.enum(['left', 'right', 'both', 'none'])

/** The bounds of what is read at all; what can be made is a matter of `profileProblems`. */
export const MAX_BENDS = 24

/**
 * A bend profile, walked from edge A to edge B: legs L1…Ln in inches (outside dimensions) and the
 * n - 1 bends between them. The schema settles the shape only; whether such a piece can exist is
 * answered by `profileProblems`.
 */
export const profileSchema = z
  .strictObject({
    version: z.literal(1),
    legs: z
      .array(z.number())
      .min(1)
      .max(MAX_BENDS + 1),
    bends: z.array(bendSchema).max(MAX_BENDS),
    hemA: hemSchema.nullable(),
    hemB: hemSchema.nullable(),
    colorSide: colorSideSchema,
  })
  .refine((profile) => profile.bends.length === profile.legs.length - 1, {
    path: ['bends'],
    message: 'A profile has one bend fewer than it has legs.',
  })

export type Follows = z.infer<typeof followsSchema>
export type Bend = z.infer<typeof bendSchema>
export type Hem = z.infer<typeof hemSchema>
export type ColorSide = z.infer<typeof colorSideSchema>
export type Profile = z.infer<typeof profileSchema>
