import type { Sequence } from './orient-order'
import { ORIENTATIONS } from './orientation'
import type { Operation, SearchGround } from './search-ground'
import { allBends } from './workpiece'
import type { PieceBend } from './workpiece'

/** States kept of each layer. */
const WIDTH = 100

/** A state as in the search for the cheapest sequence, with the folds made after it. */
interface State {
  readonly made: number
  /** Of the fold made next; null while none is. */
  readonly orientation: number | null
  readonly cost: number
  readonly fold: Operation | null
  readonly next: State | null
}

interface Candidate {
  readonly bend: PieceBend
  readonly orientation: number
  readonly made: number
  readonly cost: number
  readonly least: number
  readonly next: State
}

/**
 * A good sequence, not always the cheapest, found in little time: backwards from the finished piece,
 * one bend a layer, keeping of each layer the states with the least bound. It prunes the search for
 * the cheapest, and is the answer where that comes to its limit. Undefined where none is cheaper than
 * `limit`, packed.
 */
export const findGoodSequence = (ground: SearchGround, limit: number): Sequence | undefined => {
  const { piece, feasibility, cost, lowerBound } = ground
  const open = piece.bends.map((bend) =>
    [...ORIENTATIONS.keys()].filter((orientation) => feasibility.isEverOpen(bend, orientation)),
  )

  const candidatesOf = (next: State): Candidate[] =>
    piece.bends.flatMap((bend) => {
      const made = next.made & ~(1 << bend.index)
      if (made === next.made) return []
      return (open[bend.index] ?? []).flatMap((orientation) => {
        const move = next.orientation === null ? 0 : cost.move(orientation, next.orientation)
        const spent =
          next.cost + move + cost.fixed(bend, orientation) + cost.gauge(made, bend, orientation)
        const least = spent + lowerBound(made, orientation)
        return least < limit ? [{ bend, orientation, made, cost: spent, least, next }] : []
      })
    })

  let layer: State[] = [
    { made: allBends(piece), orientation: null, cost: 0, fold: null, next: null },
  ]
  for (let left = piece.bends.length; left > 0; left--) {
    // Equals stay in the order in which they came: the same request takes the same way.
    const candidates = layer.flatMap(candidatesOf).sort((a, b) => a.least - b.least)
    const seen = new Set<number>()
    layer = []
    for (const { bend, orientation, made, cost: spent, next } of candidates) {
      const state = made * ORIENTATIONS.length + orientation
      if (seen.has(state) || !feasibility.passes(made, bend, orientation)) continue
      seen.add(state)
      const fold = { bend: bend.index, orientation }
      layer.push({ made, orientation, cost: spent, fold, next })
      if (layer.length === WIDTH) break
    }
  }
  const [best] = layer.toSorted((a, b) => a.cost - b.cost)
  if (best === undefined) return undefined
  const operations: Operation[] = []
  for (let at: State | null = best; at !== null; at = at.next) {
    if (at.fold !== null) operations.push(at.fold)
  }
  return { cost: best.cost, operations }
}
