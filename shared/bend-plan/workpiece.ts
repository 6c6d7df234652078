import type { Fold } from '#shared/strip/strip.schema'
import type { Degrees, Inches } from '#shared/units/brands'
import type { Section } from './plan.schema'
import type { SectionHem } from './section'

/** A hem up to this gap counts as flat sheet once it is made. */
export const CLOSED_GAP = 0.06

/** Turns below this merge their two legs. Degrees. */
const NO_TURN = 1e-6

/** Sets of bends are bits of a 32-bit integer, and costs are packed on the same ground. */
const MOST_BENDS = 26

export interface PieceHem {
  readonly lip: Inches
  readonly gap: Inches
  readonly open: boolean
}

export interface PieceBend {
  /** Place in the walk from edge A; its bit in a made set. */
  readonly index: number
  readonly fold: Fold
  /** Signed; ±180 for a hem. */
  readonly turn: Degrees
  readonly hem: PieceHem | null
}

/**
 * A section as one row of bends and legs in the walk from A to B, hems among the bends and lips
 * among the legs: `legs[i]` lies between `bends[i - 1]` and `bends[i]`.
 */
export interface Workpiece {
  readonly bends: readonly PieceBend[]
  readonly legs: readonly Inches[]
  readonly thickness: Inches
  /** Developed width: all legs and lips, made or not. */
  readonly width: Inches
}

/** A side of a bend line, named by the edge that lies on it. */
export type Side = 'A' | 'B'

const hemBend = (index: number, fold: 'hemA' | 'hemB', hem: SectionHem): PieceBend => ({
  index,
  fold,
  turn: 180 * hem.turn,
  hem: { lip: hem.lip, gap: hem.gap, open: hem.gap > CLOSED_GAP },
})

/** Throws RangeError where turns and legs do not match or there are more bends than the planner takes. */
export const workpieceOf = (section: Section, thickness: Inches): Workpiece => {
  const { legs: given, turns, hemA, hemB } = section
  const [first, ...rest] = given
  if (first === undefined || turns.length !== rest.length) {
    throw new RangeError(`A section of ${given.length} legs has ${given.length - 1} turns.`)
  }
  const bends: PieceBend[] = []
  const legs: Inches[] = []
  if (hemA !== null) {
    bends.push(hemBend(0, 'hemA', hemA))
    legs.push(hemA.lip)
  }
  let leg = first
  rest.forEach((next, i) => {
    const turn = turns[i] ?? 0
    if (Math.abs(turn) < NO_TURN) {
      leg += next
      return
    }
    legs.push(leg)
    bends.push({ index: bends.length, fold: i + 1, turn, hem: null })
    leg = next
  })
  legs.push(leg)
  if (hemB !== null) {
    bends.push(hemBend(bends.length, 'hemB', hemB))
    legs.push(hemB.lip)
  }
  if (bends.length > MOST_BENDS) {
    throw new RangeError(`${bends.length} bends are more than the ${MOST_BENDS} the planner takes.`)
  }
  return {
    bends,
    legs,
    thickness,
    width: legs.reduce((sum, each) => sum + each, 0),
  }
}

/** The set of all bends. */
export const allBends = (piece: Workpiece): number => 2 ** piece.bends.length - 1

/** The closed hems, as a set. */
export const closedHemsOf = (piece: Workpiece): number =>
  piece.bends.reduce(
    (set, { hem, index }) => (hem === null || hem.open ? set : set | (1 << index)),
    0,
  )

/** The bends on one side of a bend line, as a set. */
export const bendsBeside = (piece: Workpiece, bend: PieceBend, side: Side): number => {
  const towardsA = 2 ** bend.index - 1
  return side === 'A' ? towardsA : allBends(piece) - towardsA - 2 ** bend.index
}

/** Developed width of one side: all its legs and lips, made or not. */
export const widthBeside = (piece: Workpiece, bend: PieceBend, side: Side): Inches =>
  (side === 'A' ? piece.legs.slice(0, bend.index + 1) : piece.legs.slice(bend.index + 1)).reduce(
    (sum, leg) => sum + leg,
    0,
  )
