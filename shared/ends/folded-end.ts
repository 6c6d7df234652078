import type { CutRun } from '#shared/ends/end-cut'
import { endCut } from '#shared/ends/end-cut'
import type { End, Side } from '#shared/ends/end.schema'
import { hasStrip } from '#shared/ends/mark-places'
import { oneEndProblems } from '#shared/ends/one-end-problems'
import type { Vector3 } from '#shared/geometry/vector3'
import { vector3 } from '#shared/geometry/vector3'
import type { Profile } from '#shared/profile/profile.schema'
import type { FlatRun, FoldingSheet } from '#shared/strip/flat-parts'
import type { Inches } from '#shared/units/brands'

/** One end of a piece, folded. */
export interface EndOfPiece {
  readonly profile: Profile
  readonly sheet: FoldingSheet
  readonly end: End
  readonly side: Side
}

/** A leg or lip near the end, flat, on the middle of the sheet's thickness. */
export interface FoldedFace {
  readonly of: FlatRun['of']
  /** x = t, y = u, z = v in the piece's frame; closed, without its first point again. */
  readonly polygon: readonly Vector3[]
  /** The cut edge, the way from edge A to edge B. */
  readonly cut: readonly [Vector3, Vector3]
}

/** An under lap leaves a hem's lip out for its length. */
const lipSetBack = ({ of }: CutRun, end: End): Inches =>
  typeof of !== 'number' && end.kind === 'lap' && end.side === 'under' ? end.length : 0

const moved = (point: Vector3, along: Inches): Vector3 => vector3(point.x + along, point.y, point.z)

/**
 * The piece near one end as folded: a flat four-sided face for each leg and lip from edge A to edge
 * B, to sharp corners, in the piece's own frame with the corner's point at the origin. Inches. The
 * piece is broken off square, `stub` inches behind the deepest place of the cut (an under lap's
 * missing lips included). Tabs, the trim of an under lap's free edges and an over lap's opened hems
 * are not shown: they leave the cut as it is.
 *
 * Throws a RangeError for an end or a profile with problems (`endProblems`) or a stub that is not above 0.
 */
export const foldedEnd = (given: EndOfPiece & { readonly stub: Inches }): readonly FoldedFace[] => {
  const { profile, sheet, end, side, stub } = given
  if (!(stub > 0 && Number.isFinite(stub))) {
    throw new RangeError(`A stub of ${stub} in. shows nothing: give a length above 0.`)
  }
  if (!hasStrip(profile, sheet)) throw new RangeError('The profile has no strip to cut.')
  const [fault] = oneEndProblems(end, side, profile.legs.length, Infinity)
  if (fault) throw new RangeError(`The ${side} end cannot be cut: ${fault.code}.`)
  const inward = side === 'right' ? -1 : 1
  const cuts = endCut(profile, sheet, end, side).runs.map((run) => {
    const back = inward * lipSetBack(run, end)
    return { of: run.of, from: moved(run.from, back), to: moved(run.to, back) }
  })
  const deepest = Math.max(...cuts.flatMap(({ from, to }) => [inward * from.x, inward * to.x]))
  const broken = inward * (deepest + stub)
  return cuts.map(({ of, from, to }) => ({
    of,
    polygon: [vector3(broken, from.y, from.z), from, to, vector3(broken, to.y, to.z)],
    cut: [from, to],
  }))
}
