import type { PasswordLinkKind } from '#shared/people/accounts.contract'

export const PASSWORD_LINKS = 'password_links'

export interface PasswordLinkRow {
  /** SHA-256 of the token. */
  token_hash: Buffer
  kind: PasswordLinkKind
  person_id: string
  created_at: Date
  expires_at: Date
}
export type PasswordLinkInsert = PasswordLinkRow
