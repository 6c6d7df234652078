import { isEqual } from '#shared/geometry/tolerance'
import { add, degrees, rotate, subtract, type Vector, vector } from '#shared/geometry/vector'
import { applyEdit, type ProfileEdit } from '#shared/profile/edits'
import { profileCorners, profileFromCorners } from '#shared/profile/corners'
import type { Profile } from '#shared/profile/profile.schema'
import type { Degrees } from '#shared/units/brands'

/**
 * What is drawn: the profile and how it lies on the drawing sheet. The profile itself knows no
 * up or down; the placement keeps the figure where the person drew it.
 */
export interface BoardDocument {
  /** Null until the first leg is drawn. */
  readonly profile: Profile | null
  readonly placement: Placement
  /** True once edge A has been put down, though no leg leaves it yet. */
  readonly started: boolean
}

export interface Placement {
  /** Edge A on the sheet. */
  readonly origin: Vector
  /** Where leg 1 heads, counter-clockwise from the right. */
  readonly heading: Degrees
}

export type Edge = 'A' | 'B'

/** The legs drawn on an empty board take this for all that has not been said yet. */
export const BLANK_PROFILE: Profile = {
  version: 1,
  legs: [1],
  bends: [],
  hemA: null,
  hemB: null,
  colorSide: 'left',
}

export const EMPTY_BOARD: BoardDocument = {
  profile: null,
  placement: { origin: vector(0, 0), heading: 0 },
  started: false,
}

/** The profile on an empty sheet; leg 1 heads to the right unless said. */
export const boardOf = (profile: Profile, heading: Degrees = 0): BoardDocument => ({
  profile,
  placement: { origin: vector(0, 0), heading },
  started: true,
})

/** The corners on the sheet from edge A to edge B: as many as legs and one more, or only A, or none. */
export function cornersOf({ profile, placement, started }: BoardDocument): Vector[] {
  if (profile === null) return started ? [placement.origin] : []
  return profileCorners(profile).map((corner) =>
    add(placement.origin, rotate(corner, placement.heading)),
  )
}

/** The document whose corners these are; hems and color side stay. */
export function withCorners(document: BoardDocument, corners: readonly Vector[]): BoardDocument {
  const [first, second] = corners
  if (first === undefined) return { ...EMPTY_BOARD }
  if (second === undefined)
    return { profile: null, placement: { origin: first, heading: 0 }, started: true }
  const along = subtract(second, first)
  return {
    profile: tidy(profileFromCorners(corners, document.profile ?? BLANK_PROFILE)),
    placement: { origin: first, heading: degrees(Math.atan2(along.y, along.x)) },
    started: true,
  }
}

/** Takes the rounding of sines and roots off numbers that were snapped to a round value. */
const tidyNumber = (value: number): number => {
  const round = Math.round(value * 1e6) / 1e6
  return isEqual(round, value) ? round : value
}

const tidy = (profile: Profile): Profile => ({
  ...profile,
  legs: profile.legs.map(tidyNumber),
  bends: profile.bends.map((bend) => ({ ...bend, turn: tidyNumber(bend.turn) })),
})

export const moveCorner = (document: BoardDocument, index: number, to: Vector): BoardDocument =>
  withCorners(document, cornersOf(document).with(index, to))

/** A new leg from an edge to a point; the first point of an empty board becomes edge A. */
export function addCorner(document: BoardDocument, edge: Edge, at: Vector): BoardDocument {
  const corners = cornersOf(document)
  return withCorners(document, edge === 'A' ? [at, ...corners] : [...corners, at])
}

/** The size of a leg that is added from the table, to be typed over; inches and degrees. */
const ADDED_LENGTH = 1
const ADDED_TURN = 90

/** A new leg at an edge; the first one where nothing is drawn yet. */
export function addLeg(document: BoardDocument, edge: Edge): BoardDocument {
  if (document.profile === null) return { ...boardOf({ ...BLANK_PROFILE, legs: [ADDED_LENGTH] }) }
  const edit = { kind: 'addLeg', edge, length: ADDED_LENGTH, turn: -ADDED_TURN } as const
  if (edge === 'B') return editProfile(document, edit)
  // Edge A moves out: the legs that were there stay where they lie.
  const before = cornersOf(document)[0] ?? document.placement.origin
  const heading = document.placement.heading + ADDED_TURN
  const radians = (heading * Math.PI) / 180
  const origin = vector(
    before.x - Math.cos(radians) * ADDED_LENGTH,
    before.y - Math.sin(radians) * ADDED_LENGTH,
  )
  return { ...editProfile(document, edit), placement: { origin, heading } }
}

/** Without a corner: the legs beside it become one; at an edge its leg goes. */
export const removeCorner = (document: BoardDocument, index: number): BoardDocument =>
  withCorners(
    document,
    cornersOf(document).filter((_, at) => at !== index),
  )

/** A new corner in the middle of a leg (1 at edge A), so far without a turn worth the name. */
export function splitLeg(document: BoardDocument, leg: number): BoardDocument {
  const corners = cornersOf(document)
  const from = corners[leg - 1]
  const to = corners[leg]
  if (from === undefined || to === undefined) return document
  // A straight corner would be no bend: it is lifted to the left so that it makes one of 15 degrees.
  const along = subtract(to, from)
  const lift = Math.tan((7.5 * Math.PI) / 180) / 2
  const middle = vector(
    from.x + along.x / 2 - along.y * lift,
    from.y + along.y / 2 + along.x * lift,
  )
  return withCorners(document, corners.toSpliced(leg, 0, middle))
}

/** An edit of the profile that leaves the figure where it lies. */
export function editProfile(document: BoardDocument, edit: ProfileEdit): BoardDocument {
  if (document.profile === null) return document
  return { ...document, profile: applyEdit(document.profile, edit) }
}

/** Walked from the other edge: what was A is B, and the picture stays the same. */
export function reverseWalk(document: BoardDocument): BoardDocument {
  if (document.profile === null) return document
  const corners = cornersOf(document)
  const from = corners.at(-1)
  const to = corners.at(-2)
  if (from === undefined || to === undefined) return document
  const along = subtract(to, from)
  return {
    ...document,
    profile: applyEdit(document.profile, { kind: 'reverse' }),
    placement: { origin: from, heading: degrees(Math.atan2(along.y, along.x)) },
  }
}
