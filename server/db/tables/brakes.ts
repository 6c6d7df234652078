export const BRAKES = 'brakes'

export interface BrakeRow {
  id: string
  position: number
  name: string
  /** A Brake; parsed with brakeSchema when read. */
  definition: unknown
}
/** JSON columns are written as text. */
export type BrakeInsert = Omit<BrakeRow, 'id' | 'definition'> & { id?: string; definition: string }
export type BrakeUpdate = Partial<BrakeInsert>
