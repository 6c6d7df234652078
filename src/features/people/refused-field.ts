import { ApiProblem } from '@/lib/api/api-errors'

/** What the server says of one field, by its code; undefined when it is fine or nobody was asked. */
export function refusedField(error: unknown, path: string): { readonly code?: string } | undefined {
  if (!(error instanceof ApiProblem) || !error.is('invalid-input')) return undefined
  const found = error.fieldErrors().find((field) => field.path === path)
  return found && { ...(found.code !== undefined && { code: found.code }) }
}
