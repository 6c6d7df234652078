import type { RequestHandler } from 'express'
import type { Clock } from '#server/adapters/clock'
import { selfOf } from '#server/features/people/people.service'
import { deleteOtherSessions, updatePerson } from '#server/features/people/people.store'
import type { SignIn } from '#server/features/people/sign-in'
import { generateToken } from '#server/http/csrf'
import { definePublicRoute, defineRoute, type Route } from '#server/http/define-route'
import { ProblemError } from '#server/http/errors'
import { endSession, keepShortly } from '#server/http/session'
import * as contract from '#shared/people/people.contract'

export interface SessionRoutesDeps {
  readonly signIn: SignIn
  readonly limits: readonly RequestHandler[]
  readonly clock: Clock
}

export const sessionRoutes = ({ signIn, limits, clock }: SessionRoutesDeps): Route[] => [
  definePublicRoute(contract.getSession, ({ person, request }) => {
    if (!person) keepShortly(request)
    return Promise.resolve({
      person: person && selfOf(person),
      csrfToken: generateToken(request),
    })
  }),

  definePublicRoute(
    contract.signIn,
    async ({ body, db, request }) => {
      request.body = body
      const person = await signIn.findByPassword(request)
      if (!person) {
        throw new ProblemError(
          'wrong-credentials',
          'Mail address or password is wrong. Check both and try again.',
        )
      }
      await updatePerson(db, person.id, { last_sign_in_at: clock.now() })
      await signIn.begin(request, person)
      return { person: selfOf(person), csrfToken: generateToken(request) }
    },
    limits,
  ),

  defineRoute(contract.signOut, async ({ request }) => {
    await endSession(request)
    return undefined
  }),

  defineRoute(contract.signOutEverywhere, async ({ person, db, request }) => {
    await deleteOtherSessions(db, person.id, request.sessionID)
    await endSession(request)
    return undefined
  }),
]
