import type { PieceState, Station } from '#shared/pieces/piece-state'

export const PIECES = 'pieces'
export const PIECE_EVENTS = 'piece_events'
export const PIECE_MOVES_TABLE = 'piece_moves'

export interface PieceRow {
  id: string
  code: string
  order_id: string
  line_id: string
  run_id: string
  sequence: number
  state: PieceState
  bundle_id: string | null
  remake_of: string | null
}
export type PieceInsert = Pick<PieceRow, 'code' | 'order_id' | 'line_id' | 'run_id' | 'sequence'> &
  Partial<PieceRow>
export type PieceUpdate = Partial<Pick<PieceRow, 'state' | 'bundle_id'>>

export interface PieceEventRow {
  id: number
  piece_id: string
  from_state: PieceState | null
  to_state: PieceState
  person_id: string
  station: Station
  reason: string | null
  undoes: number | null
  bundle_id: string | null
  at: Date
}
export type PieceEventInsert = Pick<
  PieceEventRow,
  'piece_id' | 'from_state' | 'to_state' | 'person_id' | 'station'
> &
  Partial<PieceEventRow>

export interface PieceMoveRow {
  from_state: PieceState
  to_state: PieceState
  needs_reason: boolean
}
