import type { FoldGround } from './fold-setup'
import type { OperationCost } from './operation-cost'
import { ORIENTATIONS, isOrientationOpen } from './orientation'

/** Cheapest walk over a set of orientations that ends in one of them; the start is free. */
const cheapestWalk = (visit: number, end: number, move: OperationCost['move']): number => {
  const rest = visit & ~(1 << end)
  if (rest === 0) return 0
  let best = Infinity
  ORIENTATIONS.forEach((_, before) => {
    if ((rest & (1 << before)) === 0) return
    best = Math.min(best, cheapestWalk(rest, before, move) + move(before, end))
  })
  return best
}

const BYTE = 256

/**
 * A lower bound on what the bends of a set still cost before a given orientation is reached, packed.
 *
 * All tests that look at made bends are dropped. What stays is exact: a bend needs an orientation open
 * to it, each has its fixed cost there, and the walk over the orientations used is at least the
 * cheapest one. Admissible because every sequence pays at least that; consistent because one bend
 * fewer never costs more than its own fixed cost and move.
 */
export const createLowerBound = (ground: FoldGround, cost: OperationCost) => {
  const { bends } = ground.piece
  const fixed = bends.map((bend) =>
    ORIENTATIONS.map((o, number) =>
      isOrientationOpen(bend, o, ground.brake) ? cost.fixed(bend, number) : Infinity,
    ),
  )
  const chunks = Math.ceil(bends.length / 8)
  // Sums by set of orientations and byte of the bend set, so that a bound is a few look-ups.
  const sums = Array.from({ length: 16 }, (_, visit) => {
    const least = fixed.map((each) =>
      Math.min(...each.map((c, o) => ((visit >> o) & 1 ? c : Infinity))),
    )
    return Array.from({ length: chunks }, (_, chunk) => {
      const table = new Float64Array(BYTE)
      for (let bits = 1; bits < BYTE; bits++) {
        const low = 31 - Math.clz32(bits & -bits)
        table[bits] = (table[bits & (bits - 1)] ?? 0) + (least[chunk * 8 + low] ?? 0)
      }
      return table
    })
  })
  const walks = Array.from({ length: 16 }, (_, visit) =>
    ORIENTATIONS.map((_, end) =>
      (visit & (1 << end)) === 0 ? Infinity : cheapestWalk(visit, end, cost.move),
    ),
  )
  const ends = ORIENTATIONS.map((_, end) =>
    walks.flatMap((byEnd, visit) => {
      const walk = byEnd[end] ?? Infinity
      const tables = sums[visit]
      return tables === undefined || walk === Infinity ? [] : [{ walk, tables }]
    }),
  )
  return (bits: number, end: number): number => {
    let best = Infinity
    for (const { walk, tables } of ends[end] ?? []) {
      let sum = walk
      for (let chunk = 0; chunk < tables.length; chunk++) {
        sum += tables[chunk]?.[(bits >>> (chunk * 8)) & (BYTE - 1)] ?? 0
      }
      if (sum < best) best = sum
    }
    return best
  }
}
