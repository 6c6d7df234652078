import { parseAngle, pitchAngle } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'
import { parsePitch } from '@/features/jobs/pitch'

export type SlopeResult =
  | { readonly ok: true; readonly degrees: Degrees }
  | { readonly ok: false; readonly refusal: 'empty' | 'malformed' | 'outOfRange' }

/** Written as a pitch, with what it rises in: `6/12`, `6:12`, `6 in 12`. */
const WITH_RUN = /(?:\/|:|in|en)\s*12\s*$/i

/** Reads a slope as a pitch (`6/12`) or in degrees (`26.6`, `26.6°`), never below level. */
export function parseSlope(text: string): SlopeResult {
  if (text.trim() === '') return { ok: false, refusal: 'empty' }
  if (WITH_RUN.test(text)) {
    const pitch = parsePitch(text)
    return pitch.ok ? { ok: true, degrees: pitchAngle(pitch.rise) } : pitch
  }
  const angle = parseAngle(text)
  if (!angle.ok) return { ok: false, refusal: 'malformed' }
  return angle.degrees >= 0 && angle.degrees < 90
    ? { ok: true, degrees: angle.degrees }
    : { ok: false, refusal: 'outOfRange' }
}
