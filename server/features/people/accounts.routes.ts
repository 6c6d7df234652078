import type { Db } from '#server/db/knex'
import { inTransaction } from '#server/db/transaction'
import type { AccountsService } from '#server/features/people/accounts.service'
import type { PasswordLimits } from '#server/features/people/password-limits'
import { leavePasswordReset } from '#server/features/people/password-reset.job'
import type { PasswordService } from '#server/features/people/password.service'
import { definePublicRoute, defineRoute, type Route } from '#server/http/define-route'
import * as contract from '#shared/people/accounts.contract'

export interface AccountsRoutesDeps {
  readonly makeAccounts: (db: Db) => AccountsService
  readonly makePasswords: (db: Db) => PasswordService
  readonly limits: PasswordLimits
}

export const accountsRoutes = (deps: AccountsRoutesDeps): Route[] => {
  const { makeAccounts, makePasswords, limits } = deps
  return [
    defineRoute(contract.invitePerson, ({ db, body, person }) =>
      makeAccounts(db).invite(body, person),
    ),
    defineRoute(contract.inviteAgain, ({ db, params, person }) =>
      makeAccounts(db).inviteAgain(params.personId, person),
    ),
    defineRoute(contract.deactivatePerson, ({ db, params, person }) =>
      makeAccounts(db).deactivate(params.personId, person),
    ),
    defineRoute(contract.reactivatePerson, ({ db, params, person }) =>
      makeAccounts(db).reactivate(params.personId, person),
    ),
    defineRoute(contract.createCompany, ({ db, body, person }) =>
      makeAccounts(db).createCompany(body, person),
    ),
    defineRoute(contract.listCrew, async ({ db, person }) => ({
      items: await makeAccounts(db).listCrew(person),
    })),
    defineRoute(
      contract.changePassword,
      async ({ db, body, person, request }) => {
        await makePasswords(db).change(body, person, request.sessionID)
        return undefined
      },
      limits.change,
    ),
    definePublicRoute(
      contract.askPasswordReset,
      async ({ db, body }) => {
        await leavePasswordReset(db, body.email)
        return undefined
      },
      limits.ask,
    ),
    definePublicRoute(
      contract.readPasswordLink,
      ({ db, body }) => makePasswords(db).readLink(body.token),
      limits.link,
    ),
    definePublicRoute(
      contract.setPassword,
      async ({ db, body }) => {
        await inTransaction(db, (trx) => makePasswords(trx).setByLink(body))
        return undefined
      },
      limits.link,
    ),
  ]
}
