import { z } from 'zod'

export const PIECE_STATES = [
  'queued',
  'bent',
  'bundled',
  'pickedUp',
  'scrapped',
  'withdrawn',
] as const
export const pieceStateSchema = z.enum(PIECE_STATES)
export type PieceState = z.infer<typeof pieceStateSchema>

export const STATIONS = ['counter', 'brake', 'rack', 'office', 'roof'] as const
export const stationSchema = z.enum(STATIONS)
export type Station = z.infer<typeof stationSchema>

/**
 * Every move a piece may make and whether it needs a reason. The database holds the same table
 * (piece_moves) and refuses all others; a test compares the two.
 */
export const PIECE_MOVES: readonly { from: PieceState; to: PieceState; needsReason: boolean }[] = [
  { from: 'queued', to: 'bent', needsReason: false },
  { from: 'bent', to: 'bundled', needsReason: false },
  { from: 'bundled', to: 'pickedUp', needsReason: false },
  { from: 'bent', to: 'queued', needsReason: true },
  { from: 'bundled', to: 'bent', needsReason: true },
  { from: 'pickedUp', to: 'bundled', needsReason: true },
  { from: 'queued', to: 'scrapped', needsReason: true },
  { from: 'bent', to: 'scrapped', needsReason: true },
  { from: 'bundled', to: 'scrapped', needsReason: true },
  { from: 'queued', to: 'withdrawn', needsReason: true },
  { from: 'bent', to: 'withdrawn', needsReason: true },
]

export const findMove = (from: PieceState, to: PieceState) =>
  PIECE_MOVES.find((move) => move.from === from && move.to === to)
