import { z } from 'zod'
import { endpoint } from '#shared/http/endpoint'
import { momentSchema } from '#shared/http/fields'
import { pageOf, pageQuery } from '#shared/http/paging'

export const auditSubjectKindSchema = z.enum(['person', 'company', 'price'])

/** What was done. `before` and `after` show the fields concerned; passwords never. */
export const auditActionSchema = z.enum([
  'created',
  'changed',
  'removed',
  'invited',
  'invitedAgain',
  'deactivated',
  'reactivated',
  'passwordSet',
  'passwordChanged',
])

/** The fields concerned by name; null where there were none. */
const fieldsSchema = z.record(z.string(), z.unknown()).nullable()

export const auditEntrySchema = z.strictObject({
  id: z.int(),
  at: momentSchema,
  by: z.strictObject({ id: z.uuid(), name: z.string() }),
  subject: z.strictObject({
    kind: auditSubjectKindSchema,
    id: z.uuid(),
    /** What it was called then. */
    name: z.string(),
  }),
  action: auditActionSchema,
  before: fieldsSchema,
  after: fieldsSchema,
})

export const listAudit = endpoint({
  method: 'GET',
  path: '/audit',
  permission: 'audit.read',
  summary: 'Who changed people, companies and prices, newest first.',
  query: z.strictObject({
    ...pageQuery,
    /** Only what this person did or what was done to them. */
    person: z.uuid().optional(),
    kind: auditSubjectKindSchema.optional(),
  }),
  answer: pageOf(auditEntrySchema),
})

export type AuditSubjectKind = z.infer<typeof auditSubjectKindSchema>
export type AuditAction = z.infer<typeof auditActionSchema>
export type AuditFields = z.infer<typeof fieldsSchema>
export type AuditEntry = z.infer<typeof auditEntrySchema>
