import { ProblemError } from '#server/http/errors'

const RETRY_SECONDS = 5

/** So much waits to be planned that one more would only wait longer. */
export const planningBusy = () =>
  new ProblemError(
    'not-ready',
    'Too many bend plans are being made right now. Wait a few seconds and try again.',
    { retryAfter: RETRY_SECONDS },
  )

export const planningTooLong = () =>
  new ProblemError(
    'not-ready',
    'The bend plan took too long and was given up. Try again, or draw the piece with fewer bends.',
    { retryAfter: RETRY_SECONDS },
  )
