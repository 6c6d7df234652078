import type { Request, RequestHandler } from 'express'
import { ipKeyGenerator, rateLimit } from 'express-rate-limit'
import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { ProblemError } from '#server/http/errors'
import { RateLimitStore } from '#server/http/rate-limit-store'
import { signIn } from '#shared/people/people.contract'

const WINDOW_MINUTES = 15
/** Failed tries in the window. A shop shares one address, an account does not. */
export const TRIES_PER_ACCOUNT = 10
export const TRIES_PER_ADDRESS = 60

const accountOf = (request: Request): string | undefined =>
  signIn.body.safeParse(request.body).data?.email

const addressOf = (request: Request): string => ipKeyGenerator(request.ip ?? 'unknown')

/** Counts failed sign-ins per account and per address; a request that cannot be read is no try. */
export const signInLimits = (db: Db, clock: Clock): RequestHandler[] => [
  limit(new RateLimitStore(db, clock, 'sign-in address '), TRIES_PER_ADDRESS, addressOf),
  limit(
    new RateLimitStore(db, clock, 'sign-in account '),
    TRIES_PER_ACCOUNT,
    (request) => accountOf(request) ?? '',
  ),
]

const limit = (
  store: RateLimitStore,
  tries: number,
  keyOf: (request: Request) => string,
): RequestHandler =>
  rateLimit({
    store,
    windowMs: WINDOW_MINUTES * 60_000,
    limit: tries,
    keyGenerator: keyOf,
    skip: (request) => accountOf(request) === undefined,
    skipSuccessfulRequests: true,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    validate: { xForwardedForHeader: false },
    handler: (_request, _response, next) => {
      next(
        new ProblemError(
          'too-many-requests',
          `Too many failed sign-ins. Wait ${WINDOW_MINUTES} minutes and try again.`,
        ),
      )
    },
  })
