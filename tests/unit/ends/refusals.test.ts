import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { EndProblem } from '#shared/ends/end-layout'
import type { CutPlane, End, PieceEnds } from '#shared/ends/end.schema'
import { endProblems } from '#shared/ends/end-problems'
import { layStrip } from '#shared/ends/lay-strip'
import type { PieceToLay } from '#shared/ends/strip-borders'
import { SQUARE_END } from '#shared/ends/strip-borders'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import { dressedArbitrary } from '../../support/arbitrary-end'
import { profileOf, STEEL } from '../../support/arbitrary-profile'

const face = profileOf([4, 6], [-90])

const miter = (plane: CutPlane, rest: Partial<Extract<End, { kind: 'miter' }>> = {}): End => ({
  kind: 'miter',
  plane,
  lay: 0,
  legs: [],
  tabs: [],
  ...rest,
})

const lap = (length: number, side: 'under' | 'over' = 'under'): End => ({
  kind: 'lap',
  side,
  length,
  tabs: [],
})

const tabbed = (leg: number, length: number): End => ({ kind: 'square', tabs: [{ leg, length }] })

const level = (plan: number): CutPlane => ({ corner: { slopeIn: 0, slopeOut: 0, plan } })

const rightEnd = (right: End): PieceToLay => ({
  profile: face,
  sheet: STEEL,
  pieceLength: 60,
  ends: { left: SQUARE_END, right, lowEnd: null },
})

describe('an end that cannot be cut is refused with its values', () => {
  it.each<[string, End, Partial<EndProblem>]>([
    [
      'a tab on a leg there is not',
      tabbed(3, 1),
      { code: 'noSuchLeg', leg: 3, found: 3, limit: 2 },
    ],
    ['a tab on half a leg', tabbed(1.5, 1), { code: 'noSuchLeg', leg: 1.5, found: 1.5, limit: 2 }],
    [
      'a plane for leg 0',
      miter({ plumb: 10 }, { legs: [{ leg: 0, plane: { plumb: 10 } }] }),
      { code: 'noSuchLeg', leg: 0, found: 0, limit: 2 },
    ],
    [
      'two tabs on a leg',
      {
        kind: 'square',
        tabs: [
          { leg: 2, length: 1 },
          { leg: 2, length: 2 },
        ],
      },
      { code: 'legNamedTwice', leg: 2, found: 2, limit: 1 },
    ],
    [
      'two planes for a leg',
      miter(
        { plumb: 10 },
        {
          legs: [
            { leg: 1, plane: { plumb: 10 } },
            { leg: 1, plane: { plumb: 20 } },
          ],
        },
      ),
      { code: 'legNamedTwice', leg: 1, found: 1, limit: 1 },
    ],
    [
      'a plane along the piece',
      miter({ normal: [0, 1, 1] }),
      { code: 'planeAlongPiece', found: 0, limit: 1 },
    ],
    [
      'no plane at all',
      miter({ normal: [0, 0, 0] }),
      { code: 'planeAlongPiece', found: 0, limit: 1 },
    ],
    [
      'a plumb cut of 89.5 degrees',
      miter({ plumb: 89.5 }),
      { code: 'planeAlongPiece', found: 0.5, limit: 1 },
    ],
    [
      'a plumb run',
      miter({ corner: { slopeIn: 90, slopeOut: 0, plan: 0 } }),
      { code: 'planeAlongPiece', found: 0, limit: 1 },
    ],
    [
      'a leg with a plane along the piece',
      miter({ plumb: 10 }, { legs: [{ leg: 2, plane: { normal: [0, 0, 1] } }] }),
      { code: 'planeAlongPiece', leg: 2, found: 0, limit: 1 },
    ],
    [
      'a corner that turns back',
      miter(level(179)),
      { code: 'cornerTurnsBack', found: 179, limit: 178 },
    ],
    [
      'a corner of more than half round',
      miter(level(-185)),
      { code: 'cornerTurnsBack', found: 185, limit: 178 },
    ],
    [
      'a run that falls back on itself',
      miter({ corner: { slopeIn: 60, slopeOut: -60, plan: 180 } }),
      { code: 'cornerTurnsBack', found: 180, limit: 178 },
    ],
    ['a lap as long as the piece', lap(60), { code: 'lapLongerThanPiece', found: 60, limit: 60 }],
    [
      'a tab longer than the piece',
      tabbed(2, 61),
      { code: 'tabLongerThanPiece', leg: 2, found: 61, limit: 60 },
    ],
    ['a lap of no length', lap(0), { code: 'notFinite', found: 0, limit: 0 }],
    ['a tab inwards', tabbed(1, -1), { code: 'notFinite', leg: 1, found: -1, limit: 0 }],
    ['a slope that is no number', miter({ plumb: NaN }), { code: 'notFinite', found: NaN }],
    ['an endless turn', miter(level(Infinity)), { code: 'notFinite', found: Infinity }],
    [
      'a lay that is no number',
      miter({ plumb: 1 }, { lay: NaN }),
      { code: 'notFinite', found: NaN, limit: 360 },
    ],
    [
      'a section turned more than once round',
      miter({ plumb: 1 }, { lay: -400 }),
      { code: 'notFinite', found: -400, limit: 360 },
    ],
    [
      'a normal with a part that is no number',
      miter({ normal: [1, NaN, 0] }),
      { code: 'notFinite', found: NaN },
    ],
  ])('%s', (_, end, wanted) => {
    const { found } = wanted
    const near: unknown = Number.isFinite(found) ? expect.closeTo(found ?? NaN, 9) : found
    expect(endProblems(rightEnd(end))).toEqual([
      { end: 'right', leg: null, limit: null, ...wanted, found: near },
    ])
    expect(layStrip(rightEnd(end))).toMatchObject({ ok: false })
  })

  it('at whichever end it stands, each fault by itself', () => {
    const problems = endProblems({
      ...rightEnd(tabbed(7, 99)),
      ends: { left: lap(NaN), right: tabbed(7, 99), lowEnd: null },
    })
    expect(problems.map(({ end, code }) => `${end} ${code}`)).toEqual([
      'left notFinite',
      'right noSuchLeg',
      'right tabLongerThanPiece',
    ])
  })

  it('where the two cuts meet on a short piece, to the last bit of metal', () => {
    const both = (pieceLength: number): PieceToLay => ({
      profile: profileOf([10]),
      sheet: STEEL,
      pieceLength,
      ends: { left: miter(level(90)), right: miter(level(90)), lowEnd: null },
    })
    // Both take 10 in. off edge B.
    expect(endProblems(both(20))).toMatchObject([{ code: 'endsMeet', leg: 1, limit: 20 }])
    expect(endProblems(both(20.001))).toEqual([])
    // One of them turned: the strip is a parallelogram, 10 in. shorter at either edge than from tip to tip.
    const ends = { left: miter(level(-90)), right: miter(level(90)), lowEnd: null }
    expect(endProblems({ ...both(10), ends })).toMatchObject([{ code: 'endsMeet', limit: 10 }])
    expect(endProblems({ ...both(10.001), ends })).toEqual([])
  })

  it('where an under lap at one end leaves nothing of the lip that a miter cuts at the other', () => {
    const hemA: Hem = { style: 'closed', length: 0.5, turn: 1 }
    const piece = (pieceLength: number): PieceToLay => ({
      profile: profileOf([4, 6], [-90], { hemA }),
      sheet: STEEL,
      pieceLength,
      ends: { left: lap(4), right: miter(level(-90)), lowEnd: null },
    })
    // The right end is cut back by about 4 in. where the hem lies.
    expect(endProblems(piece(6))).toMatchObject([{ code: 'endsMeet', end: 'right', leg: 1 }])
    expect(endProblems(piece(9))).toEqual([])
  })

  it.each([0, -5, NaN, Infinity])('on a piece of %s in.', (pieceLength) => {
    expect(endProblems({ ...rightEnd(SQUARE_END), pieceLength })).toEqual([
      { code: 'notFinite', end: 'left', leg: null, found: pieceLength, limit: 0 },
    ])
  })

  it.each<[string, Profile]>([
    ['without legs', { ...face, legs: [], bends: [] }],
    ['with a leg that is no number', profileOf([4, NaN], [-90])],
    ['with a bend too few', { ...face, bends: [] }],
    ['with a bend of half a turn', profileOf([4, 6], [180])],
    ['with a leg its bends use up', profileOf([4, 0.02, 6], [90, 90])],
    ['with a leg its bends use up but for their own zones', profileOf([4, 0.08, 6], [90, 90])],
    [
      'with a hem of no length',
      profileOf([4], [], { hemA: { style: 'closed', length: 0, turn: 1 } }),
    ],
  ])('on a profile %s, of which profileProblems says more', (_, profile) => {
    const problems = endProblems({ ...rightEnd(tabbed(1, 1)), profile })
    expect(problems).toEqual([
      { code: 'profileFaulty', end: 'left', leg: null, found: null, limit: null },
    ])
  })

  it('on a sheet that is no sheet', () => {
    const sheet = { ...STEEL, thickness: NaN }
    expect(endProblems({ ...rightEnd(SQUARE_END), sheet })).toMatchObject([
      { code: 'profileFaulty' },
    ])
  })
})

describe('whatever is asked', () => {
  const anyNumber = fc.oneof(
    fc.double(),
    fc.integer({ min: -200, max: 200 }),
    fc.constantFrom(0, -0, 90, 180, 1e-12, 1e300, NaN, Infinity, -Infinity),
  )
  const anyPlane: fc.Arbitrary<CutPlane> = fc.oneof(
    fc.record({ plumb: anyNumber }),
    fc.record({
      corner: fc.record({ slopeIn: anyNumber, slopeOut: anyNumber, plan: anyNumber }),
    }),
    fc.record({ normal: fc.tuple(anyNumber, anyNumber, anyNumber) }),
  )
  const anyTabs = fc.array(fc.record({ leg: anyNumber, length: anyNumber }), { maxLength: 3 })
  const anyEnd: fc.Arbitrary<End> = fc.oneof(
    fc.record({ kind: fc.constant('square' as const), tabs: anyTabs }),
    fc.record({
      kind: fc.constant('lap' as const),
      side: fc.constantFrom('under' as const, 'over' as const),
      length: anyNumber,
      tabs: anyTabs,
    }),
    fc.record({
      kind: fc.constant('miter' as const),
      plane: anyPlane,
      lay: anyNumber,
      legs: fc.array(fc.record({ leg: anyNumber, plane: anyPlane }), { maxLength: 3 }),
      tabs: anyTabs,
    }),
  )
  const anyHem: fc.Arbitrary<Hem | null> = fc.option(
    fc.record({
      style: fc.constant('open' as const),
      length: anyNumber,
      gap: anyNumber,
      turn: fc.constantFrom(1 as const, -1 as const),
    }),
  )
  const anyProfile: fc.Arbitrary<Profile> = fc.record({
    version: fc.constant(1 as const),
    legs: fc.array(anyNumber, { maxLength: 5 }),
    bends: fc.array(fc.record({ turn: anyNumber }), { maxLength: 4 }),
    hemA: anyHem,
    hemB: anyHem,
    colorSide: fc.constant('left' as const),
  })
  const anyEnds: fc.Arbitrary<PieceEnds> = fc.record({
    left: anyEnd,
    right: anyEnd,
    lowEnd: fc.constant(null),
  })

  /** Either a layout of plain numbers or at least one problem; never an exception. */
  const answers = (piece: PieceToLay): void => {
    const laid = layStrip(piece)
    if (!laid.ok) {
      expect(laid.problems.length).toBeGreaterThan(0)
      return
    }
    const { outline, blankLength, left, right } = laid.layout
    const numbers = [
      blankLength,
      ...outline.flatMap(({ along, at }) => [along, at]),
      ...[left, right].flatMap(({ marks }) => marks.flatMap(({ along, at }) => [along, at])),
    ]
    expect(numbers.every(Number.isFinite)).toBe(true)
    expect(outline.length).toBeGreaterThanOrEqual(3)
  }

  it('garbage for ends on a sound profile gives an answer or a reason', () => {
    fc.assert(
      fc.property(dressedArbitrary, anyEnds, anyNumber, (piece, ends, pieceLength) => {
        answers({ ...piece, ends })
        answers({ ...piece, ends, pieceLength })
      }),
      { numRuns: 500 },
    )
  })

  it('garbage for the profile and the sheet does, too', () => {
    fc.assert(
      fc.property(dressedArbitrary, anyProfile, anyNumber, (piece, profile, value) => {
        answers({ ...piece, profile })
        answers({ ...piece, sheet: { ...piece.sheet, thickness: value } })
        answers({ ...piece, sheet: { ...piece.sheet, insideRadius: value, kFactor: value } })
      }),
      { numRuns: 500 },
    )
  })
})
