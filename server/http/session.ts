import connectPgSimple from 'connect-pg-simple'
import type { RequestHandler } from 'express'
import session from 'express-session'
import type pg from 'pg'
import { SESSIONS } from '#server/db/tables/sessions'

const DAY = 24 * 60 * 60 * 1000
/** Counted anew from every request. */
const SIGNED_IN_FOR = 14 * DAY
/** Somebody who only looked at the sign-in page. */
const ANONYMOUS_FOR = DAY

const PgStore = connectPgSimple(session)

export interface SessionOptions {
  /** A pool apart from the requests' own: a request in a transaction must still reach its session. */
  readonly pool: pg.Pool
  readonly secret: string
  readonly secureCookie: boolean
  readonly onError: (message: string, error: unknown) => void
}

export interface Sessions {
  readonly middleware: RequestHandler
  readonly close: () => Promise<void>
}

/** Sessions in PostgreSQL behind a cookie that no script reads. */
export function createSessions(options: SessionOptions): Sessions {
  const store = new PgStore({
    pool: options.pool,
    tableName: SESSIONS,
    createTableIfMissing: false,
    errorLog: (message: string, error: unknown) => options.onError(message, error),
  })
  const middleware = session({
    name: 'foldyard.session',
    secret: options.secret,
    store,
    resave: false,
    saveUninitialized: false,
    rolling: true,
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: options.secureCookie,
      maxAge: SIGNED_IN_FOR,
    },
  })
  return { middleware, close: () => Promise.resolve(store.close()) }
}

export const anonymousCookieAge = ANONYMOUS_FOR
