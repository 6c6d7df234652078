import { randomInt } from 'node:crypto'
import { CODE_ALPHABET, CODE_BODY_LENGTH, composeCode, type CodeKind } from '#shared/pieces/codes'

const randomBody = (): string =>
  Array.from({ length: CODE_BODY_LENGTH }, () =>
    CODE_ALPHABET.charAt(randomInt(CODE_ALPHABET.length)),
  ).join('')

/**
 * A fresh code for a label: 30 random bits. Codes are unique per table by a constraint, not by
 * chance; the chance that one drawn among a million is taken already is about 1 in 1000.
 */
export function newCode(kind: CodeKind): string {
  for (;;) {
    const code = composeCode(kind, randomBody())
    if (code !== null) return code
  }
}
