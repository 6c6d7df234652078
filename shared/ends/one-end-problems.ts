import { angleToPiece, planeNormal } from '#shared/ends/cut-plane'
import type { EndProblem, EndProblemCode } from '#shared/ends/end-layout'
import type { Corner, CutPlane, End, Side } from '#shared/ends/end.schema'
import { cornerFrames } from '#shared/ends/run-frame'
import { isAtMost, isLess } from '#shared/geometry/tolerance'
import { degrees } from '#shared/geometry/vector'
import { dot3 } from '#shared/geometry/vector3'
import type { Degrees, Inches } from '#shared/units/brands'

/** A cut flatter than this runs along the piece; our figure, no shop cuts a point of 57 to 1. */
export const LEAST_CUT_ANGLE: Degrees = 1

/** A corner's plane stands at half its turn off square, so that both limits are one. */
const MOST_TURN: Degrees = 180 - 2 * LEAST_CUT_ANGLE

/** A problem that does not say yet which end it is of. */
export type FoundProblem = Omit<EndProblem, 'end'>

export const foundProblem = (
  code: EndProblemCode,
  found: Partial<FoundProblem> = {},
): FoundProblem => ({
  code,
  leg: null,
  found: null,
  limit: null,
  ...found,
})

const numbersOf = (plane: CutPlane): readonly number[] => {
  if ('plumb' in plane) return [plane.plumb]
  if ('normal' in plane) return plane.normal
  return [plane.corner.slopeIn, plane.corner.slopeOut, plane.corner.plan]
}

/** Degrees that a run of this slope lacks to plumb; where it is none, no cut can be square to it. */
const runProblem = (slope: Degrees): FoundProblem[] =>
  Math.abs(slope) < 90
    ? []
    : [foundProblem('planeAlongPiece', { found: 90 - Math.abs(slope), limit: LEAST_CUT_ANGLE })]

/** Of a corner whose turn seen from above is half a turn or more, that turn; else the run's own. */
const turnOf = (corner: Corner): Degrees => {
  if (Math.abs(corner.plan) >= 180) return Math.abs(corner.plan)
  const { into, outOf } = cornerFrames(corner)
  return degrees(Math.acos(Math.max(-1, Math.min(1, dot3(into, outOf)))))
}

const cornerProblems = (corner: Corner): FoundProblem[] => {
  const runs = [...runProblem(corner.slopeIn), ...runProblem(corner.slopeOut)]
  if (runs.length > 0) return runs.slice(0, 1)
  const turn = turnOf(corner)
  return isAtMost(turn, MOST_TURN)
    ? []
    : [foundProblem('cornerTurnsBack', { found: turn, limit: MOST_TURN })]
}

const planeProblems = (plane: CutPlane, side: Side, leg: number | null): FoundProblem[] => {
  const broken = numbersOf(plane).find((value) => !Number.isFinite(value))
  if (broken !== undefined) return [foundProblem('notFinite', { leg, found: broken })]
  if ('corner' in plane) return cornerProblems(plane.corner).map((found) => ({ ...found, leg }))
  if ('plumb' in plane && Math.abs(plane.plumb) >= 90) {
    return runProblem(plane.plumb).map((found) => ({ ...found, leg }))
  }
  const angle = angleToPiece(planeNormal(plane, side))
  return isLess(angle, LEAST_CUT_ANGLE)
    ? [foundProblem('planeAlongPiece', { leg, found: angle, limit: LEAST_CUT_ANGLE })]
    : []
}

/** Each number must name a leg there is, and each leg only once. */
const legProblems = (named: readonly number[], legs: number): FoundProblem[] =>
  named.flatMap((leg, index) => {
    if (!(Number.isInteger(leg) && leg >= 1 && leg <= legs)) {
      return [foundProblem('noSuchLeg', { leg, found: leg, limit: legs })]
    }
    return named.indexOf(leg) < index
      ? [foundProblem('legNamedTwice', { leg, found: leg, limit: 1 })]
      : []
  })

const lengthProblems = (
  code: EndProblemCode,
  leg: number | null,
  length: Inches,
  pieceLength: Inches,
): FoundProblem[] => {
  if (!(length > 0 && Number.isFinite(length))) {
    return [foundProblem('notFinite', { leg, found: length, limit: 0 })]
  }
  return isLess(length, pieceLength)
    ? []
    : [foundProblem(code, { leg, found: length, limit: pieceLength })]
}

/** A section is never turned more than once round. */
const MOST_LAY: Degrees = 360

const layProblems = (lay: Degrees): FoundProblem[] =>
  Math.abs(lay) <= MOST_LAY ? [] : [foundProblem('notFinite', { found: lay, limit: MOST_LAY })]

/** What is wrong with one end by itself, of a piece of so many legs and inches. */
export const oneEndProblems = (
  end: End,
  side: Side,
  legs: number,
  pieceLength: Inches,
): FoundProblem[] => [
  ...legProblems(
    end.tabs.map(({ leg }) => leg),
    legs,
  ),
  ...end.tabs.flatMap(({ leg, length }) =>
    lengthProblems('tabLongerThanPiece', leg, length, pieceLength),
  ),
  ...(end.kind === 'lap'
    ? lengthProblems('lapLongerThanPiece', null, end.length, pieceLength)
    : []),
  ...(end.kind === 'miter'
    ? [
        ...layProblems(end.lay),
        ...planeProblems(end.plane, side, null),
        ...legProblems(
          end.legs.map(({ leg }) => leg),
          legs,
        ),
        ...end.legs.flatMap(({ leg, plane }) => planeProblems(plane, side, leg)),
      ]
    : []),
]
