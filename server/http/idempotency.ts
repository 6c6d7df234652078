import { createHash } from 'node:crypto'
import type { Request } from 'express'
import type { Db } from '#server/db/knex'
import { IDEMPOTENCY_KEYS } from '#server/db/tables/idempotency-keys'
import { notSignedIn, ProblemError } from '#server/http/errors'

/** 8 to 200 visible ASCII characters. */
const KEY_FORM = /^[\x21-\x7e]{8,200}$/

export interface KeyedRequest {
  readonly personId: string
  readonly key: string
  readonly method: string
  readonly path: string
  readonly requestHash: string
}

export interface Outcome {
  readonly status: number
  readonly answer: unknown
  /** True when this is the answer to an earlier request under the same key. */
  readonly replayed: boolean
}

/** @throws idempotency-key-missing */
export function readKeyedRequest(request: Request): KeyedRequest {
  const key = request.get('idempotency-key') ?? ''
  if (!KEY_FORM.test(key)) {
    throw new ProblemError(
      'idempotency-key-missing',
      'Send the header Idempotency-Key: 8 to 200 visible characters, new for each change.',
    )
  }
  if (!request.user) throw notSignedIn()
  const { method, originalUrl: path } = request
  const requestHash = createHash('sha256')
    .update(JSON.stringify([method, path, request.body ?? null]))
    .digest('hex')
  return { personId: request.user.id, key, method, path, requestHash }
}

/**
 * Does the work once for a key, in the transaction that `db` is. A twin at the same time waits in
 * the insert until the first one commits and then reads its answer; work that fails leaves nothing
 * behind, so a retry is free to succeed.
 */
export async function once(
  db: Db,
  request: KeyedRequest,
  work: () => Promise<Omit<Outcome, 'replayed'>>,
): Promise<Outcome> {
  const { personId, key, method, path, requestHash } = request
  const mine = { person_id: personId, key }
  const inserted = await db(IDEMPOTENCY_KEYS)
    .insert({ ...mine, method, path, request_hash: requestHash })
    .onConflict(['person_id', 'key'])
    .ignore()
    .returning('key')
  if (inserted.length === 0) return readFirstOutcome(db, request)
  const { status, answer } = await work()
  await db(IDEMPOTENCY_KEYS)
    .where(mine)
    .update({ status, answer: JSON.stringify(answer ?? null) })
  return { status, answer, replayed: false }
}

async function readFirstOutcome(db: Db, request: KeyedRequest): Promise<Outcome> {
  const first = await db(IDEMPOTENCY_KEYS)
    .where({ person_id: request.personId, key: request.key })
    .first()
  if (!first || first.status === null) {
    throw new Error(`The idempotency key of ${request.method} ${request.path} has no answer.`)
  }
  if (first.request_hash !== request.requestHash) {
    throw new ProblemError(
      'idempotency-key-reused',
      'This Idempotency-Key was sent with another request before. Use a new key.',
    )
  }
  return { status: first.status, answer: first.answer, replayed: true }
}
