import type { Db } from '#server/db/knex'
import { COMPANIES } from '#server/db/tables/companies'
import { PEOPLE, type PersonTableRow } from '#server/db/tables/people'
import type { SignedIn } from '#server/http/signed-in'
import type { Company, PersonRow } from '#shared/people/people.contract'

type WithCompany = Pick<
  PersonTableRow,
  | 'id'
  | 'company_id'
  | 'role'
  | 'name'
  | 'email'
  | 'password_hash'
  | 'language'
  | 'units'
  | 'theme'
  | 'active'
  | 'last_sign_in_at'
> & { company_name: string | null }

const peopleWithCompany = (db: Db) =>
  db(PEOPLE)
    .leftJoin(COMPANIES, 'companies.id', 'people.company_id')
    .select<WithCompany[]>('people.*', { company_name: 'companies.name' })

const companyOf = (row: WithCompany): Company | null =>
  row.company_id !== null && row.company_name !== null
    ? { id: row.company_id, name: row.company_name }
    : null

const signedInOf = (row: WithCompany): SignedIn => ({
  id: row.id,
  name: row.name,
  email: row.email,
  role: row.role,
  companyId: row.company_id,
  company: companyOf(row),
  language: row.language,
  units: row.units,
  theme: row.theme,
})

const toPersonRow = (row: WithCompany): PersonRow => ({
  id: row.id,
  name: row.name,
  email: row.email,
  role: row.role,
  company: companyOf(row),
  active: row.active,
  invited: row.password_hash === null,
  lastSignInAt: row.last_sign_in_at?.toISOString() ?? null,
})

/** Somebody whose account is switched off counts as absent. */
export async function findActivePerson(db: Db, id: string): Promise<SignedIn | undefined> {
  const [row] = await peopleWithCompany(db).where('people.id', id).where('active', true)
  return row && signedInOf(row)
}

export interface Account {
  readonly person: SignedIn
  /** Null until who was invited has set one. */
  readonly passwordHash: string | null
}

/** `email` in small letters, as the contract parses it. */
export async function findActiveAccount(db: Db, email: string): Promise<Account | undefined> {
  const [row] = await peopleWithCompany(db).where('email', email).where('active', true)
  return row && { person: signedInOf(row), passwordHash: row.password_hash }
}

export async function listPeople(db: Db): Promise<PersonRow[]> {
  const rows = await peopleWithCompany(db).orderByRaw('lower(people.name), people.id')
  return rows.map(toPersonRow)
}

/** Nobody for no company: the shop's own people are no crew. */
export async function listCompanyPeople(db: Db, companyId: string | null): Promise<PersonRow[]> {
  if (companyId === null) return []
  const rows = await peopleWithCompany(db)
    .where('people.company_id', companyId)
    .orderByRaw('lower(people.name), people.id')
  return rows.map(toPersonRow)
}

export async function findPersonRow(db: Db, id: string): Promise<PersonRow | undefined> {
  const [row] = await peopleWithCompany(db).where('people.id', id)
  return row && toPersonRow(row)
}

export const listCompanies = (db: Db): Promise<Company[]> =>
  db(COMPANIES).select('id', 'name').orderByRaw('lower(name)')
