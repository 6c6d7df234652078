/** An error as the middleware of Express raises it. */
interface HttpError extends Error {
  readonly status: number
  readonly type?: unknown
}

export const isHttpError = (error: unknown): error is HttpError =>
  error instanceof Error && 'status' in error && typeof error.status === 'number'
