import type { Side, Tab } from '#shared/ends/end.schema'
import type { Inches } from '#shared/units/brands'

/** A line of the marking table: `at` from edge A across the strip, `along` from the end's square blank. */
export interface Mark {
  readonly at: Inches
  readonly along: Inches
  /** What stands there; a mark of each kind is measured and pricked the same way. */
  readonly of: 'edgeA' | 'edgeB' | 'crease'
  /** The crease's place in the strip's list, where it is one. */
  readonly crease: number | null
}

/** A point of the blank: `along` from its left end, `at` from edge A. */
export interface StripPoint {
  readonly along: Inches
  readonly at: Inches
}

export interface TabLayout extends Tab {
  /** Closed, without its first point again. */
  readonly polygon: readonly StripPoint[]
  /** The line the tab is folded on. */
  readonly fold: readonly [StripPoint, StripPoint]
}

export interface Slit {
  readonly from: StripPoint
  readonly to: StripPoint
}

/** A hem that is opened from the end, so that the next piece can enter. */
export interface HemOpening {
  readonly edge: 'A' | 'B'
  /** From the end into the piece. */
  readonly length: Inches
  /** How far the lip stands off its leg, clear. */
  readonly gap: Inches
}

/** One dressed end, ready to be laid out with a tape. */
export interface EndLayout {
  readonly side: Side
  /**
   * The cut from edge A to edge B, one mark for each edge and crease; under a tab the line it is
   * folded on. Reliefs of a lap are cut-aways and no part of it. The least `along` of cut and tabs
   * is 0.
   */
  readonly marks: readonly Mark[]
  readonly tabs: readonly TabLayout[]
  /** What is cut off the blank: the corners of a miter, the reliefs of a lap. Closed polygons. */
  readonly cutAways: readonly (readonly StripPoint[])[]
  readonly slits: readonly Slit[]
  readonly openings: readonly HemOpening[]
}

/** A piece's strip with both ends dressed. */
export interface StripLayout {
  /** The rectangle to shear: tip to tip, tabs included. */
  readonly blankLength: Inches
  readonly stripWidth: Inches
  /** What is left when everything is cut away; closed polygon, without its first point again. */
  readonly outline: readonly StripPoint[]
  readonly left: EndLayout
  readonly right: EndLayout
}

/** Everything that can be wrong with an end. The texts live in the locales, namespace `ends`. */
export const END_PROBLEM_CODES = [
  'profileFaulty',
  'noSuchLeg',
  'legNamedTwice',
  'notFinite',
  'planeAlongPiece',
  'cornerTurnsBack',
  'lapLongerThanPiece',
  'tabLongerThanPiece',
  'endsMeet',
] as const

export type EndProblemCode = (typeof END_PROBLEM_CODES)[number]

/**
 * Why an end cannot be cut; what `found` and `limit` are, and their unit:
 *
 * - `profileFaulty`: the profile has no strip to lay out; `profileProblems` says why. None.
 * - `noSuchLeg`, `legNamedTwice`: the leg's number; the number of legs, of times it may stand (1).
 * - `notFinite`: the value, which is no number; null. Of a length also one that is not above its
 *   limit, 0; of a lay one beyond its limit, 360.
 * - `planeAlongPiece`: degrees between the plane and the piece; the least there may be.
 * - `cornerTurnsBack`: degrees that the run turns in the corner, of a turn in plan of 180
 *   and more that turn; the most.
 * - `lapLongerThanPiece`, `tabLongerThanPiece`: inches; the piece's length.
 * - `endsMeet`: inches that both cuts together take off the blank at one place; the blank's length.
 */
export interface EndProblem {
  readonly code: EndProblemCode
  readonly end: Side
  readonly leg: number | null
  readonly found: number | null
  readonly limit: number | null
}
