import { isAtMost, isLess } from '#shared/geometry/tolerance'
import type { FoldTest } from './fold-test'
import { gaugeDistance } from '../gauge-stop'

/** Where the brake has a gauge, it must reach the rearmost point that its stop can touch. */
export const gauge: FoldTest = {
  check: 'gauge',
  sees: 'rear',
  neverEases: false,
  find: ({ rear, brake }) => {
    if (brake.gauge === null) return undefined
    const found = gaugeDistance(rear.chain)
    if (isLess(found, brake.gauge.min)) return { found, limit: brake.gauge.min }
    return isAtMost(found, brake.gauge.max) ? undefined : { found, limit: brake.gauge.max }
  },
}
