import { COMMON_PASSWORDS } from '#shared/people/common-passwords'

/**
 * Passwords by NIST SP 800-63B (revision 3, section 5.1.1.2): a least length, no rules of
 * composition, no forced change, every Unicode character counts as one, and none that is commonly
 * used or made of the person's own words.
 */
export const PASSWORD_LEAST = 8
export const PASSWORD_MOST = 200
/** Code units at most: a character beyond the basic plane takes two, and typed accents may be apart. */
export const PASSWORD_INPUT_LENGTH = PASSWORD_MOST * 4

export type PasswordProblem = 'short' | 'long' | 'common' | 'personal'

export interface PasswordOwner {
  readonly name: string
  readonly email: string
  readonly company?: string | null
}

/**
 * The form that is hashed and compared: the same characters however a keyboard composes them (NFKC,
 * as the standard recommends).
 */
export const normalizePassword = (password: string): string => password.normalize('NFKC')

/** Why it cannot be taken; null when it can. Lengths are counted in characters (code points). */
export function passwordProblem(password: string, owner: PasswordOwner): PasswordProblem | null {
  const normal = normalizePassword(password)
  const length = [...normal].length
  if (length < PASSWORD_LEAST) return 'short'
  if (length > PASSWORD_MOST) return 'long'
  const plain = normal.toLowerCase()
  if (COMMON_PASSWORDS.has(plain) || isPattern(plain)) return 'common'
  if (isMadeOf(plain, wordsOf(owner))) return 'personal'
  return null
}

const RUNS = ['abcdefghijklmnopqrstuvwxyz', '01234567890', 'qwertyuiop', 'asdfghjkl', 'zxcvbnm']
const LINES = RUNS.flatMap((run) => [run, [...run].reverse().join('')])

/** One character, or a short piece, over and over; or a stretch of the alphabet, digits or keys. */
function isPattern(plain: string): boolean {
  return /^(.{1,3}?)\1+$/u.test(plain) || LINES.some((line) => line.includes(plain))
}

/** Words that everybody here would try first. */
const PRODUCT_WORDS = ['foldyard', 'password', 'contraseña', 'contrasena']
/** Shorter words hide in too many others. */
const LEAST_WORD = 3
/** Characters that must be left when the person's words are taken away. */
const LEAST_OWN = 4

const wordsOf = ({ name, email, company }: PasswordOwner): string[] => {
  const own = [name, email.split('@', 1)[0] ?? '', company ?? '']
  const words = own.flatMap((text) => [
    text.toLowerCase().replace(/[^\p{L}\p{N}]+/gu, ''),
    ...text.toLowerCase().split(/[^\p{L}\p{N}]+/u),
  ])
  return [...new Set([...words, ...PRODUCT_WORDS])]
    .filter((word) => word.length >= LEAST_WORD)
    .sort((a, b) => b.length - a.length)
}

const isMadeOf = (plain: string, words: readonly string[]): boolean => {
  const left = words.reduce((text, word) => text.replaceAll(word, ''), plain)
  const own = left.replace(/[^\p{L}\p{N}]/gu, '')
  return left !== plain && [...own].length < LEAST_OWN
}
