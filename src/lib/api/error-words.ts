import { ApiProblem, OfflineError, problemCodeOf, UnreadableAnswer } from '@/lib/api/api-errors'

/** Key in the `problems` texts of what happened, what is safe and what to do. */
export function errorWords(error: unknown): string {
  if (error instanceof OfflineError) return 'offline'
  if (error instanceof UnreadableAnswer) return 'unreadable'
  const code = problemCodeOf(error)
  if (code) return code
  if (error instanceof ApiProblem) return error.refused ? 'refused' : 'internal'
  return 'unexpected'
}

/** The number under which the server's log knows the failed request. */
export const requestIdOf = (error: unknown): string | undefined =>
  error instanceof ApiProblem ? error.problem.requestId : undefined
