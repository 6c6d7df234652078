import type { SignedIn } from '#server/http/signed-in'
import { seesOnlyOwnCompany } from '#shared/access/permissions'

/**
 * The company whose rows a person sees and changes; null where all are theirs to see. Every read
 * and write of a company's rows is limited by it.
 */
export function companyScope(person: Pick<SignedIn, 'id' | 'role' | 'companyId'>): string | null {
  if (!seesOnlyOwnCompany(person.role)) return null
  if (person.companyId === null) throw new Error(`Crew lead ${person.id} belongs to no company.`)
  return person.companyId
}
