import type { Vector } from '#shared/geometry/vector'
import { add, heading, leftOf, radians, rotate, scale, subtract } from '#shared/geometry/vector'
import type { Profile } from '#shared/profile/profile.schema'
import type { FlatFold, FlatParts, FlatRun, FoldingSheet } from '#shared/strip/flat-parts'
import { flatParts } from '#shared/strip/flat-parts'
import type { Degrees, Inches } from '#shared/units/brands'

/** A leg or lip as one straight line on the middle of the sheet's thickness, to sharp corners. */
export interface CenterRun {
  readonly of: FlatRun['of']
  readonly from: Vector
  readonly to: Vector
}

/** The section on the middle of the thickness, from edge A to edge B. */
export interface CenterLine {
  readonly runs: readonly CenterRun[]
  /** A point for edge A, for each crease and for edge B; of a hem's fold the middle of its arc. */
  readonly marks: readonly Vector[]
}

const isHem = ({ fold }: FlatFold): boolean => typeof fold !== 'number'

/**
 * How far a line on the middle of the thickness goes on beyond its straight part: to the sharp
 * corner, (R + T/2) tan(|turn| / 2); to the outermost point of a hem's fold, R + T/2.
 */
const centerReach = (fold: FlatFold | undefined): Inches => {
  if (fold === undefined) return 0
  const radius = fold.insideRadius + fold.thickness / 2
  return isHem(fold) ? radius : radius * Math.tan(radians(Math.abs(fold.turn) / 2))
}

/** The lengths of lips and legs on the middle of the thickness to sharp corners, from edge A. */
export const centerLengths = ({ runs, folds }: FlatParts): Inches[] =>
  runs.map(
    ({ straight }, index) => straight + centerReach(folds[index - 1]) + centerReach(folds[index]),
  )

/** From the outermost point of a leg or lip with a hem across to the other of the two. */
const acrossHem = (fold: FlatFold, along: Vector): Vector =>
  scale(leftOf(along), Math.sign(fold.turn) * (2 * fold.insideRadius + fold.thickness))

/**
 * The section as lines on the middle of the thickness: legs to sharp corners, each hem's lip beside
 * its leg as folded (a closed one lies on the leg, one thickness apart). Inches; leg 1 begins at the
 * origin (edge A, or the outermost point of hem A) and makes the angle `lay` with x, y is up, a
 * positive turn goes left.
 *
 * Nothing is checked here: ask `profileProblems` whether the piece can exist. Throws a RangeError
 * for a profile without legs.
 */
export const centerLine = (profile: Profile, sheet: FoldingSheet, lay: Degrees = 0): CenterLine => {
  const parts = flatParts(profile, sheet)
  const { folds } = parts
  const lengths = centerLengths(parts)
  const runs: CenterRun[] = []
  const folded: Vector[] = []
  let at: Vector = { x: 0, y: 0 }
  // Turned step by step from leg 1, so that a hem's half turn leaves no rounding behind.
  let along = heading(parts.runs[0]?.of === 'lipA' ? lay + 180 : lay)
  parts.runs.forEach((run, index) => {
    const from = at
    at = add(at, scale(along, lengths[index] ?? 0))
    runs.push({ of: run.of, from, to: at })
    const fold = folds[index]
    if (fold === undefined) return
    if (isHem(fold)) {
      const across = acrossHem(fold, along)
      const middle = add(at, scale(across, 0.5))
      folded.push(middle)
      at = add(at, across)
      along = scale(along, -1)
    } else {
      folded.push(at)
      along = rotate(along, fold.turn)
    }
  })
  const first = runs[0]
  const leg1 = runs.find((run) => run.of === 1)
  if (first === undefined || leg1 === undefined) throw new RangeError('A profile without legs.')
  const placed = (point: Vector): Vector => subtract(point, leg1.from)
  return {
    runs: runs.map(({ of, from, to }) => ({ of, from: placed(from), to: placed(to) })),
    marks: [first.from, ...folded, at].map(placed),
  }
}
