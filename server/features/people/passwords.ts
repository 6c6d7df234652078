import { hash, verify } from '@node-rs/argon2'
import { invalidInput } from '#server/http/errors'
import {
  normalizePassword,
  passwordProblem,
  PASSWORD_LEAST,
  PASSWORD_MOST,
  type PasswordOwner,
  type PasswordProblem,
} from '#shared/people/password-rules'

/** argon2id with 19 MiB and two passes, the library's defaults and OWASP's lower bound. */
export const hashPassword = (password: string): Promise<string> => hash(normalizePassword(password))

let nobodysHash: Promise<string> | undefined

/**
 * Whether the password fits. For an account that is unknown or has none yet it takes the same time
 * and says no, so that the time of an answer does not tell who has an account.
 */
export async function passwordFits(
  passwordHash: string | null | undefined,
  password: string,
): Promise<boolean> {
  nobodysHash ??= hashPassword('nobody signs in with this')
  const fits = await verify(passwordHash ?? (await nobodysHash), normalizePassword(password))
  return fits && typeof passwordHash === 'string'
}

const CURES: Record<PasswordProblem, string> = {
  short: `Too short. Take at least ${PASSWORD_LEAST} characters; a few words make a good one.`,
  long: `Too long. Take at most ${PASSWORD_MOST} characters.`,
  common: 'This is one of those that are tried first. Choose another.',
  personal: 'This is made of a name or address that others know. Choose another.',
}

/**
 * The hash of a password that the rules take.
 *
 * @throws invalid-input naming `password`, with the problem as its code
 */
export async function hashNewPassword(password: string, owner: PasswordOwner): Promise<string> {
  const problem = passwordProblem(password, owner)
  if (problem !== null) {
    throw invalidInput([{ path: 'password', message: CURES[problem], code: problem }])
  }
  return hashPassword(password)
}
