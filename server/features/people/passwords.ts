import { hash, verify } from '@node-rs/argon2'

/** argon2id with 19 MiB and two passes, the library's defaults and OWASP's lower bound. */
export const hashPassword = (password: string): Promise<string> => hash(password)

let nobodysHash: Promise<string> | undefined

/**
 * Whether the password fits. For an unknown account (no hash) it takes the same time and says no,
 * so that the time of an answer does not tell who has an account.
 */
export async function passwordFits(
  passwordHash: string | undefined,
  password: string,
): Promise<boolean> {
  nobodysHash ??= hashPassword('nobody signs in with this')
  const fits = await verify(passwordHash ?? (await nobodysHash), password)
  return fits && passwordHash !== undefined
}
