import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { CutPlane, Side } from '#shared/ends/end.schema'
import type { FoldedFace } from '#shared/ends/folded-end'
import { foldedEnd } from '#shared/ends/folded-end'
import { layStrip } from '#shared/ends/lay-strip'
import { SQUARE_END } from '#shared/ends/strip-borders'
import { degrees, radians } from '#shared/geometry/vector'
import { dot3, lengthOf3, subtract3, vector3 } from '#shared/geometry/vector3'
import { foldableArbitrary } from '../../support/arbitrary-end'
import { profileOf, STEEL } from '../../support/arbitrary-profile'

const slopeArbitrary = fc.double({ min: -60, max: 60, noNaN: true })
const turnArbitrary = fc.double({ min: -150, max: 150, noNaN: true })
const layArbitrary = fc.double({ min: -180, max: 180, noNaN: true })
const sideArbitrary = fc.constantFrom<Side>('left', 'right')

type Piece = Pick<Parameters<typeof foldedEnd>[0], 'profile' | 'sheet'>

const facesOf = (piece: Piece, plane: CutPlane, lay: number, side: Side): readonly FoldedFace[] =>
  foldedEnd({
    ...piece,
    end: { kind: 'miter', plane, lay, legs: [], tabs: [] },
    side,
    stub: 6,
  })

/** How far t grows along a face's cut for an inch across the face. */
const growth = ({ cut: [from, to] }: FoldedFace): number =>
  (to.x - from.x) / Math.hypot(to.y - from.y, to.z - from.z)

/** The angle of a leg to the horizontal, from the profile's turns alone. */
const leanOf = (turns: readonly number[], lay: number, leg: number): number =>
  turns.slice(0, leg - 1).reduce((sum, turn) => sum + turn, lay)

describe('a plumb cut on slope a', () => {
  it('lies at t = v tan a in every point of its edge', () => {
    fc.assert(
      fc.property(
        foldableArbitrary,
        slopeArbitrary,
        layArbitrary,
        sideArbitrary,
        (piece, slope, lay, side) => {
          for (const { cut } of facesOf(piece, { plumb: slope }, lay, side)) {
            for (const { x, z } of cut) {
              expect(x).toBeCloseTo(z * Math.tan(radians(slope)), 9)
            }
          }
        },
      ),
    )
  })
})

describe('a level corner', () => {
  it('cuts a leg at angle s to the horizontal at atan(cos s tan(p/2)) from square', () => {
    fc.assert(
      fc.property(
        foldableArbitrary,
        turnArbitrary,
        layArbitrary,
        sideArbitrary,
        (piece, plan, lay, side) => {
          const turns = piece.profile.bends.map(({ turn }) => turn)
          const corner = { slopeIn: 0, slopeOut: 0, plan }
          for (const face of facesOf(piece, { corner }, lay, side)) {
            if (typeof face.of !== 'number') continue
            const lean = leanOf(turns, lay, face.of)
            const wanted = Math.cos(radians(lean)) * Math.tan(radians(plan) / 2)
            expect(Math.abs(growth(face))).toBeCloseTo(Math.abs(wanted), 9)
          }
        },
      ),
    )
  })

  it('shortens the inner side: edge B where it turns left, edge A where it turns right', () => {
    const alongOf = (plan: number, side: Side): (number | undefined)[] => {
      const corner = { slopeIn: 0, slopeOut: 0, plan }
      const end = { kind: 'miter', plane: { corner }, lay: 0, legs: [], tabs: [] } as const
      const ends = { left: SQUARE_END, right: SQUARE_END, lowEnd: null, [side]: end }
      const laid = layStrip({ profile: profileOf([4]), sheet: STEEL, pieceLength: 60, ends })
      return laid.ok
        ? laid.layout[side].marks.map(({ along }) => Math.round(along * 1e9) / 1e9)
        : []
    }
    expect(alongOf(90, 'right')).toEqual([0, 4])
    expect(alongOf(90, 'left')).toEqual([0, 4])
    expect(alongOf(-90, 'right')).toEqual([4, 0])
    expect(alongOf(-90, 'left')).toEqual([4, 0])
  })
})

describe('a gable run that meets a level run', () => {
  it('is cut at 45 on every leg that lies in the plane of the roof, at either end', () => {
    fc.assert(
      fc.property(slopeArbitrary, fc.constantFrom(90, -90), sideArbitrary, (slope, plan, side) => {
        // The gable run comes up or down to the level one, or leaves it.
        const corner =
          side === 'right'
            ? { slopeIn: slope, slopeOut: 0, plan }
            : { slopeIn: 0, slopeOut: slope, plan }
        // u lies level and square to the run: the plane of the roof is the one of lay 0.
        const piece = { profile: profileOf([4, 6, 2], [-90, 90]), sheet: STEEL }
        const [roof, , flat] = facesOf(piece, { corner }, 0, side)
        if (!roof || !flat) throw new Error('There are three legs.')
        expect(Math.abs(growth(roof))).toBeCloseTo(1, 12)
        expect(Math.abs(growth(flat))).toBeCloseTo(1, 12)
      }),
    )
  })

  it('turns 90 degrees in the plane of the roof: the cut makes 45 with both runs', () => {
    const slope = degrees(Math.atan(6 / 12))
    const corner = { slopeIn: slope, slopeOut: 0, plan: 90 }
    const [roof] = facesOf({ profile: profileOf([4]), sheet: STEEL }, { corner }, 0, 'right')
    if (!roof) throw new Error('There is one leg.')
    const cut = subtract3(roof.cut[1], roof.cut[0])
    expect(dot3(cut, vector3(1, 0, 0)) / lengthOf3(cut)).toBeCloseTo(-Math.SQRT1_2, 12)
  })
})
