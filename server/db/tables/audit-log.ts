import type { AuditAction, AuditSubjectKind } from '#shared/audit/audit.contract'

export const AUDIT_LOG = 'audit_log'

export interface AuditLogRow {
  id: number
  at: Date
  person_id: string
  subject_kind: AuditSubjectKind
  subject_id: string
  /** What it was called then. */
  subject_name: string
  action: AuditAction
  before: unknown
  after: unknown
}
/** `before` and `after` go in as JSON text. */
export type AuditLogInsert = Omit<AuditLogRow, 'id' | 'before' | 'after'> & {
  before: string | null
  after: string | null
}
