import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { signatureSchema, type Signature } from '#shared/hand-off/hand-off.contract'
import {
  beginStroke,
  extendStroke,
  isFull,
  isSigned,
  MOST_POINTS,
  MOST_STROKES,
  signaturePath,
  toBox,
} from '@/features/hand-off/signature'

const PAD = { left: 100, top: 50, width: 250, height: 100 }

describe('a place on the pad in units of the box', () => {
  it.each([
    { at: { x: 100, y: 50 }, box: [0, 0] },
    { at: { x: 350, y: 150 }, box: [1000, 400] },
    { at: { x: 225, y: 100 }, box: [500, 200] },
    { at: { x: 101.3, y: 50.6 }, box: [5, 2] },
  ])('$at.x, $at.y', ({ at, box }) => {
    expect(toBox(at, PAD)).toEqual(box)
  })

  it.each([
    { x: 99, y: 60 },
    { x: 351, y: 60 },
    { x: 200, y: 49 },
    { x: 200, y: 151 },
  ])('$x, $y lies beside the pad and is no point', (at) => {
    expect(toBox(at, PAD)).toBeUndefined()
  })

  it('a pad that is not laid out yet takes nothing', () => {
    expect(toBox({ x: 0, y: 0 }, { left: 0, top: 0, width: 0, height: 0 })).toBeUndefined()
  })
})

describe('strokes', () => {
  it('go on where the pen is, without points that cannot be told apart', () => {
    const one = beginStroke([], [10, 10])
    const two = extendStroke(one, [11, 11])
    expect(two).toBe(one)
    expect(extendStroke(two, [20, 10])).toEqual([
      [
        [10, 10],
        [20, 10],
      ],
    ])
  })

  it('begin anew where the pen comes down again', () => {
    expect(beginStroke([[[1, 1]]], [50, 50])).toEqual([[[1, 1]], [[50, 50]]])
  })

  it('that are long are continued by another, from the same point', () => {
    let signature: Signature = beginStroke([], [0, 0])
    for (let index = 1; index <= MOST_POINTS; index += 1) {
      signature = extendStroke(signature, [index % 2 === 0 ? 0 : 100, 200])
    }
    expect(signature.map((stroke) => stroke.length)).toEqual([MOST_POINTS, 2])
    expect(signature[1]?.[0]).toEqual(signature[0]?.at(-1))
  })

  it('stop when the pad is full', () => {
    let signature: Signature = []
    for (let index = 0; index < MOST_STROKES; index += 1) {
      expect(isFull(signature)).toBe(false)
      signature = beginStroke(signature, [index, index])
    }
    expect(isFull(signature)).toBe(true)
    expect(beginStroke(signature, [5, 5])).toBe(signature)
  })

  it('whatever is drawn, the contract takes it', () => {
    const point = fc.record({
      x: fc.integer({ min: 0, max: 500 }),
      y: fc.integer({ min: 0, max: 300 }),
      lift: fc.boolean(),
    })
    fc.assert(
      fc.property(fc.array(point, { maxLength: 400 }), (moves) => {
        let signature: Signature = []
        for (const { x, y, lift } of moves) {
          const at = toBox({ x, y }, PAD)
          if (at) signature = (lift ? beginStroke : extendStroke)(signature, at)
        }
        expect(signatureSchema.safeParse(signature).success).toBe(true)
      }),
    )
  })
})

describe('a signature', () => {
  it('is a line, not a tap', () => {
    expect(isSigned([])).toBe(false)
    expect(isSigned([[[10, 10]]])).toBe(false)
    expect(
      isSigned([
        [[10, 10]],
        [
          [10, 10],
          [90, 40],
        ],
      ]),
    ).toBe(true)
  })

  it('is drawn as lines, and a lone point as a dot', () => {
    expect(
      signaturePath([
        [
          [1, 2],
          [30, 40],
        ],
        [[5, 6]],
      ]),
    ).toBe('M1 2L30 40M5 6L5 6')
  })
})
