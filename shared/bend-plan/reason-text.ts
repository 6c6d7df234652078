import type { Inches } from '#shared/units/brands'
import type { PlanReason } from './plan.schema'

type AngleKey = 'angleBend' | 'angleHemShort' | 'angleHemLong'

/** Checks that can say how much is in the way, besides those that have figures of their own. */
const WITH_OVERLAP = [
  'rearMeetsTool',
  'frontMeetsTool',
  'meetsItself',
  'apronMeetsRear',
  'cannotLoad',
  'trapped',
] as const

type OverlapCode = (typeof WITH_OVERLAP)[number]

export interface ReasonText {
  /**
   * Key below `reason` in the namespace `plan`; the texts take `bend`, `found` and `limit`, those that
   * end in `Over` take `overlap` and `edge`.
   */
  readonly key: Exclude<PlanReason['code'], 'angle'> | AngleKey | `${OverlapCode}Over`
  /** The unit of `found` and `limit`; null where the text shows none. */
  readonly unit: 'inches' | 'degrees' | null
  /** The overlap as it is told: up to the next 1/16 in. Null where the text tells none. */
  readonly overlap: Inches | null
}

/** What of a reason its text tells. */
export type Told = Omit<PlanReason, 'contact'>

/** A cut that is a hair too short does not clear: never rounded down, but for what a bisection is off. */
const upToSixteenth = (overlap: Inches): Inches => Math.ceil(overlap * 16 - 1e-6) / 16

const angleKey = ({ bend, found, limit }: Told): AngleKey => {
  if (bend !== 'hemA' && bend !== 'hemB') return 'angleBend'
  return (found ?? 0) < (limit ?? 0) ? 'angleHemShort' : 'angleHemLong'
}

/** Which text tells a reason, and in which unit its figures are. */
export const reasonText = (reason: Told): ReasonText => {
  const { code, found, limit, overlap, edge } = reason
  if (code === 'angle') {
    const key = angleKey(reason)
    return { key, unit: key === 'angleBend' ? 'degrees' : 'inches', overlap: null }
  }
  const over = WITH_OVERLAP.find((each) => each === code)
  if (over !== undefined && overlap !== null && edge !== null) {
    return { key: `${over}Over`, unit: null, overlap: upToSixteenth(overlap) }
  }
  return { key: code, unit: found !== null && limit !== null ? 'inches' : null, overlap: null }
}
