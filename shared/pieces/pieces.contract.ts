import { z } from 'zod'
import { sideSchema } from '#shared/ends/end.schema'
import { endpoint } from '#shared/http/endpoint'
import { momentSchema, textField } from '#shared/http/fields'
import { pieceStateSchema, stationSchema } from '#shared/pieces/piece-state'

export const pieceEventSchema = z.strictObject({
  id: z.int(),
  from: pieceStateSchema.nullable(),
  to: pieceStateSchema,
  at: momentSchema,
  by: z.string(),
  station: stationSchema,
  reason: z.string().nullable(),
  /** The event this one takes back. */
  undoes: z.int().nullable(),
})

/** A piece with where it belongs and everything that happened to it, oldest first. */
export const pieceSchema = z.strictObject({
  code: z.string(),
  state: pieceStateSchema,
  sequence: z.int(),
  quantity: z.int(),
  /** L or R; null where the line has no hands. */
  hand: sideSchema.nullable(),
  /** The end that lies lower on the roof, by this piece's own hand; null where it runs level. */
  lowEnd: sideSchema.nullable(),
  mark: z.string(),
  name: z.string(),
  length: z.number(),
  orderId: z.uuid(),
  orderNumber: z.int(),
  company: z.string(),
  job: z.string(),
  runId: z.uuid(),
  runNumber: z.int(),
  bundleCode: z.string().nullable(),
  rackPlace: z.string().nullable(),
  /** Codes of the piece it replaces and of the one that replaces it. */
  remakeOf: z.string().nullable(),
  remadeAs: z.string().nullable(),
  events: z.array(pieceEventSchema),
})

/** What a move answers: the piece as it is now and the event to take back if it was a slip. */
export const movedSchema = z.strictObject({
  piece: pieceSchema,
  eventId: z.int(),
})

/** Shown with a `wrong-state` problem: what the piece is, and who made it so. */
export const pieceConflictSchema = z.strictObject({
  code: z.string(),
  state: pieceStateSchema,
  at: momentSchema,
  by: z.string(),
  station: stationSchema,
})

const codeParams = z.strictObject({ code: z.string().max(40) })

export const getPiece = endpoint({
  method: 'GET',
  path: '/pieces/:code',
  permission: 'pieces.read',
  summary: 'One piece by the code on its label, with its history.',
  params: codeParams,
  answer: pieceSchema,
})

export const bendPiece = endpoint({
  method: 'POST',
  path: '/pieces/:code/bent',
  permission: 'pieces.bend',
  summary: 'Mark a queued piece bent.',
  params: codeParams,
  body: z.strictObject({
    /** The run the bender is working on; a piece of another run is refused. */
    runId: z.uuid().optional(),
  }),
  answer: movedSchema,
  idempotent: true,
})

export const scrapPiece = endpoint({
  method: 'POST',
  path: '/pieces/:code/scrapped',
  permission: 'pieces.scrap',
  summary: 'Report a spoiled piece; its remake is queued at once in the same run.',
  params: codeParams,
  body: z.strictObject({ reason: textField(400) }),
  answer: z.strictObject({ piece: pieceSchema, remake: pieceSchema }),
  idempotent: true,
})

export const undoMoves = endpoint({
  method: 'POST',
  path: '/piece-events/undo',
  permission: 'pieces.read',
  summary:
    'Take back moves, all or none. Each must be the last event of its piece, and a move its asker may make.',
  body: z.strictObject({ eventIds: z.array(z.int()).min(1).max(500), reason: textField(400) }),
  answer: z.strictObject({ pieces: z.array(pieceSchema) }),
  idempotent: true,
})

export type PieceEvent = z.infer<typeof pieceEventSchema>
export type Piece = z.infer<typeof pieceSchema>
export type Moved = z.infer<typeof movedSchema>
export type PieceConflict = z.infer<typeof pieceConflictSchema>
