import { findGoodSequence } from './beam-search'
import { bitCount } from './bit-count'
import { createHeap } from './heap'
import { createNumberTable } from './number-table'
import type { Sequence } from './orient-order'
import { ORIENTATIONS } from './orientation'
import { createSearchEntries } from './search-entries'
import type { Operation, SearchGround } from './search-ground'
import { allBends } from './workpiece'

export interface SequenceSearch {
  readonly best: Sequence
  /** Packed; equals the best cost when the search ran to its end. */
  readonly lowerBound: number
  readonly proven: boolean
  /**
   * Cheapest way to finish from a made set whose next fold is made in an orientation, known for every
   * state of every cheapest sequence; null when the limit was reached before all were.
   */
  readonly findRest: ((made: number, orientation: number) => number | undefined) | null
}

/** A fold put into the queue costs far less than one that is tested, and most are never taken out. */
const QUEUED_PER_NODE = 8

/** Folds put into the queue to know all sequences as cheap as the best one. */
const EQUALS = 100_000

/** Folds put into the queue from which on a search counts as long. */
const LONG = 50_000

/** Room for the number of bends left beside the cost in one sort key: the deeper node goes first. */
const DEPTH = 32

/**
 * Cheapest sequence by A* backwards from the finished piece. A state is (made set, orientation of the
 * fold made next). A fold is tested when it is taken from the queue, not when it is put there. The
 * bound is consistent, so the first way into a state whose fold passes is its cheapest.
 *
 * It goes on through all states that cost no more than the best sequence, so that the choice among
 * equals can be made. `first` is a sequence found before: nothing dearer is looked at. A search that
 * turns out long is given a better one.
 */
export const searchSequence = (ground: SearchGround, first: Sequence): SequenceSearch => {
  const { piece, feasibility, cost, lowerBound, nodes, isOver } = ground
  const full = allBends(piece)
  let known = first
  let isLong = false
  const queue = createHeap()
  const entries = createSearchEntries()
  /** The entry that closed a state. */
  const closed = createNumberTable(4 * (full + 1))
  const stateOf = (made: number, orientation: number) => made * 4 + orientation
  const open = piece.bends.map((bend) =>
    [...ORIENTATIONS.keys()].filter((orientation) => feasibility.isEverOpen(bend, orientation)),
  )

  /** `after` is the orientation of the fold made next, and what it costs from there; null at the end. */
  const expand = (
    made: number,
    next: number,
    after: { readonly orientation: number; readonly cost: number } | null,
  ) => {
    for (const bend of piece.bends) {
      const bit = 1 << bend.index
      if ((made & bit) === 0) continue
      const rest = made & ~bit
      for (const orientation of open[bend.index] ?? []) {
        if (closed.find(stateOf(rest, orientation)) !== undefined) continue
        const g =
          (after === null ? 0 : after.cost + cost.move(orientation, after.orientation)) +
          cost.fixed(bend, orientation) +
          cost.gauge(rest, bend, orientation)
        const f = g + lowerBound(rest, orientation)
        if (f > known.cost) continue
        queue.push(entries.add(rest, bend.index, orientation, g, next), f * DEPTH + bitCount(rest))
      }
    }
  }

  const operationsFrom = (entry: number): Operation[] => {
    const operations: Operation[] = []
    for (let at = entry; at !== -1;) {
      const { bend, orientation, next } = entries.get(at)
      operations.push({ bend, orientation })
      at = next
    }
    return operations
  }

  const findRest = (made: number, orientation: number) => {
    const entry = closed.find(stateOf(made, orientation))
    return entry === undefined ? undefined : entries.get(entry).cost
  }

  if (full === 0) return { best: known, lowerBound: known.cost, proven: true, findRest }
  expand(full, -1, null)
  let best: Sequence | undefined
  const mostQueued = nodes * QUEUED_PER_NODE
  let most = mostQueued
  for (;;) {
    const key = queue.leastKey()
    const index = queue.pop()
    if (key === undefined || index === undefined) break
    const f = Math.floor(key / DEPTH)
    if (best !== undefined && f > best.cost) break
    if (entries.count() > most || isOver()) {
      if (best !== undefined) return { best, lowerBound: best.cost, proven: true, findRest: null }
      return { best: known, lowerBound: f, proven: false, findRest: null }
    }
    if (!isLong && entries.count() > LONG) {
      isLong = true
      known = findGoodSequence(ground, known.cost) ?? known
    }
    const entry = entries.get(index)
    const { made, orientation } = entry
    const bend = piece.bends[entry.bend]
    const state = stateOf(made, orientation)
    if (bend === undefined || closed.find(state) !== undefined) continue
    if (!feasibility.passes(made, bend, orientation)) continue
    closed.set(state, index)
    if (made !== 0) expand(made, index, entry)
    else if (best === undefined) {
      best = { cost: entry.cost, operations: operationsFrom(index) }
      most = Math.min(mostQueued, entries.count() + EQUALS)
    }
  }
  if (best === undefined)
    throw new Error('A sequence that was found before has not been found again.')
  return { best, lowerBound: best.cost, proven: true, findRest }
}
