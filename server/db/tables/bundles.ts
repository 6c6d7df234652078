export const BUNDLES = 'bundles'

export interface BundleRow {
  id: string
  code: string
  order_id: string
  number: number
  rack_place: string
  hand_off_id: string | null
  created_by: string
  created_at: Date
}
export type BundleInsert = Pick<
  BundleRow,
  'code' | 'order_id' | 'number' | 'rack_place' | 'created_by'
> &
  Partial<BundleRow>
export type BundleUpdate = Partial<Pick<BundleRow, 'rack_place' | 'hand_off_id'>>
