import { z } from 'zod'

/** No roof is steeper and no cut is flatter; beyond it a plane runs along the piece. */
const slope = z
  .number()
  .gt(-90, 'A slope is under 90 degrees.')
  .lt(90, 'A slope is under 90 degrees.')

/**
 * The plane that cuts an end, in the piece's own frame: t along the piece from left to right, u
 * from edge A to edge B, v up, right-handed. Degrees.
 *
 * - `plumb`: a vertical cut where the piece rises by this slope from left to right, t = v tan(slope).
 * - `corner`: two runs meet. `slopeIn` and `slopeOut` are the rise along the way into the corner and
 *   out of it, `plan` the turn between them seen from above, positive to the left. Whether the
 *   piece enters or leaves follows from the end: a right end enters, a left end leaves.
 * - `normal`: any plane by its normal [nt, nu, nv].
 */
export const cutPlaneSchema = z.union([
  z.strictObject({ plumb: slope }),
  z.strictObject({
    corner: z.strictObject({
      slopeIn: slope,
      slopeOut: slope,
      plan: z
        .number()
        .gt(-180, 'A corner turns less than 180 degrees.')
        .lt(180, 'A corner turns less than 180 degrees.'),
    }),
  }),
  z.strictObject({ normal: z.tuple([z.number(), z.number(), z.number()]) }),
])

/** Legs count from 1 at edge A. */
const legNumber = z.int().positive()

/** Extra length on a leg beyond the end's cut, folded over to close the end. Inches. */
export const tabSchema = z.strictObject({
  leg: legNumber,
  length: z.number().positive('A tab needs a length.').max(12, 'A tab is at most 12 in. long.'),
})

/** A leg that is cut by a plane of its own; the cut goes on from where it reaches the leg. */
export const legPlaneSchema = z.strictObject({ leg: legNumber, plane: cutPlaneSchema })

const tabs = z.array(tabSchema).max(25).default([])

export const endSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('square'), tabs }),
  z.strictObject({
    kind: z.literal('lap'),
    /** `under` slips below its neighbor, `over` takes its neighbor in. */
    side: z.enum(['under', 'over']),
    length: z.number().positive('A lap needs a length.').max(24, 'A lap is at most 24 in. long.'),
    tabs,
  }),
  z.strictObject({
    kind: z.literal('miter'),
    plane: cutPlaneSchema,
    /** How the section lies: the angle of leg 1 to u, degrees. */
    lay: z.number().min(-360).max(360),
    legs: z.array(legPlaneSchema).max(25).default([]),
    tabs,
  }),
])

export const sideSchema = z.enum(['left', 'right'])

/**
 * Both ends of a piece, laid left side up with edge A nearest: left is the end of smaller t.
 * `lowEnd` is the end that lies lower on the roof, null where the piece runs level.
 */
export const pieceEndsSchema = z.strictObject({
  left: endSchema,
  right: endSchema,
  lowEnd: sideSchema.nullable(),
})

/**
 * The hands of an order line, seen facing the gable: how many are left and how many right, and
 * which of the two is the one that was drawn. The other is its mirror image, never drawn again.
 */
export const handsSchema = z.strictObject({
  drawn: sideSchema,
  left: z.int().min(0).max(500),
  right: z.int().min(0).max(500),
})

export type CutPlane = z.infer<typeof cutPlaneSchema>
export type Corner = Extract<CutPlane, { readonly corner: unknown }>['corner']
export type Tab = z.infer<typeof tabSchema>
export type LegPlane = z.infer<typeof legPlaneSchema>
export type End = z.infer<typeof endSchema>
export type EndInput = z.input<typeof endSchema>
export type Side = z.infer<typeof sideSchema>
export type PieceEnds = z.infer<typeof pieceEndsSchema>
export type Hands = z.infer<typeof handsSchema>
