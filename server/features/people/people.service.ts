import type { Db } from '#server/db/knex'
import { findActivePerson, listCompanies, listPeople } from '#server/features/people/people.queries'
import { updatePerson } from '#server/features/people/people.store'
import { notFound } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import { announce } from '#server/live/announce'
import type { BodyOf } from '#shared/http/endpoint'
import type { Self, updateSelf } from '#shared/people/people.contract'

/** What a person sees of the own account. */
export const selfOf = (person: SignedIn): Self => ({
  id: person.id,
  name: person.name,
  email: person.email,
  role: person.role,
  company: person.company,
  language: person.language,
  units: person.units,
  theme: person.theme,
})

export type PeopleService = ReturnType<typeof createPeopleService>

export const createPeopleService = (db: Db) => ({
  listPeople: () => listPeople(db),

  listCompanies: () => listCompanies(db),

  /** A field left out stays as it is. */
  async updateSelf(person: SignedIn, change: BodyOf<typeof updateSelf>): Promise<Self> {
    const changed = Object.values(change).some((value) => value !== undefined)
    if (changed) {
      await updatePerson(db, person.id, change)
      await announce(db, {
        topic: 'people',
        entityId: person.id,
        companyId: null,
        audience: 'shop',
      })
    }
    const now = await findActivePerson(db, person.id)
    if (!now) throw notFound('person')
    return selfOf(now)
  },
})
