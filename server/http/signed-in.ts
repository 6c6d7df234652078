import type {} from 'passport'
import type { Role } from '#shared/access/permissions'
import type { Company, Language, Theme, Units } from '#shared/people/people.contract'

/** Who sends the request, read anew from the database for each one. */
export interface SignedIn {
  readonly id: string
  readonly name: string
  readonly email: string
  readonly role: Role
  /** The company of a crew lead; null for the shop's own people. */
  readonly companyId: string | null
  readonly company: Company | null
  readonly language: Language
  readonly units: Units
  readonly theme: Theme
}

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- passport's types are extended this way
  namespace Express {
    // eslint-disable-next-line @typescript-eslint/no-empty-object-type -- one type under passport's name
    interface User extends SignedIn {}
  }
}
