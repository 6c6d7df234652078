import type { Role } from '#shared/access/permissions'
import type { Language, Theme, Units } from '#shared/people/people.contract'

export const PEOPLE = 'people'

export interface PersonTableRow {
  id: string
  company_id: string | null
  role: Role
  name: string
  email: string
  /** Null until who was invited has set one. */
  password_hash: string | null
  language: Language
  units: Units
  theme: Theme
  active: boolean
  last_sign_in_at: Date | null
  created_at: Date
}
export type PersonInsert = Pick<
  PersonTableRow,
  'company_id' | 'role' | 'name' | 'email' | 'password_hash'
> &
  Partial<PersonTableRow>
export type PersonUpdate = Partial<Omit<PersonTableRow, 'id' | 'created_at'>>
