import type { AuditFields } from '#shared/audit/audit.contract'

export interface ChangedField {
  readonly name: string
  /** As text; null where it was not there. */
  readonly before: string | null
  readonly after: string | null
}

const textOf = (value: unknown): string | null => {
  if (value === undefined || value === null) return null
  return typeof value === 'string' ? value : JSON.stringify(value)
}

/** The fields of a change side by side, by name; what stayed the same is left out. */
export function changedFields(before: AuditFields, after: AuditFields): ChangedField[] {
  const names = [...new Set([...Object.keys(before ?? {}), ...Object.keys(after ?? {})])].sort()
  return names
    .map((name) => ({ name, before: textOf(before?.[name]), after: textOf(after?.[name]) }))
    .filter((field) => field.before !== field.after)
}
