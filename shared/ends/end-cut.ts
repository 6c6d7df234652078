import type { CutSlope } from '#shared/ends/cut-plane'
import { cutSlope, SQUARE_CUT } from '#shared/ends/cut-plane'
import type { End, Side } from '#shared/ends/end.schema'
import type { Vector } from '#shared/geometry/vector'
import type { Vector3 } from '#shared/geometry/vector3'
import { vector3 } from '#shared/geometry/vector3'
import type { Profile } from '#shared/profile/profile.schema'
import type { CenterRun } from '#shared/strip/center-line'
import { centerLine } from '#shared/strip/center-line'
import type { FlatRun, FoldingSheet } from '#shared/strip/flat-parts'
import type { Inches } from '#shared/units/brands'

/** The cut edge of a leg or lip, folded: x = t, y = u, z = v in the piece's frame. */
export interface CutRun {
  readonly of: FlatRun['of']
  readonly from: Vector3
  readonly to: Vector3
}

export interface EndCut {
  /** From edge A to edge B; the corner's point is the origin. */
  readonly runs: readonly CutRun[]
  /** The t of edge A, of each crease and of edge B. */
  readonly marks: readonly Inches[]
}

/** A cut over a run: t = slope · (u, v) + offset. */
interface RunCut {
  readonly slope: CutSlope
  readonly offset: Inches
}

const reach = (slope: CutSlope, point: Vector): Inches => slope.u * point.x + slope.v * point.y

const tOf = ({ slope, offset }: RunCut, point: Vector): Inches => reach(slope, point) + offset

/** The leg that a run is cut with: a lip is cut with the leg it lies on. */
export const legOf = (of: FlatRun['of'], legs: number): number =>
  of === 'lipA' ? 1 : of === 'lipB' ? legs : of

/** The slope of each leg's cut: its own plane's, else the end's. */
const slopesOf = (end: End, side: Side): ((leg: number) => CutSlope) => {
  if (end.kind !== 'miter') return () => SQUARE_CUT
  const common = cutSlope(end.plane, side)
  const own = new Map(end.legs.map(({ leg, plane }) => [leg, cutSlope(plane, side)]))
  return (leg) => own.get(leg) ?? common
}

/** One continuous chain: where a leg has a plane of its own, the cut goes on from where it arrives. */
const chain = (runs: readonly CenterRun[], slopes: readonly CutSlope[]): RunCut[] => {
  let offset = 0
  return runs.map((run, index) => {
    const slope = slopes[index] ?? SQUARE_CUT
    const before = slopes[index - 1] ?? slope
    if (before !== slope) offset += reach(before, run.from) - reach(slope, run.from)
    return { slope, offset }
  })
}

/**
 * The run at whose start the corner's point lies: the first leg that the end's own plane cuts, and
 * leg 1 where every leg has another.
 */
const cornerRun = (runs: readonly CenterRun[], end: End): number => {
  const own = new Set(end.kind === 'miter' ? end.legs.map(({ leg }) => leg) : [])
  const first = runs.findIndex(({ of }) => typeof of === 'number' && !own.has(of))
  return first >= 0 ? first : runs.findIndex(({ of }) => of === 1)
}

/**
 * Where the planes of an end cut the folded section, in inches on the middle of the sheet's
 * thickness. The corner's point is the start of the first leg that the end's own plane cuts (edge
 * A, the outermost point of a hem there, or a sharp corner). Each leg is cut by its own plane or
 * the end's; a leg's cut goes on from where the leg before it was left.
 *
 * Nothing is checked here: ask `endProblems` first.
 */
export const endCut = (profile: Profile, sheet: FoldingSheet, end: End, side: Side): EndCut => {
  const line = centerLine(profile, sheet, end.kind === 'miter' ? end.lay : 0)
  const slopeOf = slopesOf(end, side)
  const cuts = chain(
    line.runs,
    line.runs.map(({ of }) => slopeOf(legOf(of, profile.legs.length))),
  )
  const corner = cornerRun(line.runs, end)
  const cornerPoint = line.runs[corner]?.from ?? { x: 0, y: 0 }
  const cornerCut = cuts[corner] ?? { slope: SQUARE_CUT, offset: 0 }
  const cornerT = tOf(cornerCut, cornerPoint)
  const tAt = (run: number, point: Vector): Inches => {
    const cut = cuts[run]
    return cut === undefined ? 0 : tOf(cut, point) - cornerT
  }
  const placed = (run: number, point: Vector): Vector3 =>
    vector3(tAt(run, point), point.x - cornerPoint.x, point.y - cornerPoint.y)
  return {
    runs: line.runs.map(({ of, from, to }, index) => ({
      of,
      from: placed(index, from),
      to: placed(index, to),
    })),
    marks: line.marks.map((point, index) => tAt(Math.min(index, line.runs.length - 1), point)),
  }
}
