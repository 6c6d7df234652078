import type { Db } from '#server/db/knex'
import type { PeopleService } from '#server/features/people/people.service'
import { defineRoute, type Route } from '#server/http/define-route'
import * as contract from '#shared/people/people.contract'

export const peopleRoutes = (make: (db: Db) => PeopleService): Route[] => [
  defineRoute(contract.listPeople, async ({ db }) => ({ items: await make(db).listPeople() })),
  defineRoute(contract.listCompanies, async ({ db }) => ({
    items: await make(db).listCompanies(),
  })),
  defineRoute(contract.updateSelf, ({ person, body, db }) => make(db).updateSelf(person, body)),
]
