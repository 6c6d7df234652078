import { ORIENTATIONS } from './orientation'
import type { Operation, SearchGround } from './search-ground'
import type { PieceBend } from './workpiece'

export interface Sequence {
  /** Packed. */
  readonly cost: number
  readonly operations: readonly Operation[]
}

/** The cheapest orientations for a given order of the bends; undefined when some bend has none. */
export const orientOrder = (
  ground: SearchGround,
  order: readonly PieceBend[],
): Sequence | undefined => {
  let made = 0
  let ends: (Sequence | undefined)[] | undefined
  for (const bend of order) {
    const before = ends
    const current = made
    ends = ORIENTATIONS.map((_, orientation) => {
      if (!ground.feasibility.passes(current, bend, orientation)) return undefined
      const here =
        ground.cost.fixed(bend, orientation) + ground.cost.gauge(current, bend, orientation)
      const operation = { bend: bend.index, orientation }
      if (before === undefined) return { cost: here, operations: [operation] }
      let best: Sequence | undefined
      before.forEach((end, from) => {
        if (end === undefined) return
        const cost = end.cost + ground.cost.move(from, orientation) + here
        if (best === undefined || cost < best.cost) {
          best = { cost, operations: [...end.operations, operation] }
        }
      })
      return best
    })
    made |= 1 << bend.index
  }
  if (ends === undefined) return { cost: 0, operations: [] }
  return ends.reduce((best, end) =>
    best === undefined || (end !== undefined && end.cost < best.cost) ? end : best,
  )
}
