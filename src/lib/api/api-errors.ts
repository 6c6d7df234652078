import { PROBLEMS, type FieldError, type Problem, type ProblemCode } from '#shared/http/problem'

/** The server refused or failed and said why (RFC 9457). */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem'

  constructor(readonly problem: Problem) {
    super(problem.detail)
  }

  get status(): number {
    return this.problem.status
  }

  /** True when the caller can cure it: the request was understood and nothing was made or moved. */
  get refused(): boolean {
    return this.problem.status < 500
  }

  is(code: ProblemCode): boolean {
    return this.problem.code === code
  }

  fieldErrors(): readonly FieldError[] {
    return this.problem.errors ?? []
  }
}

/**
 * No answer came: no signal, server not reachable, connection cut. The request may or may not have
 * arrived, which is why changes are sent again under the same idempotency key.
 */
export class OfflineError extends Error {
  override readonly name = 'OfflineError'

  constructor(cause: unknown) {
    super('No answer came from the server.', { cause })
  }
}

/** An answer came that does not follow the contract: not JSON, or another shape. */
export class UnreadableAnswer extends Error {
  override readonly name = 'UnreadableAnswer'

  constructor(
    readonly status: number,
    readonly request: string,
    cause: unknown,
  ) {
    super(`The answer to ${request} (status ${status}) cannot be read.`, { cause })
  }
}

const isProblemCode = (code: string): code is ProblemCode => code in PROBLEMS

/** The code of a problem the client knows, or undefined for any other failure. */
export const problemCodeOf = (error: unknown): ProblemCode | undefined =>
  error instanceof ApiProblem && isProblemCode(error.problem.code) ? error.problem.code : undefined

/** True when trying the same request again may help: no answer, or the server was not ready. */
export const mayPass = (error: unknown): boolean =>
  error instanceof OfflineError ||
  (error instanceof ApiProblem && error.status === 503) ||
  (error instanceof UnreadableAnswer && [502, 503, 504].includes(error.status))
