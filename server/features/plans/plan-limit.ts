import type { RequestHandler } from 'express'
import { rateLimit } from 'express-rate-limit'
import type { Clock } from '#server/adapters/clock'
import type { Db } from '#server/db/knex'
import { notSignedIn, ProblemError } from '#server/http/errors'
import { RateLimitStore } from '#server/http/rate-limit-store'

/** Two a second all the time: more than a hand that draws, less than a script. */
export const PLANS_A_MINUTE = 120

/** Counts the plans that a person asks for; the answer says when to try again (`Retry-After`). */
export const planLimit = (db: Db, clock: Clock): RequestHandler =>
  rateLimit({
    store: new RateLimitStore(db, clock, 'plans '),
    windowMs: 60_000,
    limit: PLANS_A_MINUTE,
    keyGenerator: ({ user }) => {
      if (!user) throw notSignedIn()
      return user.id
    },
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (_request, _response, next) => {
      next(
        new ProblemError(
          'too-many-requests',
          `More than ${PLANS_A_MINUTE} bend plans were asked for within a minute. Wait a moment and try again.`,
        ),
      )
    },
  })
