import type { Db } from '#server/db/knex'
import { AUDIT_LOG } from '#server/db/tables/audit-log'
import type { AuditAction, AuditFields, AuditSubjectKind } from '#shared/audit/audit.contract'

export interface AuditedChange {
  /** Who did it. */
  readonly by: { readonly id: string }
  readonly at: Date
  readonly subject: {
    readonly kind: AuditSubjectKind
    readonly id: string
    /** What it is called now, for readers of later years. */
    readonly name: string
  }
  readonly action: AuditAction
  /** The fields concerned as they were; absent for what was not there. Never a password. */
  readonly before?: AuditFields
  readonly after?: AuditFields
}

/**
 * Writes down who changed what. Called in the transaction of the change, so that neither is there
 * without the other; the database refuses to change or remove a line.
 *
 *     await audit(db, { by: person, at: clock.now(), subject: { kind: 'price', id, name },
 *       action: 'changed', before: { perBend: 125 }, after: { perBend: 140 } })
 */
export async function audit(db: Db, change: AuditedChange): Promise<void> {
  const { by, at, subject, action, before = null, after = null } = change
  await db(AUDIT_LOG).insert({
    at,
    person_id: by.id,
    subject_kind: subject.kind,
    subject_id: subject.id,
    subject_name: subject.name,
    action,
    before: before && JSON.stringify(before),
    after: after && JSON.stringify(after),
  })
}
