import { bitCount } from './bit-count'
import { ORIENTATIONS } from './orientation'
import type { SearchGround } from './search-ground'
import { allBends } from './workpiece'
import type { PieceBend } from './workpiece'

export type SetSearch =
  | { readonly outcome: 'found'; readonly order: readonly PieceBend[] }
  /** Exhausted: no sequence exists. `deadEnd` is the made set nearest to the flat sheet where all stops. */
  | { readonly outcome: 'none'; readonly deadEnd: number }
  | { readonly outcome: 'limit' }

/**
 * Whether any order of the bends works at all, backwards from the finished piece over made sets alone:
 * a fold's tests do not depend on the fold before it, so orientations need not be kept.
 */
export const searchSets = (ground: SearchGround): SetSearch => {
  const { piece, feasibility, nodes } = ground
  const seen = new Set<number>()
  const order: PieceBend[] = []
  let looked = 0
  let deadEnd = allBends(piece)
  let fewest = Infinity

  const canBeLast = (bend: PieceBend, rest: number): boolean =>
    ORIENTATIONS.some((_, orientation) => feasibility.passes(rest, bend, orientation))

  /** Puts the order into `order`, first bend first; `limit` when there was no time to know. */
  const visit = (made: number): 'found' | 'none' | 'limit' => {
    if (made === 0) return 'found'
    let isDead = true
    for (const bend of piece.bends) {
      const bit = 1 << bend.index
      if ((made & bit) === 0) continue
      const rest = made & ~bit
      if (seen.has(rest)) {
        // Another way came here before; it is no dead end if this bend can be the last one.
        if (isDead && canBeLast(bend, rest)) isDead = false
        continue
      }
      if (looked++ >= nodes) return 'limit'
      if (!canBeLast(bend, rest)) continue
      isDead = false
      seen.add(rest)
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
