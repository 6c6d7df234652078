import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { Degrees, Inches } from '#shared/units/brands'
import type { PlanCure, PlanReason } from '../plan.schema'
import type { CureEdit } from './cure-edit.schema'

/** One change to try: the cure as it would be offered, and how much it asks for. */
export interface CureStep extends PlanCure {
  readonly edit: CureEdit
  /** For the order in which cures are tried and offered: inches, or what counts as much. */
  readonly size: Inches
}

/** Ever larger changes of one thing; once one of them bends, the larger ones are not looked at. */
export type Ladder = readonly CureStep[]

const EIGHTH: Inches = 1 / 8

/** Eighths beyond the first step. */
const SHORTER = [0, 1, 2, 4, 8]
const LONGER = [0, 1, 2, 4]

/** Eighths tried before what the reason asks for: turned about, a leg may need less. */
const LONGER_BEFORE = [0, 1, 2]

const OPENINGS: readonly Degrees[] = [5, 10, 15]

/** Opening an angle by this much counts as an inch of leg: 5 degrees as an eighth. */
const DEGREES_PER_INCH = 40

/** What a hem's change of style counts, and what leaving it out does. Inches. */
const RESTYLED: Inches = 0.5
const DROPPED: Inches = 1

/** The gap of a hem that is opened. Inches. */
const OPEN_GAP: Inches = 1 / 8

const nextDown = (length: Inches, by: Inches): Inches =>
  Math.min(
    Math.floor((length - by) / EIGHTH + TOLERANCE),
    Math.ceil(length / EIGHTH - TOLERANCE) - 1,
  ) * EIGHTH

const nextUp = (length: Inches, by: Inches): Inches =>
  Math.max(
    Math.ceil((length + by) / EIGHTH - TOLERANCE),
    Math.floor(length / EIGHTH + TOLERANCE) + 1,
  ) * EIGHTH

const legLadder = (
  { legs }: Profile,
  leg: number,
  code: 'shortenLeg' | 'lengthenLeg',
  by: Inches,
): Ladder => {
  const length = legs[leg - 1]
  if (length === undefined) return []
  const values =
    code === 'shortenLeg'
      ? SHORTER.map((more) => nextDown(length, by) - more * EIGHTH)
      : [
          ...LONGER_BEFORE.map((more) => nextUp(length, 0) + more * EIGHTH),
          ...LONGER.map((more) => nextUp(length, by) + more * EIGHTH),
        ]
  return [...new Set(values)]
    .filter((value) => value > 0)
    .map((value) => ({
      code,
      bend: null,
      leg,
      value,
      edit: { kind: 'setLeg', leg, length: value },
      size: Math.abs(length - value),
    }))
}

const angleLadder = ({ bends }: Profile, bend: number): Ladder => {
  const turn = bends[bend - 1]?.turn
  if (turn === undefined) return []
  return OPENINGS.filter((by) => Math.abs(turn) > by).map((by) => {
    const value = Math.sign(turn) * (Math.abs(turn) - by)
    return {
      code: 'openAngle',
      bend,
      leg: null,
      value,
      edit: { kind: 'setTurn', bend, turn: value },
      size: by / DEGREES_PER_INCH,
    }
  })
}

const hemOf = ({ hemA, hemB }: Profile, edge: 'A' | 'B'): Hem | null => (edge === 'A' ? hemA : hemB)

const hemStep = (
  code: PlanCure['code'],
  edge: 'A' | 'B',
  value: number | null,
  hem: Hem | null,
  size: Inches,
): CureStep => ({
  code,
  bend: `hem${edge}`,
  leg: null,
  value,
  edit: { kind: 'setHem', edge, hem },
  size,
})

/** A lip outside what the brake's hems take, to the next eighth inside it. */
const lipLadder = (profile: Profile, edge: 'A' | 'B', { found, limit }: PlanReason): Ladder => {
  const hem = hemOf(profile, edge)
  if (hem === null || found === null || limit === null) return []
  const length =
    found < limit ? nextUp(hem.length, limit - found) : nextDown(hem.length, found - limit)
  const size = Math.abs(length - hem.length)
  return length > 0 ? [hemStep('changeHem', edge, length, { ...hem, length }, size)] : []
}

const hemLadders = (profile: Profile, edge: 'A' | 'B'): Ladder[] => {
  const hem = hemOf(profile, edge)
  if (hem === null) return []
  const { length, turn } = hem
  const other: CureStep =
    hem.style === 'open'
      ? hemStep('closeHem', edge, null, { style: 'closed', length, turn }, RESTYLED)
      : hemStep('openHem', edge, OPEN_GAP, { style: 'open', length, gap: OPEN_GAP, turn }, RESTYLED)
  return [[other], [hemStep('dropHem', edge, null, null, DROPPED)]]
}

/** The legs from a bend to an edge, from the edge inwards; all of them where the edge is not known. */
const legsTowards = (
  { legs }: Profile,
  bend: NonNullable<PlanReason['bend']>,
  edge: 'A' | 'B' | null,
): number[] => {
  const all = legs.map((_, i) => i + 1)
  const before = bend === 'hemA' ? 0 : bend === 'hemB' ? legs.length : bend
  if (edge === null) return all
  return edge === 'A' ? all.slice(0, before) : all.slice(before).toReversed()
}

const shortSheetLadders = (profile: Profile, reason: PlanReason): Ladder[] => {
  const { bend, edge, found, limit } = reason
  if (bend === null || edge === null || found === null || limit === null) return []
  const beside = legsTowards(profile, bend, edge).at(-1)
  const across = legsTowards(profile, bend, edge === 'A' ? 'B' : 'A').at(-1)
  const acrossLength = across === undefined ? undefined : profile.legs[across - 1]
  return [
    ...(beside === undefined ? [] : [legLadder(profile, beside, 'lengthenLeg', limit - found)]),
    // The sheet on the other side may be as short, so that turning the piece about does not help.
    ...(across === undefined || acrossLength === undefined || acrossLength > limit + EIGHTH
      ? []
      : [legLadder(profile, across, 'lengthenLeg', Math.max(0, limit - acrossLength))]),
  ]
}

const inTheWayLadders = (profile: Profile, reason: PlanReason): Ladder[] => {
  const { code, bend, edge, overlap } = reason
  if (bend === null) return []
  const legs = legsTowards(profile, bend, edge)
  const edges = edge === null ? (['A', 'B'] as const) : [edge]
  const isOfLength = code === 'throat' || code === 'gauge'
  const bends = new Set([
    ...(typeof bend === 'number' ? [bend] : []),
    ...legs.flatMap((leg) => [leg - 1, leg]),
  ])
  return [
    // What is cut off the outermost leg is cut off the chain; of a straight rear, any leg does as well.
    ...legs.map((leg, i) =>
      legLadder(profile, leg, 'shortenLeg', i === 0 || isOfLength ? (overlap ?? 0) : 0),
    ),
    ...[...bends].map((each) => angleLadder(profile, each)),
    ...edges.flatMap((each) => hemLadders(profile, each)),
  ]
}

const hemEdge = (bend: PlanReason['bend']): 'A' | 'B' | null =>
  bend === 'hemA' ? 'A' : bend === 'hemB' ? 'B' : null

/** The changes of a profile that may do away with a reason. */
export const laddersFor = (profile: Profile, reason: PlanReason): Ladder[] => {
  const edge = hemEdge(reason.bend)
  const ofHem = edge === null ? [] : hemLadders(profile, edge)
  switch (reason.code) {
    case 'angle':
      return edge === null
        ? typeof reason.bend === 'number'
          ? [angleLadder(profile, reason.bend)]
          : []
        : [lipLadder(profile, edge, reason), ...ofHem]
    case 'flange':
    case 'clamp':
      return [...shortSheetLadders(profile, reason), ...ofHem]
    case 'throat':
    case 'gauge':
    case 'rearMeetsTool':
    case 'frontMeetsTool':
    case 'meetsItself':
    case 'apronMeetsRear':
    case 'cannotLoad':
    case 'trapped':
      return [...inTheWayLadders(profile, reason), ...ofHem]
    default:
      return ofHem
  }
}
