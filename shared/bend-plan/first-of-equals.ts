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
 * Among all sequences that cost as little as `best`, the one with the smallest ranks, walked forwards
 * over what the backward search knows of the rest of each: every choice it offers can be finished.
 */
export const firstOfEquals = (
  ground: SearchGround,
  best: Sequence,
  findRest: NonNullable<SequenceSearch['findRest']>,
  paintedSide: ColorSide,
): Sequence => {
  const { piece, feasibility, cost } = ground
  const full = allBends(piece)
  const choices = rankedChoices(ground, paintedSide)
  const operations: Operation[] = []
  let made = 0
  let from: number | undefined
  let spent = 0

  const canFinish = (next: number, orientation: number, total: number): boolean =>
    next === full
      ? total === best.cost
      : ORIENTATIONS.some((_, then) => {
          const rest = findRest(next, then)
          return rest !== undefined && total + cost.move(orientation, then) + rest === best.cost
        })

  const costOf = ({ piece: bend, orientation }: Choice): number =>
    spent +
    (from === undefined ? 0 : cost.move(from, orientation)) +
    cost.fixed(bend, orientation) +
    cost.gauge(made, bend, orientation)

  while (made !== full) {
    const choice = choices.find((each) => {
      const next = made | (1 << each.bend)
      return (
        next !== made &&
        canFinish(next, each.orientation, costOf(each)) &&
        feasibility.passes(made, each.piece, each.orientation)
      )
    })
    if (choice === undefined) throw new Error('A cheapest sequence has no first one.')
    spent = costOf(choice)
    made |= 1 << choice.bend
    from = choice.orientation
    operations.push({ bend: choice.bend, orientation: choice.orientation })
  }
  return { cost: spent, operations }
}
