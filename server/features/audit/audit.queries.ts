import { z } from 'zod'
import type { Db } from '#server/db/knex'
import type { AuditLogRow } from '#server/db/tables/audit-log'
import { decodeCursor, toPage } from '#server/http/cursor'
import {
  auditEntrySchema,
  type AuditEntry,
  type listAudit as listAuditEndpoint,
} from '#shared/audit/audit.contract'
import type { AnswerOf, QueryOf } from '#shared/http/endpoint'

const cursorSchema = z.int()

type Row = AuditLogRow & { by_name: string }

const fields = auditEntrySchema.shape.before

const toEntry = (row: Row): AuditEntry => ({
  id: row.id,
  at: row.at.toISOString(),
  by: { id: row.person_id, name: row.by_name },
  subject: { kind: row.subject_kind, id: row.subject_id, name: row.subject_name },
  action: row.action,
  before: fields.parse(row.before),
  after: fields.parse(row.after),
})

/** Newest first. */
export async function listAudit(
  db: Db,
  { after, limit, person, kind }: QueryOf<typeof listAuditEndpoint>,
): Promise<AnswerOf<typeof listAuditEndpoint>> {
  const start = decodeCursor(after, cursorSchema)
  const query = db('audit_log as a')
    .join('people as p', 'p.id', 'a.person_id')
    .select<Row[]>('a.*', 'p.name as by_name')
    .orderBy('a.id', 'desc')
    .limit(limit + 1)
  if (start !== null) void query.where('a.id', '<', start)
  if (kind !== undefined) void query.where('a.subject_kind', kind)
  if (person !== undefined) {
    void query.whereRaw(
      "(a.person_id = :person or (a.subject_kind = 'person' and a.subject_id = :person))",
      { person },
    )
  }
  return toPage(await query, limit, toEntry, (row) => row.id)
}
