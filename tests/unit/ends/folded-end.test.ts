import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { End, Side } from '#shared/ends/end.schema'
import type { FoldedFace } from '#shared/ends/folded-end'
import { foldedEnd } from '#shared/ends/folded-end'
import { layStrip } from '#shared/ends/lay-strip'
import { SQUARE_END } from '#shared/ends/strip-borders'
import type { Vector3 } from '#shared/geometry/vector3'
import { cross3, distance3, dot3, subtract3, unit3, vector3 } from '#shared/geometry/vector3'
import { endArbitrary, foldableArbitrary } from '../../support/arbitrary-end'
import { closedHem, profileOf, STEEL } from '../../support/arbitrary-profile'
import { naiveMarkPoints } from '../../support/naive-ends'

const ORIGIN = vector3(0, 0, 0)

const endedArbitrary = foldableArbitrary.chain(({ profile, sheet }) =>
  fc.record({
    profile: fc.constant(profile),
    sheet: fc.constant(sheet),
    end: endArbitrary(profile.legs.length),
    side: fc.constantFrom<Side>('left', 'right'),
    stub: fc.double({ min: 0.5, max: 12, noNaN: true }),
  }),
)

const faceOf = (faces: readonly FoldedFace[], of: FoldedFace['of']): FoldedFace => {
  const face = faces.find((candidate) => candidate.of === of)
  if (!face) throw new Error(`There is no ${of}.`)
  return face
}

const offPlane = ([a, b, c, d]: readonly Vector3[]): number => {
  if (!a || !b || !c || !d) throw new Error('A face has four corners.')
  const normal = unit3(cross3(subtract3(b, a), subtract3(d, a)))
  return Math.abs(dot3(normal, subtract3(c, a)))
}

describe('the folded end', () => {
  it('has a flat face for each leg and lip, broken off square behind the deepest cut', () => {
    fc.assert(
      fc.property(endedArbitrary, (given) => {
        const faces = foldedEnd(given)
        const { profile, side, stub } = given
        expect(faces.map(({ of }) => of)).toEqual([
          ...(profile.hemA ? ['lipA'] : []),
          ...profile.legs.map((_, index) => index + 1),
          ...(profile.hemB ? ['lipB'] : []),
        ])
        const inward = side === 'right' ? -1 : 1
        const cuts = faces.flatMap(({ cut }) => cut.map(({ x }) => inward * x))
        const broken = inward * (Math.max(...cuts) + stub)
        for (const { polygon } of faces) {
          expect(polygon).toHaveLength(4)
          expect(offPlane(polygon)).toBeLessThan(1e-9)
          expect(polygon[0]?.x).toBeCloseTo(broken, 9)
          expect(polygon[3]?.x).toBeCloseTo(broken, 9)
        }
      }),
    )
  })

  it('joins each leg to the next at their sharp corner, cut edge to cut edge', () => {
    fc.assert(
      fc.property(endedArbitrary, (given) => {
        const faces = foldedEnd(given)
        given.profile.bends.forEach((_, index) => {
          const [, to] = faceOf(faces, index + 1).cut
          const [from] = faceOf(faces, index + 2).cut
          expect(distance3(to, from)).toBeLessThan(1e-9)
        })
      }),
    )
  })

  it('has the sharp corners that complex numbers give, from the corner’s point', () => {
    fc.assert(
      fc.property(endedArbitrary, (given) => {
        const { profile, sheet, end } = given
        const faces = foldedEnd(given)
        const lay = end.kind === 'miter' ? end.lay : 0
        const skip = profile.hemA ? 2 : 1
        const corners = naiveMarkPoints(profile, sheet, lay).slice(skip)
        const first = faceOf(faces, 1).cut[0]
        profile.bends.forEach((_, index) => {
          const corner = corners[index]
          const { y, z } = faceOf(faces, index + 1).cut[1]
          expect(y - first.y).toBeCloseTo(corner?.re ?? NaN, 9)
          expect(z - first.z).toBeCloseTo(corner?.im ?? NaN, 9)
        })
      }),
    )
  })

  it('has the corner’s point at the origin: the start of the first leg on the end’s own plane', () => {
    const piece = {
      profile: profileOf([4, 6], [-90]),
      sheet: STEEL,
      side: 'right',
      stub: 6,
    } as const
    const miter: End = { kind: 'miter', plane: { plumb: 20 }, lay: 0, legs: [], tabs: [] }
    const own = { leg: 1, plane: { plumb: 0 } }
    expect(faceOf(foldedEnd({ ...piece, end: miter }), 1).cut[0]).toEqual(ORIGIN)
    const second = foldedEnd({ ...piece, end: { ...miter, legs: [own] } })
    expect(faceOf(second, 2).cut[0]).toEqual(ORIGIN)
    const none = foldedEnd({ ...piece, end: { ...miter, legs: [own, { ...own, leg: 2 }] } })
    expect(faceOf(none, 1).cut[0]).toEqual(ORIGIN)
  })

  it('is cut as the marks of the strip say', () => {
    fc.assert(
      fc.property(endedArbitrary, (given) => {
        const { profile, sheet, end, side } = given
        const ends = {
          left: SQUARE_END,
          right: SQUARE_END,
          lowEnd: null,
          [side]: { ...end, tabs: [] },
        }
        const laid = layStrip({ profile, sheet, pieceLength: 3000, ends })
        if (!laid.ok) throw new Error('The piece cannot be laid out.')
        const faces = foldedEnd({ ...given, end: { ...end, tabs: [] } })
        const outward = side === 'right' ? 1 : -1
        const { marks } = laid.layout[side]
        // Both count from a zero of their own; the steps from corner to corner agree.
        const skip = profile.hemA ? 2 : 1
        profile.bends.slice(1).forEach((_, index) => {
          const leg = faceOf(faces, index + 2)
          const [near, far] = [marks[skip + index], marks[skip + index + 1]]
          const step = outward * (leg.cut[0].x - leg.cut[1].x)
          expect((far?.along ?? NaN) - (near?.along ?? NaN)).toBeCloseTo(step, 8)
        })
      }),
    )
  })
})

describe('hems of a folded end', () => {
  const profile = profileOf([4], [], { hemA: closedHem(0.5, 1), hemB: closedHem(0.75, -1) })
  const square = { profile, sheet: STEEL, end: SQUARE_END, side: 'left', stub: 6 } as const

  it('lie on their legs, one thickness apart, on the side they turn to', () => {
    const faces = foldedEnd(square)
    // A +1 lip lies on the left of the walk, which is up; a -1 lip below.
    for (const corner of faceOf(faces, 'lipA').cut) {
      expect(corner.z).toBeCloseTo(STEEL.thickness, 12)
    }
    for (const corner of faceOf(faces, 'lipB').cut) {
      expect(corner.z).toBeCloseTo(-STEEL.thickness, 12)
    }
    expect(faceOf(faces, 'lipA').cut[0].y).toBeCloseTo(0.5 - STEEL.thickness / 2, 12)
  })

  it('are missing for the length of an under lap, and not of an over lap', () => {
    const lipAt = (lap: 'under' | 'over', side: Side) => {
      const end: End = { kind: 'lap', side: lap, length: 4, tabs: [] }
      const faces = foldedEnd({ ...square, end, side })
      expect(faceOf(faces, 1).cut[0].x).toBe(0)
      return faceOf(faces, 'lipA').cut[0].x
    }
    expect(lipAt('under', 'left')).toBe(4)
    expect(lipAt('under', 'right')).toBe(-4)
    expect(lipAt('over', 'left')).toBe(0)
  })
})

describe('a folded end that cannot be shown', () => {
  const square = { profile: profileOf([4]), sheet: STEEL, side: 'left', stub: 6 } as const

  it.each([0, -1, NaN, Infinity])('has a stub of %s', (stub) => {
    expect(() => foldedEnd({ ...square, end: SQUARE_END, stub })).toThrow(RangeError)
  })

  it('has a profile without a strip', () => {
    const profile = profileOf([4, 0.02, 6], [90, 90])
    expect(() => foldedEnd({ ...square, profile, end: SQUARE_END })).toThrow(/no strip/)
  })

  it('has an end that cannot be cut', () => {
    const end: End = {
      kind: 'miter',
      plane: { normal: [0, 0, 1] },
      lay: 0,
      legs: [],
      tabs: [],
    }
    expect(() => foldedEnd({ ...square, end })).toThrow(/planeAlongPiece/)
  })
})
