import fc from 'fast-check'
import type { Corner, CutPlane, End, LegPlane, PieceEnds, Tab } from '#shared/ends/end.schema'
import type { Profile } from '#shared/profile/profile.schema'
import type { FoldingSheet } from '#shared/strip/flat-parts'
import { flatParts } from '#shared/strip/flat-parts'
import { profileArbitrary, sheetArbitrary } from './arbitrary-profile'

/** Without -0, which a mirror turns into 0. */
const between = (least: number, most: number) =>
  fc.double({ min: least, max: most, noNaN: true }).map((value) => value + 0)

const degrees = (most: number) => between(-most, most)

const cosOf = (angle: number): number => Math.cos((angle / 180) * Math.PI)

const sinOf = (angle: number): number => Math.sin((angle / 180) * Math.PI)

/** Degrees that the run turns in a corner. */
export const runTurn = ({ slopeIn, slopeOut, plan }: Corner): number => {
  const likeness = cosOf(slopeIn) * cosOf(slopeOut) * cosOf(plan) + sinOf(slopeIn) * sinOf(slopeOut)
  return (Math.acos(Math.max(-1, Math.min(1, likeness))) / Math.PI) * 180
}

/** Corners of roofs: slopes up to 60 degrees, a turn up to 140. */
export const cornerArbitrary: fc.Arbitrary<Corner> = fc
  .record({ slopeIn: degrees(60), slopeOut: degrees(60), plan: degrees(140) })
  .filter((corner) => runTurn(corner) <= 140)

export const planeArbitrary: fc.Arbitrary<CutPlane> = fc.oneof(
  fc.record({ plumb: degrees(70) }),
  fc.record({ corner: cornerArbitrary }),
  fc.record({
    normal: fc.tuple(between(0.4, 3), between(-1, 1), between(-1, 1)),
  }),
)

/** Some of the legs, each once, with something for each. */
const onLegs = <T>(legs: number, of: fc.Arbitrary<T>): fc.Arbitrary<(T & { leg: number })[]> =>
  fc
    .uniqueArray(fc.integer({ min: 1, max: legs }), { maxLength: legs })
    .chain((chosen) => fc.tuple(...chosen.map((leg) => of.map((value) => ({ ...value, leg })))))

const quarters = (least: number, most: number) =>
  fc.integer({ min: least * 4, max: most * 4 }).map((count) => count / 4)

/** Ends that can be cut on a profile of so many legs, if the piece is long enough. */
export const endArbitrary = (legs: number): fc.Arbitrary<End> => {
  const tabs: fc.Arbitrary<Tab[]> = fc.oneof(
    fc.constant<Tab[]>([]),
    onLegs(legs, fc.record({ length: quarters(0.5, 2) })),
  )
  const ownPlanes: fc.Arbitrary<LegPlane[]> = fc.oneof(
    fc.constant<LegPlane[]>([]),
    onLegs(legs, fc.record({ plane: planeArbitrary })),
  )
  return fc.oneof(
    fc.record({ kind: fc.constant('square' as const), tabs }),
    fc.record({
      kind: fc.constant('lap' as const),
      side: fc.constantFrom('under' as const, 'over' as const),
      length: quarters(1, 6),
      tabs,
    }),
    fc.record({
      kind: fc.constant('miter' as const),
      plane: planeArbitrary,
      lay: degrees(180),
      legs: ownPlanes,
      tabs,
    }),
  )
}

const hasStrip = (profile: Profile, sheet: FoldingSheet): boolean =>
  flatParts(profile, sheet).runs.every(({ straight }) => straight > 0)

/** Profiles that leave every leg some flat between its bends; they may cross themselves. */
export const foldableArbitrary = fc
  .record({ profile: profileArbitrary, sheet: sheetArbitrary })
  .filter(({ profile, sheet }) => hasStrip(profile, sheet))

export const dressedArbitrary = foldableArbitrary.chain(({ profile, sheet }) => {
  const end = endArbitrary(profile.legs.length)
  return fc.record({
    profile: fc.constant(profile),
    sheet: fc.constant(sheet),
    pieceLength: quarters(4, 240),
    ends: fc.record<PieceEnds>({
      left: end,
      right: end,
      lowEnd: fc.constantFrom('left', 'right', null),
    }),
  })
})
