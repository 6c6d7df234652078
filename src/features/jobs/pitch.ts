import { pitchRiseSchema } from '#shared/jobs/jobs.contract'

export type PitchResult =
  | { readonly ok: true; readonly rise: number }
  | { readonly ok: false; readonly refusal: 'empty' | 'malformed' | 'outOfRange' }

/** A rise, or rise and run as it is said on a roof: `6`, `4.5`, `4,5`, `6/12`, `6 in 12`, `6:12`. */
const PITCH = /^(\d{1,3}(?:[.,]\d{1,4})?)\s*(?:(?:\/|:|in|en)\s*12)?$/i

/** Reads a pitch as its rise in 12. A comma is a decimal point here: no rise has thousands. */
export function parsePitch(text: string): PitchResult {
  const plain = text.trim()
  if (plain === '') return { ok: false, refusal: 'empty' }
  const [, digits] = PITCH.exec(plain) ?? []
  if (digits === undefined) return { ok: false, refusal: 'malformed' }
  const rise = pitchRiseSchema.safeParse(Number(digits.replace(',', '.')))
  return rise.success ? { ok: true, rise: rise.data } : { ok: false, refusal: 'outOfRange' }
}
