export const TEST_BENDS = 'test_bends'

export interface TestBendRow {
  id: string
  stock_id: string
  brake_id: string
  strip_width: number
  leg_a: number
  leg_b: number
  turn: number
  thickness: number
  /** Null where it was not measured. */
  inside_radius: number | null
  note: string
  person_id: string
  at: Date
  withdrawn_by: string | null
  withdrawn_at: Date | null
  withdrawn_reason: string | null
}
export type TestBendInsert = Omit<
  TestBendRow,
  'id' | 'note' | 'at' | 'withdrawn_by' | 'withdrawn_at' | 'withdrawn_reason'
> &
  Partial<Pick<TestBendRow, 'id' | 'note' | 'at'>>
/** The database takes no other change, and this one once. */
export type TestBendUpdate = Pick<TestBendRow, 'withdrawn_by' | 'withdrawn_at' | 'withdrawn_reason'>
