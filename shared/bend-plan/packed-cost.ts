import type { PlanCost } from './plan.schema'

/**
 * A cost as one integer that compares as the tuple does. The planner takes at most 26 operations, so
 * the two counts stay below 64 and the whole far below 2^53.
 */
const FIELD = 64

export const packCost = ({ handling, wideFront, faceGauge }: PlanCost): number =>
  (handling * FIELD + wideFront) * FIELD + faceGauge

export const unpackCost = (packed: number): PlanCost => {
  const faceGauge = packed % FIELD
  const upper = (packed - faceGauge) / FIELD
  const wideFront = upper % FIELD
  return { handling: (upper - wideFront) / FIELD, wideFront, faceGauge }
}
