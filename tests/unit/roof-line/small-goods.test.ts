import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { isAtMost } from '#shared/geometry/tolerance'
import { fastenerMarks } from '#shared/roof-line/fastener-marks'
import { GOODS_DEFAULTS, goodsSettingsSchema } from '#shared/roof-line/goods-settings.schema'
import { goodSchema } from '#shared/roof-line/goods.schema'
import { roofLineSchema } from '#shared/roof-line/roof-line.schema'
import { roofPieces } from '#shared/roof-line/roof-pieces'
import type { GoodsLine } from '#shared/roof-line/small-goods'
import { smallGoods } from '#shared/roof-line/small-goods'

const BLUE = { id: '6b1f3b62-6a39-4b4c-9d3a-0a1f3f5f1b01', painted: true }
const COPPER = { id: '6b1f3b62-6a39-4b4c-9d3a-0a1f3f5f1b02', painted: false }

const runOf = (length: number, pieceLength = 120) => {
  const found = roofPieces(roofLineSchema.parse({ length, pieceLength, lap: 4, mode: 'full' }))
  if (!found.ok) throw new Error(JSON.stringify(found.problems))
  return found.answer
}

/** 20 ft of eave in three pieces, 9 in. of girth. */
const EAVE: GoodsLine = {
  run: runOf(240),
  girth: 9,
  stock: BLUE,
  times: 1,
  fastenedLegs: 1,
  tabs: 0,
  taped: false,
  closed: false,
}

const goods = (lines: readonly GoodsLine[], settings = {}) =>
  Object.fromEntries(
    smallGoods(lines, goodsSettingsSchema.parse(settings)).map((good) => [good.kind, good]),
  )

describe('fastener marks', () => {
  const settings = { fastenerSpacing: 21, fastenerStart: 4.5, fastenerEnd: 3 }

  it('start at their distance and go on at the spacing, closed by one at the other end', () => {
    expect(fastenerMarks(120, settings)).toEqual([4.5, 25.5, 46.5, 67.5, 88.5, 109.5, 117])
  })

  it('have none twice where the spacing comes out', () => {
    expect(fastenerMarks(112.5, settings)).toEqual([4.5, 25.5, 46.5, 67.5, 88.5, 109.5])
    expect(
      fastenerMarks(1.2, { fastenerSpacing: 1, fastenerStart: 0.1, fastenerEnd: 0.1 }),
    ).toEqual([0.1, 1.1])
  })

  it('are one in the middle of a line too short for both ends', () => {
    expect(fastenerMarks(7.5, settings)).toEqual([4.5])
    expect(fastenerMarks(7, settings)).toEqual([3.5])
  })

  it('are the same on both legs: pieces, laps and girth play no part', () => {
    const inPieces = { ...EAVE, fastenedLegs: 2 }
    const inOne = { ...inPieces, run: runOf(240, 240), girth: 20 }
    const count = 2 * fastenerMarks(240, settings).length
    expect(goods([inPieces], settings).fasteners?.quantity).toBe(count)
    expect(goods([inOne], settings).fasteners?.quantity).toBe(count)
  })

  it('are never further apart than the spacing, nor an end further from its last', () => {
    const inches = (min: number, max: number) => fc.double({ min, max, noNaN: true })
    fc.assert(
      fc.property(inches(0.1, 600), inches(1, 48), inches(0, 12), inches(0, 12), (...given) => {
        const [length, fastenerSpacing, fastenerStart, fastenerEnd] = given
        const marks = fastenerMarks(length, { fastenerSpacing, fastenerStart, fastenerEnd })
        const [first, last] = [marks[0] ?? NaN, marks.at(-1) ?? NaN]
        expect(isAtMost(0, first) && isAtMost(last, length)).toBe(true)
        if (marks.length > 1) {
          expect(first).toBe(fastenerStart)
          expect(isAtMost(length - last, fastenerEnd)).toBe(true)
        }
        marks.slice(1).forEach((mark, index) => {
          expect(mark).toBeGreaterThan(marks[index] ?? NaN)
          expect(isAtMost(mark - (marks[index] ?? NaN), fastenerSpacing)).toBe(true)
        })
      }),
    )
  })
})

describe('small goods', () => {
  it('of an eave: fasteners, rivets and tape at its two laps, sealant, paint', () => {
    expect(smallGoods([EAVE], GOODS_DEFAULTS)).toEqual([
      // 3, 15, … 231 are 20 marks, and one at 237.
      { kind: 'fasteners', quantity: 21, unit: 'each', stockId: BLUE.id, note: '' },
      // Twice 9 in. are 1 1/2 ft.
      { kind: 'butylTape', quantity: 2, unit: 'foot', stockId: null, note: '' },
      { kind: 'rivets', quantity: 8, unit: 'each', stockId: BLUE.id, note: '' },
      { kind: 'sealant', quantity: 1, unit: 'tube', stockId: null, note: '' },
      { kind: 'touchUpPaint', quantity: 1, unit: 'bottle', stockId: BLUE.id, note: '' },
    ])
  })

  it('go along the line where it is taped and closed', () => {
    const along = goods([{ ...EAVE, taped: true, closed: true }], { panelModule: 16 })
    expect(along.butylTape?.quantity).toBe(22)
    expect(along.closures).toMatchObject({ quantity: 15, unit: 'each', stockId: null })
  })

  it('closes a panel that is cut like a whole one, on every line', () => {
    const cut = { ...EAVE, closed: true, times: 2 }
    expect(goods([cut], { panelModule: 36 }).closures?.quantity).toBe(14)
    // 0.1 x 3 is a hair over 0.3 in binary, and no fourth panel.
    const tenths = { ...EAVE, closed: true, run: { length: 0.1 * 3, laps: [] } }
    expect(goods([tenths], { panelModule: 0.1 }).closures?.quantity).toBe(3)
  })

  it('rivets and seals tabs', () => {
    const tabbed = goods([{ ...EAVE, run: { length: 96, laps: [] }, tabs: 2 }], {
      rivetsPerTab: 3,
      beadFeetPerTube: 0.5,
    })
    expect(tabbed.rivets?.quantity).toBe(6)
    expect(tabbed.sealant?.quantity).toBe(3)
  })

  it('add lines up before they count whole units', () => {
    expect(goods([EAVE, EAVE]).butylTape?.quantity).toBe(3)
    expect(goods([{ ...EAVE, times: 2 }]).butylTape?.quantity).toBe(3)
    expect(goods([{ ...EAVE, times: 4 }]).butylTape?.quantity).toBe(6)
  })

  it('keep colors apart, and paint is for painted ones', () => {
    const both = smallGoods([EAVE, { ...EAVE, stock: COPPER }, EAVE], GOODS_DEFAULTS)
    expect(both.filter(({ kind }) => kind === 'rivets')).toMatchObject([
      { stockId: BLUE.id, quantity: 16 },
      { stockId: COPPER.id, quantity: 8 },
    ])
    expect(both.filter(({ kind }) => kind === 'touchUpPaint')).toMatchObject([
      { stockId: BLUE.id, quantity: 1 },
    ])
  })

  it('leave out what nobody takes', () => {
    const nothing = { ...EAVE, times: 0 }
    expect(smallGoods([nothing], GOODS_DEFAULTS)).toEqual([])
    expect(smallGoods([], GOODS_DEFAULTS)).toEqual([])
  })

  it.each(['times', 'fastenedLegs', 'tabs'] as const)('refuse %s that are no count', (name) => {
    for (const count of [-1, 0.5, NaN]) {
      expect(() => smallGoods([{ ...EAVE, [name]: count }], GOODS_DEFAULTS)).toThrow(
        `lines.0.${name}`,
      )
    }
  })

  it('are lines that an order takes, the order of the lines playing no part in the counts', () => {
    const lineArbitrary = fc.record({
      run: fc.record({
        length: fc.integer({ min: 24, max: 960 }),
        laps: fc.array(fc.constant(12), { maxLength: 6 }),
      }),
      girth: fc.integer({ min: 2, max: 30 }),
      stock: fc.constantFrom(BLUE, COPPER),
      times: fc.integer({ min: 0, max: 4 }),
      fastenedLegs: fc.integer({ min: 0, max: 2 }),
      tabs: fc.integer({ min: 0, max: 2 }),
      taped: fc.boolean(),
      closed: fc.boolean(),
    })
    fc.assert(
      fc.property(fc.array(lineArbitrary, { maxLength: 5 }), (lines) => {
        const counted = smallGoods(lines, GOODS_DEFAULTS)
        for (const good of counted) expect(goodSchema.parse(good)).toEqual(good)
        const backwards = smallGoods(lines.toReversed(), GOODS_DEFAULTS)
        expect(new Set(backwards.map((good) => JSON.stringify(good)))).toEqual(
          new Set(counted.map((good) => JSON.stringify(good))),
        )
      }),
    )
  })
})

describe('settings', () => {
  it('are each the shop’s own, and nonsense is refused', () => {
    expect(goodsSettingsSchema.parse({ fastenerSpacing: 21 })).toEqual({
      ...GOODS_DEFAULTS,
      fastenerSpacing: 21,
    })
    for (const wrong of [
      { fastenerSpacing: 0 },
      { fastenerStart: -1 },
      { beadFeetPerTube: 0 },
      { panelModule: NaN },
      { rivetsPerLap: 1.5 },
      { spacing: 12 },
    ]) {
      expect(goodsSettingsSchema.safeParse(wrong).success).toBe(false)
    }
  })
})
