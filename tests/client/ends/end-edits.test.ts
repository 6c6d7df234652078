import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { DraftEnd, DraftEnds } from '@/features/ends/model/draft-end'
import { completeEnds } from '@/features/ends/model/draft-end'
import {
  BOTH_SQUARE,
  copiedMirrored,
  endsToKeep,
  layOf,
  planeOfLeg,
  SQUARE,
  withEnd,
  withKind,
  withLay,
  withLegPlane,
  withTab,
} from '@/features/ends/model/end-edits'
import {
  handChoice,
  otherHand,
  withHandChoice,
  withHandCount,
  withQuantity,
  type Handed,
} from '@/features/ends/model/hand-edits'

const MITER: DraftEnd = {
  kind: 'miter',
  plane: { plumb: 26.5 },
  lay: -30,
  legs: [],
  tabs: [{ leg: 2, length: 1 }],
}

describe('ends of a line', () => {
  test('that are square and level are no ends', () => {
    expect(endsToKeep(BOTH_SQUARE)).toBeNull()
    expect(endsToKeep({ ...BOTH_SQUARE, lowEnd: 'left' })).not.toBeNull()
    expect(endsToKeep(withEnd(BOTH_SQUARE, 'right', withTab(SQUARE, 1, 1)))).not.toBeNull()
  })

  test('another kind keeps the tabs', () => {
    const lap = withKind(MITER, 'lap', { plane: { plumb: 0 }, lay: 0 })
    expect(lap).toEqual({ kind: 'lap', side: 'over', length: 4, tabs: [{ leg: 2, length: 1 }] })
  })

  test('a tab is put on, changed and taken away, legs in order', () => {
    const two = withTab(withTab(SQUARE, 3, 1), 1, 2)
    expect(two.tabs.map(({ leg }) => leg)).toEqual([1, 3])
    expect(withTab(two, 3, null).tabs).toContainEqual({ leg: 3, length: null })
    expect(withTab(two, 3, undefined).tabs.map(({ leg }) => leg)).toEqual([1])
  })

  test('a leg has a cut of its own until it is cut as the end again', () => {
    if (MITER.kind !== 'miter') throw new Error('A miter is expected.')
    const own = withLegPlane(MITER, 2, { plumb: 0 })
    expect(planeOfLeg(own, 2)).toEqual({ plumb: 0 })
    expect(withLegPlane(own, 2, null)).toEqual(MITER)
  })

  test('both miters of a piece lie the same way', () => {
    const ends: DraftEnds = { left: MITER, right: MITER, lowEnd: 'left' }
    expect(layOf(withLay(ends, 10))).toBe(10)
    expect(withLay(ends, 10).right).toMatchObject({ lay: 10 })
    expect(layOf(BOTH_SQUARE)).toBeUndefined()
  })

  test('with a measure missing they are not complete', () => {
    const open: DraftEnd = { kind: 'lap', side: 'under', length: null, tabs: [] }
    expect(completeEnds(withEnd(BOTH_SQUARE, 'left', open))).toBeNull()
    expect(completeEnds(withEnd(BOTH_SQUARE, 'left', { ...open, length: 4 }))).not.toBeNull()
  })
})

describe('an end copied to the other, mirrored', () => {
  test('leans the other way and keeps its own end', () => {
    const copied = copiedMirrored({ left: MITER, right: SQUARE, lowEnd: 'left' }, 'left')
    expect(copied).toMatchObject({
      left: MITER,
      right: { kind: 'miter', plane: { plumb: -26.5 }, tabs: [{ leg: 2, length: 1 }] },
      lowEnd: 'left',
    })
  })

  test('changes the slopes of a corner over, so that it leaves what it entered', () => {
    const corner: DraftEnd = {
      ...MITER,
      kind: 'miter',
      lay: 0,
      legs: [],
      plane: { corner: { slopeIn: 10, slopeOut: 0, plan: 90 } },
    }
    const copied = copiedMirrored(withEnd(BOTH_SQUARE, 'right', corner), 'right')
    expect(copied?.left).toMatchObject({
      plane: { corner: { slopeIn: 0, slopeOut: -10, plan: 90 } },
    })
  })

  test('twice is the end itself', () => {
    const once = copiedMirrored({ left: MITER, right: SQUARE, lowEnd: null }, 'left')
    const twice = once && copiedMirrored({ ...once, left: SQUARE }, 'right')
    expect(twice?.left).toEqual(MITER)
  })

  test('waits for what is missing', () => {
    const open: DraftEnd = { kind: 'lap', side: 'over', length: null, tabs: [] }
    expect(copiedMirrored(withEnd(BOTH_SQUARE, 'left', open), 'left')).toBeNull()
  })
})

describe('hands', () => {
  const plain: Handed = { quantity: 6, hands: null }

  test('of a pair share the pieces out, an odd one to the left', () => {
    expect(withHandChoice(plain, 'pair')).toEqual({
      quantity: 6,
      hands: { drawn: 'left', left: 3, right: 3 },
    })
    expect(withHandChoice({ ...plain, quantity: 5 }, 'pair').hands).toMatchObject({
      left: 3,
      right: 2,
    })
  })

  test('a pair is at least one of each', () => {
    expect(withHandChoice({ ...plain, quantity: 1 }, 'pair')).toEqual({
      quantity: 2,
      hands: { drawn: 'left', left: 1, right: 1 },
    })
  })

  test('the drawing shows the hand that was chosen first', () => {
    expect(withHandChoice(plain, 'right').hands?.drawn).toBe('right')
    const pair = withHandChoice(withHandChoice(plain, 'right'), 'pair')
    expect(pair.hands?.drawn).toBe('right')
    expect(otherHand(pair.hands)).toBe('left')
    expect(otherHand(withHandChoice(pair, 'right').hands)).toBeNull()
  })

  test('a right piece may be made of a drawing of the left one', () => {
    const only = withHandChoice(withHandChoice(plain, 'left'), 'right')
    expect(only.hands).toEqual({ drawn: 'left', left: 0, right: 6 })
    expect(otherHand(only.hands)).toBe('right')
  })

  test('a count that is cleared or 0 is still to be typed, and the line stays a pair', () => {
    const { hands } = withHandChoice(plain, 'pair')
    if (!hands) throw new Error('A pair has hands.')
    for (const count of [null, 0]) {
      const typed = withHandCount(hands, 'left', count)
      expect(typed).toEqual({ quantity: null, hands: { ...hands, left: null } })
      expect(handChoice(typed.hands)).toBe('pair')
    }
  })

  test('the quantity is always that of both hands together', () => {
    const choices = fc.constantFrom('none', 'left', 'right', 'pair')
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 400 }),
        fc.array(choices, { minLength: 1, maxLength: 5 }),
        fc.integer({ min: 1, max: 100 }),
        (quantity, chosen, count) => {
          const start: Handed = { quantity, hands: null }
          const handed = chosen.reduce((before, each) => withHandChoice(before, each), start)
          expect(handChoice(handed.hands)).toBe(chosen.at(-1))
          const counted = handed.hands
            ? handChoice(handed.hands) === 'pair'
              ? withHandCount(handed.hands, 'right', count)
              : withQuantity(handed, count)
            : withQuantity(handed, count)
          const { hands } = counted
          if (hands) expect((hands.left ?? NaN) + (hands.right ?? NaN)).toBe(counted.quantity)
          else expect(counted.quantity).toBe(count)
        },
      ),
    )
  })
})
