import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { closeEnds } from '#shared/ends/close-ends'
import type { Corner, CutPlane, End, Side } from '#shared/ends/end.schema'
import type { EndOfPiece } from '#shared/ends/folded-end'
import { foldedEnd } from '#shared/ends/folded-end'
import { layStrip } from '#shared/ends/lay-strip'
import { matchingLay } from '#shared/ends/run-frame'
import type { Vector3 } from '#shared/geometry/vector3'
import { cornerArbitrary, foldableArbitrary } from '../../support/arbitrary-end'
import { profileOf, STEEL } from '../../support/arbitrary-profile'
import type { Triple } from '../../support/naive-ends'
import { apart, naiveAxes, naiveCornerCut, naiveMarkPoints } from '../../support/naive-ends'

const cutBy = (plane: CutPlane, lay = 0): End => ({
  kind: 'miter',
  plane,
  lay,
  legs: [],
  tabs: [],
})

const miter = (corner: Corner, lay: number): End => cutBy({ corner }, lay)

const pairArbitrary = fc.record({
  piece: foldableArbitrary,
  corner: cornerArbitrary,
  lay: fc.double({ min: -180, max: 180, noNaN: true }),
})

const inWorld = ({ x, y, z }: Vector3, [t, u, v]: [Triple, Triple, Triple]): Triple => [
  x * t[0] + y * u[0] + z * v[0],
  x * t[1] + y * u[1] + z * v[1],
  x * t[2] + y * u[2] + z * v[2],
]

describe('two pieces that are mirror images in the plane of their corner', () => {
  it('have the same cut edges in space, each found from its own folded piece', () => {
    fc.assert(
      fc.property(pairArbitrary, ({ piece: { profile, sheet }, corner, lay }) => {
        const edgesOf = (side: Side, at: number): Triple[] =>
          foldedEnd({ profile, sheet, end: miter(corner, at), side, stub: 6 }).flatMap(
            ({ cut: [from, to] }) => {
              const axes = naiveAxes(corner, side)
              return [inWorld(from, axes), inWorld(to, axes)]
            },
          )
        const entering = edgesOf('right', lay)
        const leaving = edgesOf('left', matchingLay(corner, 'right', lay))
        expect(leaving).toHaveLength(entering.length)
        entering.forEach((point, index) => {
          expect(apart(point, leaving[index] ?? [NaN, NaN, NaN])).toBeLessThan(1e-9)
        })
      }),
      { numRuns: 300 },
    )
  })

  it('have them computed another way too: complex numbers, rotations, three equations', () => {
    fc.assert(
      fc.property(pairArbitrary, ({ piece: { profile, sheet }, corner, lay }) => {
        const cutOf = (side: Side, at: number) =>
          naiveCornerCut(corner, side, naiveMarkPoints(profile, sheet, at))
        const leavingLay = matchingLay(corner, 'right', lay)
        const entering = cutOf('right', lay)
        const leaving = cutOf('left', leavingLay)
        entering.forEach(({ world }, index) => {
          expect(apart(world, leaving[index]?.world ?? [NaN, NaN, NaN])).toBeLessThan(1e-9)
        })
        // And the marks of the strips are those cuts, from the outermost of each.
        const laid = layStrip({
          profile,
          sheet,
          pieceLength: 2000,
          ends: { left: miter(corner, leavingLay), right: miter(corner, lay), lowEnd: null },
        })
        if (!laid.ok) throw new Error('The piece cannot be laid out.')
        const furthest = Math.max(...entering.map(({ t }) => t))
        const nearest = Math.min(...leaving.map(({ t }) => t))
        laid.layout.right.marks.forEach(({ along }, index) => {
          expect(along).toBeCloseTo(furthest - (entering[index]?.t ?? NaN), 8)
        })
        laid.layout.left.marks.forEach(({ along }, index) => {
          expect(along).toBeCloseTo((leaving[index]?.t ?? NaN) - nearest, 8)
        })
      }),
      { numRuns: 300 },
    )
  })

  it('close leg on leg, whichever of the two is named first', () => {
    fc.assert(
      fc.property(pairArbitrary, ({ piece, corner, lay }) => {
        const entering: EndOfPiece = { ...piece, end: miter(corner, lay), side: 'right' }
        const leaving: EndOfPiece = {
          ...piece,
          end: miter(corner, matchingLay(corner, 'right', lay)),
          side: 'left',
        }
        for (const closed of [closeEnds(entering, leaving), closeEnds(leaving, entering)]) {
          if (!closed.ok) throw new Error(closed.code)
          expect(closed.closes).toBe(true)
          expect([closed.shift.x, closed.shift.y, closed.shift.z]).toEqual([0, 0, 0])
          for (const { gap } of [...closed.a, ...closed.b]) expect(gap).toBeLessThan(1e-9)
        }
      }),
      { numRuns: 200 },
    )
  })

  it('are found from either side', () => {
    fc.assert(
      fc.property(pairArbitrary, ({ corner, lay }) => {
        const there = matchingLay(corner, 'right', lay)
        const back = matchingLay(corner, 'left', there)
        expect(Math.cos(((back - lay) / 180) * Math.PI)).toBeCloseTo(1, 12)
        expect(Math.abs(there)).toBeLessThanOrEqual(180)
      }),
    )
  })
})

describe('two pieces that do not match', () => {
  const level: Corner = { slopeIn: 0, slopeOut: 0, plan: 90 }
  const entering = (legs: number[], turns: number[]): EndOfPiece => ({
    profile: profileOf(legs, turns),
    sheet: STEEL,
    end: miter(level, 0),
    side: 'right',
  })
  const leaving = (legs: number[], turns: number[], lay = 0): EndOfPiece => ({
    profile: profileOf(legs, turns),
    sheet: STEEL,
    end: miter(level, lay),
    side: 'left',
  })

  it('close on the legs they share and leave the step on the others', () => {
    const closed = closeEnds(entering([4, 6], [-90]), leaving([4, 5], [-90]))
    expect(closed).toMatchObject({
      ok: true,
      closes: false,
      a: [
        { leg: 1, closesOn: 1 },
        { leg: 2, nearest: 2, closesOn: null },
      ],
    })
    // The faces hang plumb in a level corner: the step is the inch between them.
    if (closed.ok) expect(closed.a[1]?.gap).toBeCloseTo(1, 9)
  })

  it('close at 1/32 in. and no longer beyond it', () => {
    const gapOf = (more: number) => {
      const closed = closeEnds(entering([4, 6], [-90]), leaving([4, 6 + more], [-90]))
      return closed.ok ? closed.a[1]?.closesOn : undefined
    }
    expect(gapOf(1 / 32)).toBe(2)
    expect(gapOf(1 / 32 + 1e-6)).toBeNull()
  })

  it('close as well where one of them was drawn from its other edge', () => {
    // Walked from the face's foot: up, then in over the roof to the left.
    const closed = closeEnds(entering([4, 6], [-90]), leaving([6, 4], [90], 90))
    expect(closed).toMatchObject({
      ok: true,
      closes: true,
      a: [
        { leg: 1, closesOn: 2 },
        { leg: 2, closesOn: 1 },
      ],
      b: [
        { leg: 1, closesOn: 2 },
        { leg: 2, closesOn: 1 },
      ],
    })
  })

  it('say how far off they are where nothing closes at all', () => {
    const closed = closeEnds(entering([4], []), leaving([5], []))
    expect(closed).toMatchObject({ ok: true, closes: false, a: [{ nearest: 1, closesOn: null }] })
    // A 45-degree cut makes an inch of leg 1.414 in. of cut edge.
    if (closed.ok) expect(closed.a[0]?.gap).toBeCloseTo(Math.SQRT2, 9)
  })
})

describe('ends that cannot be placed in a corner', () => {
  const corner: Corner = { slopeIn: 0, slopeOut: 0, plan: 90 }
  const of = (side: Side, end: End): EndOfPiece => ({
    profile: profileOf([4]),
    sheet: STEEL,
    end,
    side,
  })
  const plumb = (slope: number): End => cutBy({ plumb: slope })
  const square: End = { kind: 'square', tabs: [] }

  it.each<[string, EndOfPiece, EndOfPiece]>([
    ['sameSide', of('left', miter(corner, 0)), of('left', miter(corner, 0))],
    ['noCorner', of('right', square), of('left', square)],
    ['noCorner', of('right', plumb(20)), of('left', square)],
    ['cornersDiffer', of('right', miter(corner, 0)), of('left', miter({ ...corner, plan: 80 }, 0))],
    ['endFaulty', of('right', miter({ ...corner, plan: NaN }, 0)), of('left', square)],
  ])('are refused: %s', (code, a, b) => {
    expect(closeEnds(a, b)).toMatchObject({ ok: false, code })
  })

  it('name the fault of the end that has one', () => {
    const faulty = cutBy({ normal: [0, 1, 0] })
    expect(closeEnds(of('right', miter(corner, 0)), of('left', faulty))).toMatchObject({
      ok: false,
      problems: [{ code: 'planeAlongPiece', end: 'left', found: 0, limit: 1 }],
    })
  })

  it('name a profile that has no strip', () => {
    const faulty = { ...of('left', miter(corner, 0)), profile: profileOf([NaN]) }
    expect(closeEnds(of('right', miter(corner, 0)), faulty)).toMatchObject({
      ok: false,
      code: 'endFaulty',
      problems: [{ code: 'profileFaulty', end: 'left' }],
    })
  })

  it('but a square end closes on a corner that its neighbor names, as far as it can', () => {
    const closed = closeEnds(of('right', miter(corner, 0)), of('left', square))
    expect(closed).toMatchObject({ ok: true, closes: false, corner })
  })

  it('and two plumb cuts meet in their vertical plane, as at the peak of a gable', () => {
    const closed = closeEnds(of('right', plumb(20)), of('left', plumb(-20)))
    expect(closed).toMatchObject({
      ok: true,
      closes: true,
      corner: { slopeIn: 20, slopeOut: -20, plan: 0 },
    })
  })
})
