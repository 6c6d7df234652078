import type { Request, RequestHandler } from 'express'
import { ipKeyGenerator, rateLimit } from 'express-rate-limit'
import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { ProblemError } from '#server/http/errors'
import { RateLimitStore } from '#server/http/rate-limit-store'
import { askPasswordReset } from '#shared/people/accounts.contract'

const WINDOW_MINUTES = 60
/** Asked for in the window. */
export const RESETS_PER_ACCOUNT = 5
/** A shop shares one address. */
export const RESETS_PER_ADDRESS = 30
/** Links that lead nowhere, and passwords that do not fit, in the window. */
export const FAILURES_PER_ADDRESS = 60
export const FAILURES_PER_PERSON = 10

const addressOf = (request: Request): string => ipKeyGenerator(request.ip ?? 'unknown')

const accountOf = (request: Request): string | undefined =>
  askPasswordReset.body.safeParse(request.body).data?.email

/** What runs before the routes of passwords. */
export interface PasswordLimits {
  /** A link is asked for. */
  readonly ask: readonly RequestHandler[]
  /** A link is used. */
  readonly link: readonly RequestHandler[]
  /** The own password is changed. */
  readonly change: readonly RequestHandler[]
}

interface Limit {
  readonly name: string
  readonly most: number
  /** Undefined: the request counts for nobody. */
  readonly keyOf: (request: Request) => string | undefined
  readonly failuresOnly: boolean
}

/** Limits of what concerns passwords, counted by all processes together. */
export function passwordLimits(db: Db, clock: Clock): PasswordLimits {
  const limit = ({ name, most, keyOf, failuresOnly }: Limit): RequestHandler =>
    rateLimit({
      store: new RateLimitStore(db, clock, `${name} `),
      windowMs: WINDOW_MINUTES * 60_000,
      limit: most,
      keyGenerator: (request) => keyOf(request) ?? '',
      skip: (request) => keyOf(request) === undefined,
      skipSuccessfulRequests: failuresOnly,
      standardHeaders: 'draft-8',
      legacyHeaders: false,
      validate: { xForwardedForHeader: false },
      handler: (_request, _response, next) => {
        next(new ProblemError('too-many-requests', 'Too many tries. Wait an hour and try again.'))
      },
    })

  return {
    ask: [
      limit({
        name: 'reset address',
        most: RESETS_PER_ADDRESS,
        keyOf: (request) => (accountOf(request) === undefined ? undefined : addressOf(request)),
        failuresOnly: false,
      }),
      limit({
        name: 'reset account',
        most: RESETS_PER_ACCOUNT,
        keyOf: accountOf,
        failuresOnly: false,
      }),
    ],
    link: [
      limit({
        name: 'password link',
        most: FAILURES_PER_ADDRESS,
        keyOf: addressOf,
        failuresOnly: true,
      }),
    ],
    change: [
      limit({
        name: 'password change',
        most: FAILURES_PER_PERSON,
        keyOf: (request) => request.user?.id,
        failuresOnly: true,
      }),
    ],
  }
}
