import { randomUUID } from 'node:crypto'
import { COMPANIES } from '#server/db/tables/companies'
import { PEOPLE, type PersonInsert } from '#server/db/tables/people'
import { hashPassword } from '#server/features/people/passwords'
import type { Db } from '#server/db/knex'
import type { Role } from '#shared/access/permissions'
import type { Company } from '#shared/people/people.contract'

export const PASSWORD = 'slate-and-solder-7'

let passwordHash: Promise<string> | undefined

export interface TestPerson {
  readonly id: string
  readonly name: string
  readonly email: string
  readonly role: Role
  readonly companyId: string | null
}

/** Rows that many tests start from; each call makes a new one with a name of its own. */
export const createFactories = (db: Db) => {
  const company = async (name = `Gable Crew ${randomUUID().slice(0, 8)}`): Promise<Company> => {
    const [row] = await db(COMPANIES).insert({ name }).returning(['id', 'name'])
    if (!row) throw new Error('No company was made.')
    return row
  }

  /** A crew lead gets a company of the own unless one is given. Everybody has the PASSWORD. */
  const person = async (
    role: Role,
    given: Partial<Pick<PersonInsert, 'name' | 'email' | 'active' | 'company_id'>> = {},
  ): Promise<TestPerson> => {
    passwordHash ??= hashPassword(PASSWORD)
    const [row] = await db(PEOPLE)
      .insert({
        role,
        company_id: role === 'crewLead' ? (await company()).id : null,
        name: `A ${role}`,
        email: `${role.toLowerCase()}-${randomUUID()}@example.com`,
        password_hash: await passwordHash,
        ...given,
      })
      .returning('*')
    if (!row) throw new Error('No person was made.')
    const { id, name, email, company_id: companyId } = row
    return { id, name, email, role: row.role, companyId }
  }

  return { company, person }
}

export type Factories = ReturnType<typeof createFactories>
