import { TOLERANCE } from '#shared/geometry/tolerance'
import { crossingSteps } from '#shared/profile/crossing-cures'
import type { ProfileCure } from '#shared/profile/profile-cure'
import { isSlope } from '#shared/profile/follows'
import type { ProfileProblem } from '#shared/profile/problem'
import type { Follows, Hem, Profile } from '#shared/profile/profile.schema'
import type { Degrees, Inches } from '#shared/units/brands'
import { tapeStep } from '#shared/units/tape-step'

/** What a leg or lip without a length is given, and an open hem without a gap. Common practice, no source. */
const SHORT_LENGTHS: readonly Inches[] = [1 / 2, 1]
const OPEN_GAP: Inches = 1 / 8

const up = (inches: Inches): Inches => tapeStep(inches, 'up', 'fraction')
const down = (inches: Inches): Inches => tapeStep(inches, 'down', 'fraction')

/** A minus that slipped in is left out; nothing gets a short length. */
const positive = (length: Inches): Inches[] =>
  length < 0 ? [-length, ...SHORT_LENGTHS] : [...SHORT_LENGTHS]

const setLegs = (leg: number, lengths: readonly Inches[]): ProfileCure[] =>
  lengths.map((length) => ({ kind: 'setLeg', leg, length }))

/** A whole turn more or less is the same fold: 200 degrees to the left are 160 to the right. */
const turnWithin = (turn: Degrees): Degrees => turn - 360 * Math.round(turn / 360)

const turnEdits = ({ bends }: Profile, bend: number): ProfileCure[] => {
  const { turn, follows } = bends[bend - 1] ?? { turn: NaN }
  // The roof gives the angle; a turn of its own would cut the bend loose.
  if (follows || !Number.isFinite(turn)) return []
  return Math.abs(turn) <= TOLERANCE
    ? [{ kind: 'removeCorner', corner: bend }]
    : [{ kind: 'setTurn', bend, turn: turnWithin(turn) }]
}

/** Slopes that are none are left out: the job's and the same on both sides come in their place. */
const pitchEdits = ({ bends }: Profile, bend: number): ProfileCure[] => {
  const follows = bends[bend - 1]?.follows
  if (!follows) return []
  const { rule, pitch, second } = follows
  const kept: Follows = {
    rule,
    pitch: pitch === 'job' || isSlope(pitch) ? pitch : 'job',
    ...(second !== undefined && isSlope(second) ? { second } : {}),
  }
  return [
    { kind: 'setFollows', bend, follows: kept },
    { kind: 'setFollows', bend, follows: null },
  ]
}

const hemEdits = (
  profile: Profile,
  edge: 'A' | 'B',
  change: (hem: Hem) => readonly (Hem | null)[],
): ProfileCure[] => {
  const hem = edge === 'A' ? profile.hemA : profile.hemB
  return hem ? change(hem).map((changed) => ({ kind: 'setHem', edge, hem: changed })) : []
}

const closed = ({ length, turn }: Hem): Hem => ({ style: 'closed', length, turn })
const open = ({ length, turn }: Hem, gap: Inches): Hem => ({ style: 'open', length, gap, turn })

const longestFirst = ({ legs }: Profile): { readonly leg: number; readonly length: Inches }[] =>
  legs.map((length, index) => ({ leg: index + 1, length })).toSorted((a, b) => b.length - a.length)

/** Edits of a hem, by the problem it has. */
const hemCandidates = (
  profile: Profile,
  { code, found, limit, leg }: ProfileProblem,
  edge: 'A' | 'B',
): ProfileCure[] => {
  const of = (change: (hem: Hem) => readonly (Hem | null)[]) => hemEdits(profile, edge, change)
  switch (code) {
    case 'hemNotPositive':
      return of((hem) => [...positive(hem.length).map((length) => ({ ...hem, length })), null])
    case 'gapNotPositive':
      return of((hem) => [
        ...(hem.style === 'open' && hem.gap < 0 ? [open(hem, -hem.gap)] : []),
        open(hem, OPEN_GAP),
        closed(hem),
      ])
    case 'hemTooShort':
      return of((hem) => [{ ...hem, length: up(limit ?? 0) }, null])
    case 'hemTooLong':
      return [
        ...of((hem) => [{ ...hem, length: down(limit ?? 0) }]),
        ...setLegs(leg ?? 1, [
          up((profile.legs[(leg ?? 1) - 1] ?? 0) + (found ?? 0) - (limit ?? 0)),
        ]),
        ...of(() => [null]),
      ]
    case 'gapTight':
      return of((hem) => [open(hem, up(limit ?? 0)), closed(hem)])
    case 'hemBelowPaint':
      return of((hem) => [
        open(hem, up(2 * (limit ?? 0))),
        { ...hem, turn: hem.turn === 1 ? -1 : 1 },
      ])
    default:
      return []
  }
}

/**
 * Single edits that may cure a problem, the one that changes least of what was meant first; which
 * of them do is for the caller to try. None where no edit of the drawing can: a value that must be
 * typed, a radius that belongs to the stock.
 */
export const cureCandidates = (profile: Profile, problem: ProfileProblem): ProfileCure[] => {
  const { code, leg, bend, hem, found, limit } = problem
  if (code === 'crossesItself') return crossingSteps(profile, problem)
  if (hem !== null) return hemCandidates(profile, problem, hem)
  if (bend !== null) {
    switch (code) {
      case 'turnOutOfRange':
        return turnEdits(profile, bend)
      case 'followsIncomplete':
        return [{ kind: 'setFollows', bend, follows: null }]
      case 'pitchOutOfRange':
        return pitchEdits(profile, bend)
      default:
        return []
    }
  }
  switch (code) {
    case 'legNotPositive':
      return leg === null ? [] : setLegs(leg, positive(found ?? 0))
    case 'legEatenByBends':
      return leg === null
        ? []
        : setLegs(
            leg,
            [0, 1, 2, 4, 8].map((more) => up(limit ?? 0) + more / 16),
          )
    case 'stripTooWide':
    case 'stripWiderThanStock':
      return longestFirst(profile)
        .map((longest) => ({
          ...longest,
          length: down(longest.length + (limit ?? 0) - (found ?? 0)),
        }))
        .filter(({ length }) => length > 0)
        .flatMap((shorter) => setLegs(shorter.leg, [shorter.length]))
    default:
      return []
  }
}
