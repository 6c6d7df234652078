import { createHash, randomBytes } from 'node:crypto'
import type { Db } from '#server/db/knex'
import { PASSWORD_LINKS, type PasswordLinkRow } from '#server/db/tables/password-links'
import {
  INVITATION_DAYS,
  RESET_MINUTES,
  type PasswordLinkKind,
} from '#shared/people/accounts.contract'

const TOKEN_BYTES = 32
const MINUTE = 60_000

/** Milliseconds. */
const HOLDS_FOR: Record<PasswordLinkKind, number> = {
  invitation: INVITATION_DAYS * 24 * 60 * MINUTE,
  reset: RESET_MINUTES * MINUTE,
}

/** A token is random through and through, so a plain hash keeps it: there is nothing to guess. */
const hashOf = (token: string): Buffer => createHash('sha256').update(token).digest()

/** A new link in place of an open one of this kind. Gives the token; it is kept nowhere. */
export async function createPasswordLink(
  db: Db,
  {
    kind,
    personId,
    at,
  }: { readonly kind: PasswordLinkKind; readonly personId: string; readonly at: Date },
): Promise<string> {
  const token = randomBytes(TOKEN_BYTES).toString('base64url')
  await db(PASSWORD_LINKS)
    .insert({
      token_hash: hashOf(token),
      kind,
      person_id: personId,
      created_at: at,
      expires_at: new Date(at.getTime() + HOLDS_FOR[kind]),
    })
    .onConflict(['person_id', 'kind'])
    .merge()
  return token
}

type OpenLink = Pick<PasswordLinkRow, 'kind' | 'person_id'>

/** The link of a token, while it holds. */
export const findPasswordLink = (db: Db, token: string, now: Date): Promise<OpenLink | undefined> =>
  db(PASSWORD_LINKS)
    .where({ token_hash: hashOf(token) })
    .where('expires_at', '>', now)
    .first('kind', 'person_id')

/** Takes the link away and gives it: of two at once one gets it. */
export async function takePasswordLink(
  db: Db,
  token: string,
  now: Date,
): Promise<OpenLink | undefined> {
  const [link] = await db(PASSWORD_LINKS)
    .where({ token_hash: hashOf(token) })
    .where('expires_at', '>', now)
    .delete()
    .returning(['kind', 'person_id'])
  return link
}

export async function removePasswordLinks(db: Db, personId: string): Promise<void> {
  await db(PASSWORD_LINKS).where({ person_id: personId }).delete()
}
