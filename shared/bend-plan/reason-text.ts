import type { PlanReason } from './plan.schema'

export interface ReasonText {
  /** Key below `reason` in the namespace `plan`; the texts take `bend`, `found` and `limit`. */
  readonly key: Exclude<PlanReason['code'], 'angle'> | AngleKey
  /** The unit of `found` and `limit`; null where the text shows none. */
  readonly unit: 'inches' | 'degrees' | null
}

type AngleKey = 'angleBend' | 'angleHemShort' | 'angleHemLong'

const angleKey = ({ bend, found, limit }: PlanReason): AngleKey => {
  if (bend !== 'hemA' && bend !== 'hemB') return 'angleBend'
  return (found ?? 0) < (limit ?? 0) ? 'angleHemShort' : 'angleHemLong'
}

/** Which text tells a reason, and in which unit its figures are. */
export const reasonText = (reason: PlanReason): ReasonText => {
  if (reason.code === 'angle') {
    const key = angleKey(reason)
    return { key, unit: key === 'angleBend' ? 'degrees' : 'inches' }
  }
  const hasFigures = reason.found !== null && reason.limit !== null
  return { key: reason.code, unit: hasFigures ? 'inches' : null }
}
