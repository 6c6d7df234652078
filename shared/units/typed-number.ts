/** Why a typed measure was refused. The texts live in the locales, namespace `units`. */
export const TYPED_REFUSALS = [
  'empty',
  'malformed',
  'comma',
  'negative',
  'zeroDenominator',
  'fractionTooBig',
  'fractionWithoutUnit',
  'tooLarge',
] as const

export interface TypedRefusal {
  readonly ok: false
  readonly code: (typeof TYPED_REFUSALS)[number]
  /** What the person may have meant, ready to be typed instead; empty where nothing can be guessed. */
  readonly cures: readonly string[]
}

export const refusal = (
  code: TypedRefusal['code'],
  cures: readonly string[] = [],
): TypedRefusal => ({
  ok: false,
  code,
  cures,
})

/** Longer than anything a person types; keeps a pasted page from being searched for a length. */
const LONGEST_TEXT = 60

const VULGAR: Record<string, string> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
  '⅓': '1/3',
  '⅔': '2/3',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅒': '1/10',
}

/**
 * One spelling for every sign: straight quotes for primes, `n/d` for a fraction in one character,
 * a plain minus and plain blanks, lower case.
 */
export const plainText = (text: string): string =>
  text
    .slice(0, LONGEST_TEXT + 1)
    .replace(/[½¼¾⅛⅜⅝⅞⅓⅔⅕⅖⅗⅘⅙⅚⅒]/g, (sign) => ` ${VULGAR[sign] ?? sign}`)
    .replace(/[\u2044\u2215]/g, '/')
    .replace(/[\u2032\u2019\u2018\u02b9\u00b4`]/g, "'")
    .replace(/[\u2033\u201d\u201c\u02ba]/g, '"')
    .replace(/''/g, '"')
    .replace(/[\u2212\u2010-\u2014]/g, '-')
    .replace(/\s+/g, ' ')
    .trim()
    .toLowerCase()

/**
 * Refusals that hold for any measure, or null when the text deserves to be read. `reads` tells
 * whether a text would be read: a cure that would be refused itself is none.
 */
export const findRefusal = (
  plain: string,
  reads: (text: string) => boolean,
): TypedRefusal | null => {
  if (plain === '') return refusal('empty')
  if (plain.length > LONGEST_TEXT) return refusal('malformed')
  if (!plain.includes(',')) return null
  // A comma is a decimal sign to one half of the world and a thousands sign to the other.
  if (!/^[^,]*\d,\d[^,]*$/.test(plain)) return refusal('malformed')
  const thousands = /\d,\d{3}(?!\d)/.test(plain) ? [plain.replace(',', '')] : []
  const cures = [plain.replace(',', '.'), ...thousands].filter(reads)
  return cures.length > 0 ? refusal('comma', cures) : refusal('malformed')
}

const DECIMAL = /^(?:\d+\.?\d*|\.\d+)$/
const FRACTION = /^(?:(\d+)(?: | ?- ?))?(\d+) ?\/ ?(\d+)$/

export type NumberResult = { readonly ok: true; readonly value: number } | TypedRefusal

/** Reads `5`, `5.75`, `.5`, `3/4`, `5 3/4` or `5-3/4`; no sign, no exponent, no unit. */
export const parsePlainNumber = (plain: string): NumberResult => {
  if (DECIMAL.test(plain)) return { ok: true, value: Number(plain) }
  const match = FRACTION.exec(plain)
  if (!match) return refusal('malformed')
  const [, whole, above, below] = match
  const numerator = Number(above)
  const denominator = Number(below)
  if (denominator === 0) return refusal('zeroDenominator')
  if (whole === undefined) return { ok: true, value: numerator / denominator }
  return numerator < denominator
    ? { ok: true, value: Number(whole) + numerator / denominator }
    : refusal('fractionTooBig')
}
