/**
 * Codes on labels: a kind letter, six characters and a check character, e.g. `P7K3M9QX`. All are
 * in the character set of Code 128 B and stay readable by eye: the letters I, L, O and U are never
 * used, so that O and I typed for 0 and 1 can be put right.
 *
 * The check character is that of ISO/IEC 7064, MOD 37,36 (hybrid system over 0-9 A-Z), computed
 * over the kind letter and the body. It finds every single wrong character. Of the swaps of two
 * neighbors it lets a few through (characters next to each other in the set, in one state of the
 * sum out of 36): bodies with such a pair are never used, so every swap is found as well.
 */

const CHARACTERS = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZ'
const MODULUS = 36

/** The characters a body is made of. */
export const CODE_ALPHABET = '0123456789ABCDEFGHJKMNPQRSTVWXYZ'
export const CODE_BODY_LENGTH = 6

export const CODE_KINDS = { piece: 'P', bundle: 'B', run: 'R', slip: 'S' } as const
export type CodeKind = keyof typeof CODE_KINDS

/** The MOD 37,36 check character of a string over 0-9 A-Z. */
export function checkCharacter(text: string): string {
  let product = MODULUS
  for (const character of text) {
    const value = CHARACTERS.indexOf(character)
    if (value < 0) throw new RangeError(`"${character}" is not in the set of MOD 37,36`)
    const sum = (product + value) % MODULUS || MODULUS
    product = (sum * 2) % (MODULUS + 1)
  }
  return CHARACTERS.charAt((MODULUS + 1 - product) % MODULUS)
}

const hasRightCheck = (text: string): boolean =>
  checkCharacter(text.slice(0, -1)) === text.slice(-1)

/** The text with the characters at `index` and `index + 1` changed about. */
const swapped = (text: string, index: number): string =>
  text.slice(0, index) + text.charAt(index + 1) + text.charAt(index) + text.slice(index + 2)

const hasHiddenSwap = (code: string): boolean =>
  Array.from({ length: code.length - 1 }, (_, index) => swapped(code, index)).some(
    (other) => other !== code && hasRightCheck(other),
  )

/**
 * Makes a code from a body, or null when its check character would be one of the four that the eye
 * confuses, or when two neighbors could be swapped unnoticed: the caller then draws another body.
 */
export function composeCode(kind: CodeKind, body: string): string | null {
  const stem = CODE_KINDS[kind] + body
  const code = stem + checkCharacter(stem)
  return CODE_ALPHABET.includes(code.slice(-1)) && !hasHiddenSwap(code) ? code : null
}

export type CodeFault = 'empty' | 'length' | 'characters' | 'check' | 'kind'

export type ParsedCode =
  | { readonly ok: true; readonly code: string; readonly kind: CodeKind }
  | { readonly ok: false; readonly fault: CodeFault }

/**
 * Reads what was typed or scanned: spaces and dashes are dropped, case does not matter, O reads as
 * 0, I and L as 1, U as V.
 */
export function parseCode(typed: string): ParsedCode {
  const text = typed
    .toUpperCase()
    .replace(/[\s-]/g, '')
    .replace(/O/g, '0')
    .replace(/[IL]/g, '1')
    .replace(/U/g, 'V')
  if (text === '') return { ok: false, fault: 'empty' }
  if (!/^[0-9A-Z]+$/.test(text)) return { ok: false, fault: 'characters' }
  if (text.length !== CODE_BODY_LENGTH + 2) return { ok: false, fault: 'length' }
  const kind = (Object.keys(CODE_KINDS) as CodeKind[]).find((name) =>
    text.startsWith(CODE_KINDS[name]),
  )
  if (kind === undefined) return { ok: false, fault: 'kind' }
  if (!hasRightCheck(text)) return { ok: false, fault: 'check' }
  return { ok: true, code: text, kind }
}
