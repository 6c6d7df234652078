import type { Vector } from '#shared/geometry/vector'
import { profileCorners, profileFromCorners } from '#shared/profile/corners'
import { flipColorSide, mirrorProfile, reverseProfile } from '#shared/profile/flips'
import type { ColorSide, Follows, Hem, Profile } from '#shared/profile/profile.schema'
import type { Degrees, Inches } from '#shared/units/brands'

/**
 * Everything that can be done to a profile. Legs and bends count from 1 at edge A; corners from 0
 * (edge A) to the number of legs (edge B), as in `profileCorners`. Inches and degrees.
 */
export type ProfileEdit =
  | { readonly kind: 'setLeg'; readonly leg: number; readonly length: Inches }
  /** Sets the turn by hand: the bend no longer follows the roof. */
  | { readonly kind: 'setTurn'; readonly bend: number; readonly turn: Degrees }
  /** Ties a bend to the roof or sets it free; `resolveFollows` then gives the turn. */
  | { readonly kind: 'setFollows'; readonly bend: number; readonly follows: Follows | null }
  /** A new leg outside the edge; the edge's hem moves out with it. */
  | {
      readonly kind: 'addLeg'
      readonly edge: 'A' | 'B'
      readonly length: Inches
      readonly turn: Degrees
    }
  /** A new bend on a leg, `at` inches from the leg's start on the side of edge A. */
  | {
      readonly kind: 'splitLeg'
      readonly leg: number
      readonly at: Inches
      readonly turn: Degrees
    }
  /** The two legs beside a corner become one straight leg; an end corner takes its leg away. */
  | { readonly kind: 'removeCorner'; readonly corner: number }
  /** `to` in the frame of `profileCorners`. Changes the legs beside the corner and the turns at both their ends. */
  | { readonly kind: 'moveCorner'; readonly corner: number; readonly to: Vector }
  | { readonly kind: 'setHem'; readonly edge: 'A' | 'B'; readonly hem: Hem | null }
  | { readonly kind: 'setColorSide'; readonly colorSide: ColorSide }
  | { readonly kind: 'flipColorSide' }
  | { readonly kind: 'reverse' }
  | { readonly kind: 'mirror' }

const checkPlace = (name: string, place: number, first: number, last: number): void => {
  if (!Number.isInteger(place) || place < first || place > last) {
    throw new RangeError(`There is no ${name} ${place}; they run from ${first} to ${last}.`)
  }
}

const addLeg = (profile: Profile, edge: 'A' | 'B', leg: Inches, turn: Degrees): Profile =>
  edge === 'A'
    ? { ...profile, legs: [leg, ...profile.legs], bends: [{ turn }, ...profile.bends] }
    : { ...profile, legs: [...profile.legs, leg], bends: [...profile.bends, { turn }] }

const splitLeg = (profile: Profile, leg: number, at: Inches, turn: Degrees): Profile => {
  const length = profile.legs[leg - 1] ?? 0
  return {
    ...profile,
    legs: profile.legs.toSpliced(leg - 1, 1, at, length - at),
    bends: profile.bends.toSpliced(leg - 1, 0, { turn }),
  }
}

const removeCorner = (profile: Profile, corner: number): Profile => {
  if (profile.legs.length === 1) throw new RangeError('The last leg cannot be taken away.')
  // What stays comes first in line with its old numbers, so that it keeps them exactly.
  const leg = Math.min(corner, profile.legs.length - 1)
  const bend = Math.min(Math.max(corner - 1, 0), profile.bends.length - 1)
  const rest = {
    ...profile,
    legs: profile.legs.toSpliced(leg, 1),
    bends: profile.bends.toSpliced(bend, 1),
  }
  return profileFromCorners(profileCorners(profile).toSpliced(corner, 1), rest)
}

/**
 * The profile after an edit; the given one is left alone. The result may have problems (a leg of
 * no length, a crossing): `profileProblems` tells. Throws RangeError for a leg, bend or corner
 * that the profile does not have, and for taking away its last leg.
 */
export const applyEdit = (profile: Profile, edit: ProfileEdit): Profile => {
  const legCount = profile.legs.length
  switch (edit.kind) {
    case 'setLeg':
      checkPlace('leg', edit.leg, 1, legCount)
      return { ...profile, legs: profile.legs.with(edit.leg - 1, edit.length) }
    case 'setTurn':
      checkPlace('bend', edit.bend, 1, legCount - 1)
      return { ...profile, bends: profile.bends.with(edit.bend - 1, { turn: edit.turn }) }
    case 'setFollows': {
      checkPlace('bend', edit.bend, 1, legCount - 1)
      const turn = profile.bends[edit.bend - 1]?.turn ?? 0
      const bend = edit.follows ? { turn, follows: edit.follows } : { turn }
      return { ...profile, bends: profile.bends.with(edit.bend - 1, bend) }
    }
    case 'addLeg':
      return addLeg(profile, edit.edge, edit.length, edit.turn)
    case 'splitLeg':
      checkPlace('leg', edit.leg, 1, legCount)
      return splitLeg(profile, edit.leg, edit.at, edit.turn)
    case 'removeCorner':
      checkPlace('corner', edit.corner, 0, legCount)
      return removeCorner(profile, edit.corner)
    case 'moveCorner':
      checkPlace('corner', edit.corner, 0, legCount)
      return profileFromCorners(profileCorners(profile).with(edit.corner, edit.to), profile)
    case 'setHem':
      return edit.edge === 'A' ? { ...profile, hemA: edit.hem } : { ...profile, hemB: edit.hem }
    case 'setColorSide':
      return { ...profile, colorSide: edit.colorSide }
    case 'flipColorSide':
      return flipColorSide(profile)
    case 'reverse':
      return reverseProfile(profile)
    case 'mirror':
      return mirrorProfile(profile)
  }
}
