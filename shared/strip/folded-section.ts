import type { Bounds } from '#shared/geometry/bounds'
import { boundsOf } from '#shared/geometry/bounds'
import { isLess } from '#shared/geometry/tolerance'
import type { Vector } from '#shared/geometry/vector'
import { add, heading, scale, vector } from '#shared/geometry/vector'
import type { Profile } from '#shared/profile/profile.schema'
import type { FlatParts, FoldingSheet } from '#shared/strip/flat-parts'
import { flatParts } from '#shared/strip/flat-parts'
import type { RoundPart, StraightPart, WalkedPart } from '#shared/strip/section-walk'
import { offsetChain, walkSection } from '#shared/strip/section-walk'
import type { Degrees, Inches } from '#shared/units/brands'

export interface FoldedLeg {
  /** From 1 at edge A. */
  readonly leg: number
  /** The straight part on the middle of the sheet's thickness. */
  readonly from: Vector
  readonly to: Vector
  readonly heading: Degrees
  /** The same line lengthened to where the outside dimension begins and ends. */
  readonly outsideFrom: Vector
  readonly outsideTo: Vector
}

export interface FoldedBend {
  /** From 1 at edge A. */
  readonly bend: number
  readonly turn: Degrees
  /** Center of the bend's arcs. */
  readonly center: Vector
  /** Where the middle lines of the legs on either side would meet. */
  readonly corner: Vector
  /** The middle of the bend on the middle of the thickness. */
  readonly mid: Vector
}

export interface FoldedHem {
  readonly turn: Degrees
  readonly center: Vector
  /** The lip's straight part on the middle of the thickness, from A to B. */
  readonly lipFrom: Vector
  readonly lipTo: Vector
  /** Faces of fold and lip, from A to B. */
  readonly leftFace: readonly Vector[]
  readonly rightFace: readonly Vector[]
}

export interface FoldedSection {
  /** The closed border of the metal: the left face from A to B, the right face back. */
  readonly outline: readonly Vector[]
  readonly leftFace: readonly Vector[]
  readonly rightFace: readonly Vector[]
  readonly legs: readonly FoldedLeg[]
  readonly bends: readonly FoldedBend[]
  readonly hems: { readonly A: FoldedHem | null; readonly B: FoldedHem | null }
  /** Middle of the raw edges; with a hem the raw edge is the lip's. */
  readonly edges: { readonly A: Vector; readonly B: Vector }
  readonly bounds: Bounds
}

/** At most 5 degrees a chord and half a thousandth of an inch off the arc. */
const FLATNESS = { maxStep: 5, tolerance: 0.0005 }

const refuseShortRuns = ({ runs }: FlatParts): void => {
  const short = runs.find((run) => isLess(run.straight, 0))
  if (short !== undefined) {
    throw new RangeError(
      `Run ${short.of} of ${short.outside} in. is ${Math.abs(short.straight)} in. shorter than its bends use up.`,
    )
  }
}

const walkTrue = (parts: FlatParts, thickness: Inches): WalkedPart[] => {
  const leg1 = parts.runs.findIndex((run) => run.of === 1)
  return walkSection(
    parts.runs,
    parts.folds.map(({ fold, turn, insideRadius }) => ({
      fold,
      turn,
      radius: insideRadius + thickness / 2,
    })),
    vector(parts.folds[leg1 - 1]?.setback ?? 0, 0),
  )
}

const foldedLegs = (walked: readonly WalkedPart[], { runs, folds }: FlatParts): FoldedLeg[] =>
  walked.flatMap((part) => {
    if (part.kind !== 'straight' || typeof part.of !== 'number') return []
    const index = runs.findIndex((run) => run.of === part.of)
    const along = heading(part.heading)
    return {
      leg: part.of,
      from: part.from,
      to: part.to,
      heading: part.heading,
      outsideFrom: add(part.from, scale(along, -1 * (folds[index - 1]?.setback ?? 0))),
      outsideTo: add(part.to, scale(along, folds[index]?.setback ?? 0)),
    }
  })

const foldedBends = (walked: readonly WalkedPart[]): FoldedBend[] =>
  walked.flatMap((part) => {
    if (part.kind !== 'round' || typeof part.fold !== 'number') return []
    const { turn, corner, mid } = part
    return { bend: part.fold, turn, center: part.arc.center, corner, mid }
  })

const foldedHem = (
  walked: readonly WalkedPart[],
  edge: 'A' | 'B',
  thickness: Inches,
): FoldedHem | null => {
  const isFold = (part: WalkedPart): part is RoundPart =>
    part.kind === 'round' && part.fold === `hem${edge}`
  const isLip = (part: WalkedPart): part is StraightPart =>
    part.kind === 'straight' && part.of === `lip${edge}`
  const fold = walked.find(isFold)
  const lip = walked.find(isLip)
  if (fold === undefined || lip === undefined) return null
  const parts = edge === 'A' ? [lip, fold] : [fold, lip]
  return {
    turn: fold.turn,
    center: fold.arc.center,
    lipFrom: lip.from,
    lipTo: lip.to,
    leftFace: offsetChain(parts, thickness / 2, FLATNESS),
    rightFace: offsetChain(parts, thickness / -2, FLATNESS),
  }
}

/**
 * The piece as folded, with its true thickness and round bends, in inches. Walked from edge A,
 * leg 1 heads along +x, y is up, a positive turn goes left; the origin lies on the middle of the
 * thickness where the outside dimension of leg 1 begins (edge A itself, or the outermost point of
 * hem A). Legs are outside dimensions, so the straight parts are shorter by the setbacks of
 * `outsideSetback`. Arcs are given as chords of at most 5 degrees.
 *
 * Throws a RangeError when a leg is shorter than its bends use up; whether the piece crosses
 * itself is not looked at here. Ask `profileProblems` first.
 */
export const foldedSection = (profile: Profile, sheet: FoldingSheet): FoldedSection => {
  const parts = flatParts(profile, sheet)
  refuseShortRuns(parts)
  const { thickness } = sheet
  const walked = walkTrue(parts, thickness)
  const leftFace = offsetChain(walked, thickness / 2, FLATNESS)
  const rightFace = offsetChain(walked, thickness / -2, FLATNESS)
  const outline = [...leftFace, ...rightFace.toReversed()]
  const first = walked[0]
  const last = walked.at(-1)
  if (first === undefined || last === undefined) throw new RangeError('A profile without legs.')
  return {
    outline,
    leftFace,
    rightFace,
    legs: foldedLegs(walked, parts),
    bends: foldedBends(walked),
    hems: { A: foldedHem(walked, 'A', thickness), B: foldedHem(walked, 'B', thickness) },
    edges: { A: first.from, B: last.to },
    bounds: boundsOf(outline),
  }
}
