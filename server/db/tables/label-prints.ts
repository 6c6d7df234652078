import type { LabelPaper } from '#shared/labels/labels.contract'

export const LABEL_PRINTS = 'label_prints'
export const LABEL_PRINT_PIECES = 'label_print_pieces'

export interface LabelPrintRow {
  id: string
  paper: LabelPaper
  person_id: string
  at: Date
}
export type LabelPrintInsert = Omit<LabelPrintRow, 'id' | 'at'> &
  Partial<Pick<LabelPrintRow, 'id' | 'at'>>

export interface LabelPrintPieceRow {
  print_id: string
  /** From 1. */
  position: number
  piece_id: string
  reprinted: boolean
}
export type LabelPrintPieceInsert = LabelPrintPieceRow
