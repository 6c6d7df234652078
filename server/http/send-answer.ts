import type { Response } from 'express'
import type { Outcome } from '#server/http/idempotency'
import { fileAnswerSchema, type Endpoint, type FileAnswer } from '#shared/http/endpoint'

/** Answers with JSON, with nothing, or with the file that the endpoint produces. */
export function sendAnswer(
  response: Response,
  { produces }: Endpoint,
  { status, answer, replayed }: Outcome,
): void {
  response.status(status).set('Cache-Control', 'no-store')
  if (replayed) response.set('Idempotency-Replayed', 'true')
  if (status === 204) response.end()
  else if (produces === 'application/json') response.json(answer)
  else sendFile(response, produces, fileAnswerSchema.parse(answer))
}

/** Shown by the browser where it can; kept under the file's own name. */
function sendFile(response: Response, type: string, { name, bytes }: FileAnswer): void {
  response
    .set({
      'Content-Type': type,
      'Content-Disposition': `inline; filename="${name}"`,
      'X-Content-Type-Options': 'nosniff',
    })
    .send(Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength))
}
