import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { closeEnds } from '#shared/ends/close-ends'
import type { Corner, CutPlane, Side } from '#shared/ends/end.schema'
import type { EndOfPiece, FoldedFace } from '#shared/ends/folded-end'
import { foldedEnd } from '#shared/ends/folded-end'
import { layStrip } from '#shared/ends/lay-strip'
import { matchingLay } from '#shared/ends/run-frame'
import { SQUARE_END } from '#shared/ends/strip-borders'
import { degrees, radians } from '#shared/geometry/vector'
import { profileOf, STEEL } from '../../support/arbitrary-profile'

/*
 * The corner of a gable and a plumb-faced high side, leg by leg. The gable run climbs to the corner
 * on the left of its roof, the high side leaves it level to the right. The gable's face stands
 * square to the roof, the high side's hangs plumb: their sections are no mirror images, so each leg
 * is cut by a plane of its own.
 */

/** So thin that outside dimensions and the middle of the sheet are one to a hundred-thousandth. */
const FOIL = { thickness: 1e-6, insideRadius: 0, kFactor: 0.4074 }

const cornerAt = (pitch: number): Corner => ({ slopeIn: pitch, slopeOut: 0, plan: -90 })

interface Drawn {
  readonly legs: number[]
  readonly turns: number[]
  readonly lay: number
  /** The legs of the face, which has a plane of its own. */
  readonly face: number[]
  readonly sheet: EndOfPiece['sheet']
}

const pieceOf = (pitch: number, side: Side, plane: CutPlane, drawn: Drawn): EndOfPiece => ({
  profile: profileOf(drawn.legs, drawn.turns),
  sheet: drawn.sheet,
  side,
  end: {
    kind: 'miter',
    plane: { corner: cornerAt(pitch) },
    lay: drawn.lay,
    legs: drawn.face.map((leg) => ({ leg, plane })),
    tabs: [],
  },
})

const gableOf = (pitch: number, drawn: Drawn): EndOfPiece =>
  pieceOf(pitch, 'right', { plumb: pitch }, drawn)

const highSideOf = (pitch: number, drawn: Drawn): EndOfPiece =>
  pieceOf(pitch, 'left', { normal: [1, 0, 0] }, drawn)

/** Four inches on the roof, then the face, square to the roof. */
const gable = (pitch: number, face: number, sheet: EndOfPiece['sheet']): EndOfPiece =>
  gableOf(pitch, { legs: [4, face], turns: [-90], lay: 0, face: [2], sheet })

/** The included angle of a high-side peak is 90 less the pitch, so that its face hangs plumb. */
const highSide = (pitch: number, face: number, sheet: EndOfPiece['sheet']): EndOfPiece =>
  highSideOf(pitch, {
    legs: [4, face],
    turns: [-(90 + pitch)],
    lay: matchingLay(cornerAt(pitch), 'right', 0),
    face: [2],
    sheet,
  })

const pitchArbitrary = fc.double({ min: 5, max: 45, noNaN: true })

const PITCH_3 = degrees(Math.atan(3 / 12))

const facesOf = (piece: EndOfPiece): [FoldedFace, FoldedFace] => {
  const [roof, face] = foldedEnd({ ...piece, stub: 12 })
  if (!roof || !face) throw new Error('There are two legs.')
  return [roof, face]
}

/** Degrees from square, on the leg's own face. */
const cutAngle = ({ cut: [from, to] }: FoldedFace): number =>
  degrees(Math.atan2(Math.abs(to.x - from.x), Math.hypot(to.y - from.y, to.z - from.z)))

describe('the corner of a gable and a plumb-faced high side', () => {
  it('cuts the legs in the plane of the roof at 45 on both pieces', () => {
    fc.assert(
      fc.property(pitchArbitrary, (pitch) => {
        for (const piece of [gable(pitch, 6, STEEL), highSide(pitch, 6, STEEL)]) {
          expect(cutAngle(facesOf(piece)[0])).toBeCloseTo(45, 9)
        }
      }),
    )
  })

  it("cuts the gable's face plumb: its lower edge is short by width x tan a", () => {
    fc.assert(
      fc.property(pitchArbitrary, (pitch) => {
        const [, face] = facesOf(gable(pitch, 6, STEEL))
        const [top, bottom] = face.cut
        const width = top.z - bottom.z
        expect(width).toBeCloseTo(6 - STEEL.thickness / 2, 9)
        expect(top.x - bottom.x).toBeCloseTo(width * Math.tan(radians(pitch)), 9)
        expect(cutAngle(face)).toBeCloseTo(pitch, 9)
      }),
    )
  })

  it('cuts the level face square, and it hangs plumb', () => {
    fc.assert(
      fc.property(pitchArbitrary, (pitch) => {
        const [, face] = facesOf(highSide(pitch, 6, STEEL))
        expect(cutAngle(face)).toBeCloseTo(0, 9)
        expect(face.cut[1].y).toBeCloseTo(face.cut[0].y, 9)
        expect(face.cut[1].z).toBeLessThan(face.cut[0].z)
      }),
    )
  })

  it('closes where the level face is the gable face / cos a', () => {
    fc.assert(
      fc.property(pitchArbitrary, (pitch) => {
        const closed = closeEnds(
          gable(pitch, 6, FOIL),
          highSide(pitch, 6 / Math.cos(radians(pitch)), FOIL),
        )
        expect(closed).toMatchObject({ ok: true, closes: true })
        if (!closed.ok) return
        for (const { gap, leg, closesOn } of closed.a) {
          expect(gap).toBeLessThan(1e-5)
          expect(closesOn).toBe(leg)
        }
      }),
    )
  })

  it('else leaves the step between the bottoms, the roof legs closed', () => {
    fc.assert(
      fc.property(pitchArbitrary, fc.double({ min: 0.05, max: 2, noNaN: true }), (pitch, step) => {
        const closed = closeEnds(
          gable(pitch, 6, FOIL),
          highSide(pitch, 6 / Math.cos(radians(pitch)) - step, FOIL),
        )
        expect(closed).toMatchObject({
          ok: true,
          closes: false,
          a: [{ closesOn: 1 }, { nearest: 2, closesOn: null }],
        })
        if (closed.ok) expect(closed.a[1]?.gap).toBeCloseTo(step, 4)
      }),
    )
  })

  it('closes 6 in. at 3 in 12 on 6 3/16 in the shop’s own sheet', () => {
    const closed = closeEnds(gable(PITCH_3, 6, STEEL), highSide(PITCH_3, 6 + 3 / 16, STEEL))
    expect(closed).toMatchObject({ ok: true, closes: true })
  })

  it('finds the corner where the gable was drawn from a kick at its foot', () => {
    // Kick, face up, roof leg in to the left: the corner's point is where the roof leg begins.
    const drawn = { lay: 60, face: [1, 2], sheet: FOIL }
    const face = 6 / Math.cos(radians(PITCH_3))
    const closed = closeEnds(
      gableOf(PITCH_3, { ...drawn, legs: [0.75, 6, 4], turns: [30, 90] }),
      highSideOf(PITCH_3, { ...drawn, legs: [0.75, face, 4], turns: [30, 90 + PITCH_3] }),
    )
    expect(closed).toMatchObject({
      ok: true,
      shift: { x: 0, y: 0, z: 0 },
      a: [{ leg: 1 }, { leg: 2, closesOn: 2 }, { leg: 3, closesOn: 3 }],
    })
  })
})

/* Common practice, no source. */
describe('a gable piece for a roof edge of 63 in.', () => {
  it('is a 64 in. strip with a 1 in. tab on one end', () => {
    const laid = layStrip({
      profile: profileOf([4, 6], [-90]),
      sheet: STEEL,
      pieceLength: 63,
      ends: {
        left: SQUARE_END,
        right: { kind: 'square', tabs: [{ leg: 2, length: 1 }] },
        lowEnd: 'left',
      },
    })
    expect(laid).toMatchObject({ ok: true, layout: { blankLength: 64 } })
  })
})
