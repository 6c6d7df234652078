import { CODE_ALPHABET, CODE_BODY_LENGTH, composeCode, type CodeKind } from '#shared/pieces/codes'

/** Ids and codes that look drawn at random and are the same in every demo shop. */
export interface DemoRandom {
  /** A version 4 UUID. */
  readonly nextId: () => string
  readonly drawCode: (kind: CodeKind) => string
}

/** Mulberry32, a small public-domain generator: whole numbers below `bound`. */
function seededIntegers(seed: number): (bound: number) => number {
  let state = seed >>> 0
  return (bound) => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) % bound
  }
}

export function createDemoRandom(seed: number): DemoRandom {
  const next = seededIntegers(seed)
  const text = (alphabet: string, length: number): string =>
    Array.from({ length }, () => alphabet.charAt(next(alphabet.length))).join('')
  const hex = (length: number): string => text('0123456789abcdef', length)
  return {
    nextId: () => `${hex(8)}-${hex(4)}-4${hex(3)}-${text('89ab', 1)}${hex(3)}-${hex(12)}`,
    drawCode: (kind) => {
      for (;;) {
        const code = composeCode(kind, text(CODE_ALPHABET, CODE_BODY_LENGTH))
        if (code !== null) return code
      }
    },
  }
}
