import { bitCount } from './bit-count'
import { createAnswerTable } from './answer-table'
import type { SearchGround } from './search-ground'
import { allBends } from './workpiece'
import type { PieceBend } from './workpiece'

export type SetSearch =
  | { readonly outcome: 'found'; readonly order: readonly PieceBend[] }
  /**
   * Exhausted: no sequence exists. `deadEnd` is the made set nearest to the flat sheet that allows no
   * last bend; the finished piece where only the forward search knows.
   */
  | { readonly outcome: 'none'; readonly deadEnd: number }
  | { readonly outcome: 'limit' }

/** Backwards from the finished piece over made sets alone, depth first. */
const searchBackwards = (ground: SearchGround, nodes: number): SetSearch => {
  const { piece, feasibility, isOver } = ground
  const seen = createAnswerTable(2 ** piece.bends.length)
  const order: PieceBend[] = []
  let looked = 0
  let deadEnd = allBends(piece)
  let fewest = Infinity

  const tries = piece.bends.map((bend) => feasibility.orientationsToTry(bend))
  const canBeLast = (bend: PieceBend, rest: number): boolean =>
    tries[bend.index]?.some((orientation) => feasibility.passes(rest, bend, orientation)) ?? false

  /** Puts the order into `order`, first bend first; `limit` when there was no time to know. */
  const visit = (made: number): 'found' | 'none' | 'limit' => {
    if (made === 0) return 'found'
    let isDead = true
    for (const bend of piece.bends) {
      const bit = 1 << bend.index
      if ((made & bit) === 0) continue
      const rest = made & ~bit
      if (seen.find(rest) === true) {
        // Another way came here before; it is no dead end if this bend can be the last one.
        if (isDead && canBeLast(bend, rest)) isDead = false
        continue
      }
      if (looked++ >= nodes || isOver()) return 'limit'
      if (!canBeLast(bend, rest)) continue
      isDead = false
      seen.set(rest, true)
      const found = visit(rest)
      if (found === 'found') order.push(bend)
      if (found !== 'none') return found
    }
    const size = bitCount(made)
    if (isDead && (size < fewest || (size === fewest && made < deadEnd))) {
      fewest = size
      deadEnd = made
    }
    return 'none'
  }

  const outcome = visit(allBends(piece))
  if (outcome === 'found') return { outcome, order }
  return outcome === 'none' ? { outcome, deadEnd } : { outcome }
}

/** True when the sets that can be made from the flat sheet run out before the piece is finished. */
const isStuckForwards = (ground: SearchGround, nodes: number): boolean => {
  const { piece, feasibility, isOver } = ground
  const full = allBends(piece)
  const seen = createAnswerTable(full + 1)
  const tries = piece.bends.map((bend) => feasibility.orientationsToTry(bend))
  const waiting = [0]
  let looked = 0
  for (let made = waiting.pop(); made !== undefined; made = waiting.pop()) {
    if (made === full) return false
    for (const bend of piece.bends) {
      const next: number = made | (1 << bend.index)
      if (next === made || seen.find(next) === true) continue
      if (looked++ >= nodes || isOver()) return false
      const current = made
      if (tries[bend.index]?.some((o) => feasibility.passes(current, bend, o)) !== true) continue
      seen.set(next, true)
      waiting.push(next)
    }
  }
  return true
}

/** The first slice of the limit; each further one is four times as large. */
const FIRST_SLICE = 2048

/**
 * Whether any order of the bends works at all, over made sets alone: a fold's tests do not depend on
 * the fold before it, so orientations need not be kept. Backwards, since a nearly finished piece
 * allows few last bends; but a bend that fails early shows at once forwards, so both take turns with
 * growing slices. What was asked is remembered, so starting over costs little.
 */
export const searchSets = (ground: SearchGround): SetSearch => {
  for (let slice = FIRST_SLICE; ; slice *= 4) {
    const nodes = Math.min(slice, ground.nodes)
    const backwards = searchBackwards(ground, nodes)
    if (backwards.outcome !== 'limit') return backwards
    if (isStuckForwards(ground, nodes)) return { outcome: 'none', deadEnd: allBends(ground.piece) }
    if (nodes === ground.nodes) return backwards
  }
}
