import { companyScope } from '#server/db/company-scope'
import type { Db } from '#server/db/knex'
import { COMPANIES } from '#server/db/tables/companies'
import type { SignedIn } from '#server/http/define-route'
import { invalidField, notFound } from '#server/http/errors'

export type OwningCompany = (companyId: string | undefined, person: SignedIn) => Promise<string>

/**
 * The company that a new job or shelf profile belongs to: a crew lead's own, or the one that the
 * shop's people name.
 *
 * @throws not-found where a crew lead names another company, invalid-input naming `companyId`
 */
export const createOwningCompany =
  (db: Db): OwningCompany =>
  async (companyId, person) => {
    const own = companyScope(person)
    if (own !== null) {
      if (companyId !== undefined && companyId !== own) throw notFound('company')
      return own
    }
    if (companyId === undefined) throw invalidField('companyId', 'Say which company it is for.')
    const company = await db(COMPANIES).where({ id: companyId }).first('id')
    if (company) return company.id
    throw invalidField('companyId', 'There is no such company. Choose one of the list.')
  }
