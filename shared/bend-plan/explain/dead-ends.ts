import { createAnswerTable } from '../answer-table'
import type { PieceBend } from '../workpiece'
import { allBends } from '../workpiece'
import { findBlockedFold } from './blocked-fold'
import type { BlockedFold, BlockedGround } from './blocked-fold'

/** Dead ends looked at, and folds asked about to find them: an explanation need not know them all. */
const MOST_ENDS = 12
const MOST_FOLDS = 20_000

/** Made sets where the way stops, in the order in which they are come upon, and what they stop at. */
interface Stops {
  readonly sets: readonly number[]
  /** The bends that cannot be made next to it: last of it, seen backwards; next on it, forwards. */
  readonly blockedAt: (
    set: number,
  ) => readonly { readonly made: number; readonly bend: PieceBend }[]
}

type Way = 'backwards' | 'forwards'

const findStops = ({ piece, feasibility }: BlockedGround, way: Way): Stops => {
  const full = allBends(piece)
  const seen = createAnswerTable(full + 1)
  const tries = piece.bends.map((bend) => feasibility.orientationsToTry(bend))
  const [start, goal] = way === 'backwards' ? [full, 0] : [0, full]
  const blockedAt = (set: number) =>
    piece.bends.flatMap((bend) => {
      const bit = 1 << bend.index
      const isMade = (set & bit) !== 0
      return isMade === (way === 'backwards') ? [{ made: set & ~bit, bend }] : []
    })
  const sets: number[] = []
  const waiting = [start]
  let asked = 0
  for (let set = waiting.pop(); set !== undefined; set = waiting.pop()) {
    let isStop = set !== goal
    for (const { made, bend } of blockedAt(set)) {
      asked += 1
      if (tries[bend.index]?.some((o) => feasibility.passes(made, bend, o)) !== true) continue
      isStop = false
      const next = way === 'backwards' ? made : made | (1 << bend.index)
      if (seen.find(next) === true) continue
      seen.set(next, true)
      waiting.push(next)
    }
    if (isStop) sets.push(set)
    if (sets.length === MOST_ENDS || asked > MOST_FOLDS) break
  }
  return { sets, blockedAt }
}

/**
 * Where no order exists: the blocked folds of the dead end that comes nearest to bending, least
 * overlap first. A dead end is a made set that can be the rest of a finished piece and allows no last
 * bend; where the search backwards is too long to know one, a set made from the flat sheet that allows
 * no next one. Of many dead ends the first dozen are compared.
 */
export const nearestDeadEnd = (ground: BlockedGround): BlockedFold[] => {
  const backwards = findStops(ground, 'backwards')
  const { sets, blockedAt } = backwards.sets.length > 0 ? backwards : findStops(ground, 'forwards')
  let nearest: { readonly set: number; readonly overlap: number } | undefined
  for (const set of sets) {
    let below = nearest?.overlap ?? Infinity
    nearest ??= { set, overlap: below }
    for (const { made, bend } of blockedAt(set)) {
      const overlap = findBlockedFold(ground, made, bend, { below })?.overlap?.length ?? Infinity
      if (overlap >= below) continue
      below = overlap
      nearest = { set, overlap }
    }
  }
  if (nearest === undefined) return []
  return blockedAt(nearest.set)
    .flatMap(({ made, bend }) => findBlockedFold(ground, made, bend, { below: Infinity }) ?? [])
    .sort((a, b) => {
      const [one, other] = [a.overlap?.length ?? Infinity, b.overlap?.length ?? Infinity]
      return one === other ? a.bend.index - b.bend.index : one - other
    })
}
