import type { CutEdge, LegClosing } from '#shared/ends/closing-edges'
import { closeEdges } from '#shared/ends/closing-edges'
import { endCut } from '#shared/ends/end-cut'
import type { EndProblem } from '#shared/ends/end-layout'
import type { Corner, CutPlane, End } from '#shared/ends/end.schema'
import type { EndOfPiece } from '#shared/ends/folded-end'
import { hasStrip } from '#shared/ends/mark-places'
import { foundProblem, oneEndProblems } from '#shared/ends/one-end-problems'
import type { RunFrame } from '#shared/ends/run-frame'
import { cornerFrames } from '#shared/ends/run-frame'
import { isEqual } from '#shared/geometry/tolerance'
import type { Vector3 } from '#shared/geometry/vector3'
import { add3, scale3 } from '#shared/geometry/vector3'

export type ClosedEnds =
  | {
      readonly ok: true
      readonly corner: Corner
      /**
       * How far the second piece is moved in the world (`cornerFrames`) from where its corner's
       * point lies on the first one's; none, unless more of the cut closes elsewhere.
       */
      readonly shift: Vector3
      /** Legs of the first piece and of the second, each from edge A. */
      readonly a: readonly LegClosing[]
      readonly b: readonly LegClosing[]
      /** Every leg of either closes on one of the other. */
      readonly closes: boolean
    }
  | {
      readonly ok: false
      /**
       * `sameSide`: two left or two right ends never meet. `noCorner`: neither end names a corner,
       * so that how the pieces lie to each other is not known. `cornersDiffer`: they name two.
       * `endFaulty`: an end cannot be cut, see `problems`.
       */
      readonly code: 'sameSide' | 'noCorner' | 'cornersDiffer' | 'endFaulty'
      readonly problems: readonly EndProblem[]
    }

const planesOf = (end: End): readonly CutPlane[] =>
  end.kind === 'miter' ? [end.plane, ...end.legs.map(({ plane }) => plane)] : []

const cornersOf = (end: End): Corner[] =>
  planesOf(end).flatMap((plane) => ('corner' in plane ? [plane.corner] : []))

const sameCorner = (a: Corner, b: Corner): boolean =>
  isEqual(a.slopeIn, b.slopeIn) && isEqual(a.slopeOut, b.slopeOut) && isEqual(a.plan, b.plan)

/** Two plumb cuts meet in one vertical plane: runs of these slopes with no turn between them. */
const plumbCorner = (entering: End, leaving: End): Corner[] => {
  const slopes = [entering, leaving].flatMap((end) =>
    end.kind === 'miter' && 'plumb' in end.plane ? [end.plane.plumb] : [],
  )
  const [slopeIn, slopeOut] = slopes
  return slopeIn === undefined || slopeOut === undefined ? [] : [{ slopeIn, slopeOut, plan: 0 }]
}

const inWorld = ({ x, y, z }: Vector3, { t, u, v }: RunFrame): Vector3 =>
  add3(add3(scale3(t, x), scale3(u, y)), scale3(v, z))

const cutEdges = ({ profile, sheet, end, side }: EndOfPiece, frame: RunFrame): CutEdge[] =>
  endCut(profile, sheet, end, side).runs.flatMap(({ of, from, to }) =>
    typeof of === 'number' ? [{ leg: of, from: inWorld(from, frame), to: inWorld(to, frame) }] : [],
  )

const faultsOf = ({ profile, sheet, end, side }: EndOfPiece): EndProblem[] =>
  (hasStrip(profile, sheet)
    ? oneEndProblems(end, side, profile.legs.length, Infinity)
    : [foundProblem('profileFaulty')]
  ).map((found) => ({ ...found, end: side }))

const refused = (
  code: Extract<ClosedEnds, { ok: false }>['code'],
  problems: readonly EndProblem[] = [],
): ClosedEnds => ({ ok: false, code, problems })

/**
 * Places two folded pieces in the corner where they meet and says of each leg's cut edge on which
 * leg of the other piece it closes (`CLOSING_GAP` apart or nearer), and how wide the gap is where
 * it does not. One piece comes with its right end (it enters), the other leaves with its left end.
 * Edges are compared on the middle of the sheets' thickness, lips left out. Inches.
 *
 * The pieces lie with their corner's points (see `endCut`) on each other, or where more of the cut
 * closes, see `shift`. The corner is the one that the planes name; two plumb cuts make one without
 * a turn. What cannot be placed or cut is refused by code. Never throws.
 */
export const closeEnds = (a: EndOfPiece, b: EndOfPiece): ClosedEnds => {
  if (a.side === b.side) return refused('sameSide')
  const problems = [...faultsOf(a), ...faultsOf(b)]
  if (problems.length > 0) return refused('endFaulty', problems)
  const [entering, leaving] = a.side === 'right' ? [a, b] : [b, a]
  const named = [...cornersOf(a.end), ...cornersOf(b.end)]
  const [corner, ...others] = named.length > 0 ? named : plumbCorner(entering.end, leaving.end)
  if (corner === undefined) return refused('noCorner')
  if (!others.every((other) => sameCorner(corner, other))) return refused('cornersDiffer')
  const frames = cornerFrames(corner)
  const closed = closeEdges(cutEdges(a, frames[a.side]), cutEdges(b, frames[b.side]))
  const closes = [...closed.a, ...closed.b].every(({ closesOn }) => closesOn !== null)
  return { ok: true, corner, ...closed, closes }
}
