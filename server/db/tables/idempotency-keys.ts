export const IDEMPOTENCY_KEYS = 'idempotency_keys'

export interface IdempotencyKeyRow {
  person_id: string
  key: string
  method: string
  path: string
  request_hash: string
  /** Null only inside the transaction that made the row. */
  status: number | null
  answer: unknown
  created_at: Date
}
export type IdempotencyKeyInsert = Pick<
  IdempotencyKeyRow,
  'person_id' | 'key' | 'method' | 'path' | 'request_hash'
>
/** `answer` is JSON text: the driver would send an array as a PostgreSQL array. */
export interface IdempotencyKeyUpdate {
  status: number
  answer: string
}
