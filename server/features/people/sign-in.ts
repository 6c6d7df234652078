import type { Request, RequestHandler } from 'express'
import passport from 'passport'
import { Strategy } from 'passport-local'
import type { Db } from '#server/db/knex'
import { findActiveAccount, findActivePerson } from '#server/features/people/people.queries'
import { passwordFits } from '#server/features/people/passwords'
import type { SignedIn } from '#server/http/signed-in'

export interface SignIn {
  /** Reads the person of the session anew for each request; a switched-off account ends here. */
  readonly readPerson: RequestHandler
  /** The person whose mail address and password the request's body carries, if they fit. */
  readonly findByPassword: (request: Request) => Promise<SignedIn | null>
  /** Begins a new session, so that one known from before the sign-in is worth nothing. */
  readonly begin: (request: Request, person: SignedIn) => Promise<void>
}

const asError = (cause: unknown): Error =>
  cause instanceof Error ? cause : new Error('Signing in failed.', { cause })

/** Passport with one strategy; `db` is the pool. */
export function createSignIn(db: Db): SignIn {
  const authenticator = new passport.Authenticator()

  authenticator.use(
    new Strategy({ usernameField: 'email' }, (email, password, done) => {
      findPerson(db, email, password).then((person) => done(null, person), done)
    }),
  )
  authenticator.serializeUser<string>((person, done) => done(null, person.id))
  authenticator.deserializeUser<string>((id, done) => {
    findActivePerson(db, id).then((person) => done(null, person ?? false), done)
  })

  return {
    readPerson: authenticator.session() as RequestHandler,
    findByPassword: (request) =>
      new Promise((resolve, reject) => {
        const answer = (error: unknown, person: SignedIn | false | undefined) => {
          if (error) reject(asError(error))
          else resolve(person || null)
        }
        const authenticate = authenticator.authenticate('local', answer) as RequestHandler
        if (!request.res) throw new Error('The request has no response.')
        void authenticate(request, request.res, reject)
      }),
    begin: (request, person) =>
      new Promise((resolve, reject) => {
        request.logIn(person, (error: unknown) => {
          if (error) reject(asError(error))
          else resolve()
        })
      }),
  }
}

async function findPerson(db: Db, email: string, password: string): Promise<SignedIn | false> {
  const account = await findActiveAccount(db, email)
  const fits = await passwordFits(account?.passwordHash, password)
  return account && fits ? account.person : false
}
