import { PROBLEMS, type FieldError, type ProblemCode } from '#shared/http/problem'

const TITLES: Record<ProblemCode, string> = {
  'invalid-input': 'Something in the request has to be corrected',
  'idempotency-key-missing': 'The request needs an Idempotency-Key',
  'not-signed-in': 'Not signed in',
  'wrong-credentials': 'Mail address or password is wrong',
  'csrf-token-wrong': 'The page is out of date',
  'not-allowed': 'Not allowed',
  'not-found': 'Not found',
  'changed-meanwhile': 'Changed meanwhile',
  'wrong-state': 'Not in the right state',
  'idempotency-key-reused': 'The Idempotency-Key belongs to another request',
  'profile-problem': 'The profile cannot be made as drawn',
  'cannot-bend': 'No brake can bend it',
  'too-many-requests': 'Too many tries',
  internal: 'Something went wrong on our side',
  'not-ready': 'Not ready yet',
}

export interface ProblemExtra {
  readonly errors?: readonly FieldError[]
  /** What is there now, for a conflict. */
  readonly current?: unknown
  /** Seconds after which it is worth trying again. */
  readonly retryAfter?: number
}

/** A request refused by code. `detail` is for a person and says what cures it. */
export class ProblemError extends Error {
  readonly status: number
  readonly title: string
  readonly errors: readonly FieldError[] | undefined
  readonly current: unknown
  readonly retryAfter: number | undefined

  constructor(
    readonly code: ProblemCode,
    readonly detail: string,
    extra: ProblemExtra = {},
    options?: ErrorOptions,
  ) {
    super(`${code}: ${detail}`, options)
    this.name = 'ProblemError'
    this.status = PROBLEMS[code]
    this.title = TITLES[code]
    this.errors = extra.errors
    this.current = extra.current
    this.retryAfter = extra.retryAfter
  }
}

/** `notFound('order')`: also for a row the person may not see, so that nobody learns it exists. */
export const notFound = (what: string) =>
  new ProblemError('not-found', `There is no such ${what}, or it is not yours to see.`)

export const notSignedIn = () => new ProblemError('not-signed-in', 'Sign in first.')

export const notAllowed = (detail = 'Your role may not do this. Ask the office.') =>
  new ProblemError('not-allowed', detail)

/** Somebody else saved first; `current` is what is there now. */
export const changedMeanwhile = (current: unknown) =>
  new ProblemError(
    'changed-meanwhile',
    'Somebody else changed this meanwhile. Look at the new version and decide again.',
    { current },
  )

/** The thing is not in the state the request needs; `current` says how it stands now. */
export const wrongState = (detail: string, current?: unknown) =>
  new ProblemError('wrong-state', detail, { current })

export const invalidInput = (errors: readonly FieldError[]) =>
  new ProblemError('invalid-input', 'Correct the fields named below and send it again.', { errors })

/** One field that the schema alone cannot judge. `path` is dotted, as in the request. */
export const invalidField = (path: string, message: string) => invalidInput([{ path, message }])

/** `errors` names legs and bends by code. */
export const profileProblem = (errors: readonly FieldError[]) =>
  new ProblemError('profile-problem', 'The profile cannot be made as drawn.', { errors })

export const cannotBend = (detail: string, errors?: readonly FieldError[]) =>
  new ProblemError('cannot-bend', detail, errors ? { errors } : {})
