import connectPgSimple from 'connect-pg-simple'
import type { CookieOptions, Request, RequestHandler } from 'express'
import session from 'express-session'
import type pg from 'pg'
import { SESSIONS } from '#server/db/tables/sessions'

const COOKIE = 'foldyard.session'
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
  /** Stops the timer that removes expired sessions; the pool is the caller's. */
  readonly close: () => void
}

/** Sessions in PostgreSQL behind a cookie that no script reads. */
export function createSessions(options: SessionOptions): Sessions {
  const store = new PgStore({
    pool: options.pool,
    tableName: SESSIONS,
    createTableIfMissing: false,
    errorLog: (message: string, error: unknown) => options.onError(message, error),
  })
  const cookie: CookieOptions = {
    httpOnly: true,
    sameSite: 'lax',
    secure: options.secureCookie,
    maxAge: SIGNED_IN_FOR,
  }
  return {
    middleware: session({
      name: COOKIE,
      secret: options.secret,
      store,
      resave: false,
      saveUninitialized: false,
      rolling: true,
      cookie,
    }),
    close: () => store.close(),
  }
}

/** Nobody signed in: the session is kept for the CSRF token only, and not for long. */
export function keepShortly(request: Request): void {
  request.session.cookie.maxAge = ANONYMOUS_FOR
}

/** Removes the session of this request from the database and its cookie from the browser. */
export function endSession(request: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    request.session.destroy((error: unknown) => {
      if (error) {
        reject(new Error('The session could not be removed.', { cause: error }))
        return
      }
      request.res?.clearCookie(COOKIE)
      resolve()
    })
  })
}
