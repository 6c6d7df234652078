import type { Follows } from '#shared/profile/profile.schema'
import { radians } from '#shared/geometry/vector'
import { pitchAngle, printAngle } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'
import { parseSlope, type SlopeResult } from '@/features/ends/model/slope'
import { parsePitch } from '@/features/jobs/pitch'

/** How a slope is told: its rise in 12, or degrees from level. */
export const SLOPE_READINGS = ['rise', 'degrees'] as const
export type SlopeReading = (typeof SLOPE_READINGS)[number]

/** Where two slopes meet; one that is not given is the job's. */
const OF_TWO: readonly Follows['rule'][] = ['ridge', 'hip', 'valley', 'valleyRib', 'transition']

export const takesSecond = (rule: Follows['rule']): boolean => OF_TWO.includes(rule)

/** A transition between two equal slopes would be no bend. */
export const needsSecond = (rule: Follows['rule']): boolean => rule === 'transition'

/** The tie of a bend to another rule: a second slope that was given stays, where it has a meaning. */
export const tieTo = (rule: Follows['rule'], before: Follows | null): Follows => ({
  rule,
  pitch: before?.pitch ?? 'job',
  ...(before?.second !== undefined && takesSecond(rule) ? { second: before.second } : {}),
})

/** A bare number is what the reading says; `6/12` and `26.6°` say it themselves. */
export const readSlope = (text: string, reading: SlopeReading): SlopeResult =>
  reading === 'degrees' || text.includes('°') ? parseSlope(text) : parsePitchSlope(text)

function parsePitchSlope(text: string): SlopeResult {
  const pitch = parsePitch(text)
  return pitch.ok ? { ok: true, degrees: pitchAngle(pitch.rise) } : pitch
}

/** The bare number as it is typed: to a ten-thousandth of a rise or a hundredth of a degree. */
export const slopeText = (slope: Degrees, reading: SlopeReading): string =>
  reading === 'degrees'
    ? printAngle(slope, 2).replace('°', '')
    : String(Math.round(12 * Math.tan(radians(slope)) * 1e4) / 1e4)
