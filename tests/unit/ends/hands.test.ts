import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Hands, PieceEnds } from '#shared/ends/end.schema'
import { endsOfHand, handOf, mirrorEnds } from '#shared/ends/hands'
import { layStrip } from '#shared/ends/lay-strip'
import { degrees } from '#shared/geometry/vector'
import { dressedArbitrary } from '../../support/arbitrary-end'
import { profileOf, STEEL } from '../../support/arbitrary-profile'

const PITCH = degrees(Math.atan(4 / 12))

/** Up the face from its foot, then in over the roof. */
const FACE_AND_ROOF = profileOf([6, 4], [-90])

/**
 * A gable with its peak in the middle, seen facing it. Its left piece climbs from the eave on the
 * left, where it leaves a level run round the corner, to the peak on the right, where it is cut
 * plumb. Edge A is the foot of the face, nearest to whoever looks at the gable.
 */
const leftOfGable: PieceEnds = {
  left: {
    kind: 'miter',
    plane: { corner: { slopeIn: 0, slopeOut: PITCH, plan: 90 } },
    lay: 90,
    legs: [],
    tabs: [],
  },
  right: { kind: 'miter', plane: { plumb: PITCH }, lay: 90, legs: [], tabs: [] },
  lowEnd: 'left',
}

describe('the other hand', () => {
  it('is the mirror image: mirrored twice it is what was drawn', () => {
    fc.assert(
      fc.property(dressedArbitrary, ({ ends }) => {
        expect(mirrorEnds(mirrorEnds(ends))).toEqual(ends)
      }),
    )
  })

  it('of the left piece of a gable falls from the peak on its left to the eave on its right', () => {
    const rightOfGable = mirrorEnds(leftOfGable)
    expect(rightOfGable).toEqual({
      // It rises by -4 in 12 from left to right, plumb at the peak.
      left: { kind: 'miter', plane: { plumb: -PITCH }, lay: 90, legs: [], tabs: [] },
      // It comes down to the corner and the run goes on level, turning left as the other did.
      right: {
        kind: 'miter',
        plane: { corner: { slopeIn: -PITCH, slopeOut: 0, plan: 90 } },
        lay: 90,
        legs: [],
        tabs: [],
      },
      lowEnd: 'right',
    })
  })

  it('has the marks of the drawn one at the other end', () => {
    const layOf = (ends: PieceEnds) => {
      const laid = layStrip({
        profile: FACE_AND_ROOF,
        sheet: STEEL,
        pieceLength: 96,
        ends,
      })
      if (!laid.ok) throw new Error('The piece cannot be laid out.')
      return laid.layout
    }
    const drawn = layOf(leftOfGable)
    const mirrored = layOf(mirrorEnds(leftOfGable))
    drawn.right.marks.forEach(({ along }, index) => {
      expect(mirrored.left.marks[index]?.along).toBeCloseTo(along, 12)
    })
    // Cut plumb at the peak, the face's foot is the shorter edge by its width x tan a.
    const width = 6 - STEEL.thickness / 2
    expect(drawn.right.marks[1]?.along).toBe(0)
    expect(drawn.right.marks[0]?.along).toBeCloseTo((width * 4) / 12, 12)
  })
})

describe('the hand of a piece', () => {
  const hands: Hands = { drawn: 'right', left: 2, right: 1 }

  it('is left for the first of a line and right for the rest', () => {
    expect([1, 2, 3].map((sequence) => handOf(hands, sequence))).toEqual(['left', 'left', 'right'])
  })

  it('is none where the line has none', () => {
    expect(handOf(null, 7)).toBeNull()
  })

  it.each([0, 4, -1, NaN])('is nobody’s for piece %s of 3', (sequence) => {
    expect(() => handOf(hands, sequence)).toThrow(RangeError)
  })

  it('has the ends as drawn, or mirrored', () => {
    expect(endsOfHand(leftOfGable, hands, 'right')).toBe(leftOfGable)
    expect(endsOfHand(leftOfGable, hands, 'left')).toEqual(mirrorEnds(leftOfGable))
    expect(endsOfHand(leftOfGable, null, null)).toBe(leftOfGable)
    expect(endsOfHand(leftOfGable, hands, null)).toBe(leftOfGable)
    expect(endsOfHand(null, hands, 'left')).toBeNull()
  })
})
