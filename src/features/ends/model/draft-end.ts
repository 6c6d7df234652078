import { z } from 'zod'
import {
  endSchema,
  handsSchema,
  pieceEndsSchema,
  sideSchema,
  type End,
  type Hands,
  type PieceEnds,
} from '#shared/ends/end.schema'

/*
 * Ends and hands while they are written: shaped as in `end.schema.ts`, but a measure that is not
 * filled in yet is null. Inches and degrees.
 */

const measure = z.number().nullable()
const leg = z.int().positive()

export const draftPlaneSchema = z.union([
  z.strictObject({ plumb: measure }),
  z.strictObject({
    corner: z.strictObject({ slopeIn: measure, slopeOut: measure, plan: measure }),
  }),
  z.strictObject({ normal: z.tuple([measure, measure, measure]) }),
])

const tabs = z.array(z.strictObject({ leg, length: measure }))

export const draftEndSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('square'), tabs }),
  z.strictObject({
    kind: z.literal('lap'),
    side: z.enum(['under', 'over']),
    length: measure,
    tabs,
  }),
  z.strictObject({
    kind: z.literal('miter'),
    plane: draftPlaneSchema,
    lay: measure,
    legs: z.array(z.strictObject({ leg, plane: draftPlaneSchema })),
    tabs,
  }),
])

export const draftEndsSchema = z.strictObject({
  left: draftEndSchema,
  right: draftEndSchema,
  lowEnd: sideSchema.nullable(),
})

export const draftHandsSchema = z.strictObject({
  drawn: sideSchema,
  left: measure,
  right: measure,
})

export type DraftPlane = z.infer<typeof draftPlaneSchema>
export type DraftEnd = z.infer<typeof draftEndSchema>
export type DraftMiter = Extract<DraftEnd, { kind: 'miter' }>
export type DraftEnds = z.infer<typeof draftEndsSchema>
export type DraftHands = z.infer<typeof draftHandsSchema>

/** The end as the shop takes it; null while a measure is missing or out of its bounds. */
export const completeEnd = (end: DraftEnd): End | null => endSchema.safeParse(end).data ?? null

/** Both ends as the shop takes them; null while a measure is missing or out of its bounds. */
export const completeEnds = (ends: DraftEnds): PieceEnds | null =>
  pieceEndsSchema.safeParse(ends).data ?? null

/** Null while a count is missing. */
export const completeHands = (hands: DraftHands): Hands | null =>
  handsSchema.safeParse(hands).data ?? null
