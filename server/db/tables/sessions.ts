export const SESSIONS = 'sessions'

/** Written by connect-pg-simple; we only count and delete. */
export interface SessionRow {
  sid: string
  sess: unknown
  expire: Date
}
