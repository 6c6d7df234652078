import { isEqual } from '#shared/geometry/tolerance'
import type { Brake } from './brake.schema'
import type { PlanStep } from './plan.schema'

/** Whether the gauge must be set anew between two steps. */
const movesGauge = (before: PlanStep | undefined, { gaugeSetting }: PlanStep): boolean =>
  before !== undefined &&
  before.gaugeSetting !== null &&
  gaugeSetting !== null &&
  !isEqual(before.gaugeSetting, gaugeSetting)

/**
 * The steps with the seconds that each takes by the brake's speeds; null where it states none. Pieces
 * of a run follow one another, so before the first hit the gauge comes back from the last one.
 */
export const withSeconds = (steps: readonly PlanStep[], { speeds }: Brake): PlanStep[] =>
  steps.map((step, i) => {
    if (speeds === undefined) return { ...step, seconds: null }
    const before = steps[i === 0 ? steps.length - 1 : i - 1]
    const move = step.move === 'none' ? 0 : speeds[step.move]
    const gauge = movesGauge(before, step) ? speeds.gaugeMove : 0
    return { ...step, seconds: move + step.hits * speeds.hit + gauge }
  })

/** Seconds of all steps; null where there are none or one is unknown. */
export const secondsOf = (steps: readonly PlanStep[]): number | null => {
  const known = steps.flatMap(({ seconds }) => (seconds === null ? [] : [seconds]))
  if (known.length === 0 || known.length < steps.length) return null
  return known.reduce((sum, each) => sum + each, 0)
}
