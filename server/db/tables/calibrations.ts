export const CALIBRATIONS = 'calibrations'

/** K, radius and count are null together in a row that goes back to the stock's own. */
export interface CalibrationRow {
  id: number
  stock_id: string
  brake_id: string
  k_factor: number | null
  inside_radius: number | null
  bends: number | null
  person_id: string
  at: Date
}
export type CalibrationInsert = Omit<CalibrationRow, 'id' | 'at'> &
  Partial<Pick<CalibrationRow, 'at'>>
