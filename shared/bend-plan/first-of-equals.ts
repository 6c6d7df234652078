import { isLeftTheShownSide } from './painted-side'
import type { Sequence } from './orient-order'
import { getOrientation, isOrientationOpen, ORIENTATIONS } from './orientation'
import type { Operation, SearchGround } from './search-ground'
import type { SequenceSearch } from './sequence-search'
import type { ColorSide } from '#shared/profile/profile.schema'
import { allBends } from './workpiece'
import type { PieceBend } from './workpiece'

interface Choice extends Operation {
  readonly piece: PieceBend
  /** Compared from the left. */
  readonly rank: readonly number[]
}

const compareRanks = (a: readonly number[], b: readonly number[]): number => {
  const at = a.findIndex((value, i) => value !== b[i])
  return at < 0 ? 0 : (a[at] ?? 0) - (b[at] ?? 0)
}

/** Hems first, then nearest to an edge, then index; painted side up before down; A at the back first. */
const rankedChoices = (ground: SearchGround, paintedSide: ColorSide): readonly Choice[] => {
  const { bends } = ground.piece
  return bends
    .flatMap((piece) =>
      ORIENTATIONS.flatMap((_, orientation) => {
        const o = getOrientation(orientation)
        if (!isOrientationOpen(piece, o, ground.brake)) return []
        const fromEdge = Math.min(piece.index, bends.length - 1 - piece.index)
        const shownUp = o.leftUp === isLeftTheShownSide(paintedSide)
        const rank = [
          piece.hem === null ? 1 : 0,
          fromEdge,
          piece.index,
          shownUp ? 0 : 1,
          o.aBack ? 0 : 1,
        ]
        return [{ bend: piece.index, orientation, piece, rank }]
      }),
    )
    .sort((a, b) => compareRanks(a.rank, b.rank))
}

/**
 * Among all sequences that cost as little as `best`, the one with the smallest ranks, looked for
 * forwards with what the backward search knows of the rest. Gives `best` itself back should the
 * limit on folds be reached before: still the same answer every time, and as cheap.
 */
export const firstOfEquals = (
  ground: SearchGround,
  best: Sequence,
  findRest: SequenceSearch['findRest'],
  paintedSide: ColorSide,
): Sequence => {
  const { piece, feasibility, cost, lowerBound } = ground
  const full = allBends(piece)
  const choices = rankedChoices(ground, paintedSide)
  const failed = new Map<number, number>()
  const operations: Operation[] = []
  let looked = 0

  const isHopeless = (state: number, spent: number) => spent >= (failed.get(state) ?? Infinity)

  /** True when `operations` has become a whole sequence within the cost. */
  const complete = (made: number, from: number | undefined, spent: number): boolean => {
    if (made === full) return true
    for (const choice of choices) {
      const { orientation } = choice
      const bit = 1 << choice.bend
      if ((made & bit) !== 0) continue
      const moved = spent + (from === undefined ? 0 : cost.move(from, orientation))
      if (moved + (findRest(made, orientation) ?? 0) > best.cost) continue
      const total =
        moved + cost.fixed(choice.piece, orientation) + cost.gauge(made, choice.piece, orientation)
      const next = made | bit
      if (total + lowerBound(full & ~next, orientation) > best.cost) continue
      if (isHopeless(next * 4 + orientation, total)) continue
      if (looked++ >= ground.nodes) return false
      if (!feasibility.passes(made, choice.piece, orientation)) continue
      operations.push({ bend: choice.bend, orientation })
      if (complete(next, orientation, total)) return true
      operations.pop()
    }
    if (from !== undefined) failed.set(made * 4 + from, spent)
    return false
  }

  return complete(0, undefined, 0) ? { cost: best.cost, operations } : best
}
