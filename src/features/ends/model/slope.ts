import { parseAngle, pitchAngle, printAngle } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'
import { degrees, radians } from '#shared/geometry/vector'
import { parsePitch } from '@/features/jobs/pitch'

export type SlopeResult =
  | { readonly ok: true; readonly degrees: Degrees }
  | { readonly ok: false; readonly refusal: 'empty' | 'malformed' | 'outOfRange' }

/** Written as a pitch, with what it rises in: `6/12`, `6:12`, `6 in 12`. */
const WITH_RUN = /(?:\/|:|in|en)\s*12\s*$/i

/** Rises are told apart to a quarter of an inch in 12. */
const RISE_STEP = 0.25

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

/** `6/12` where it is a pitch of whole or quarter inches, degrees otherwise; without its sign. */
export function printSlope(slope: Degrees): string {
  const rise = 12 * Math.tan(radians(Math.abs(slope)))
  const near = Math.round(rise / RISE_STEP) * RISE_STEP
  const same = Math.abs(degrees(Math.atan2(near, 12)) - Math.abs(slope)) < 1e-6
  return same && near <= 24 ? `${near}/12` : printAngle(Math.abs(slope))
}
