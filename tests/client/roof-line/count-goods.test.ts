import { describe, expect, test } from 'vitest'
import { GOODS_DEFAULTS } from '#shared/roof-line/goods-settings.schema'
import type { Good } from '#shared/roof-line/goods.schema'
import type { DraftGood, DraftLine } from '@/features/orders/draft/order-draft'
import {
  canShare,
  countGoods,
  coveredLines,
  runOf,
  usualChoice,
  withCounted,
} from '@/features/roof-line/model/count-goods'
import { newRoofLine } from '@/features/roof-line/model/draft-roof-line'
import { line, STOCK } from '../orders/draft-lines'

const counted = (...lines: DraftLine[]) =>
  coveredLines(lines.map((each) => ({ line: each, stock: STOCK, girth: 8.75 })))
const onlyLine = (...lines: DraftLine[]) => {
  const [covered, more] = counted(...lines)
  if (!covered || more) throw new Error('One covered line is expected.')
  return covered
}

const covers = { roofLine: 'north', line: { ...newRoofLine(6, 120), lap: 6 } }

describe('lines on the roof', () => {
  test('one for each order line, with the usual lap', () => {
    const covered = onlyLine(line({ quantity: 3, length: 120 }))
    expect(runOf(covered, 1)).toEqual({ length: 352, laps: [116, 232] })
  })

  test('one for the order lines that cover it together, with its own lap', () => {
    const covered = onlyLine(
      line({ quantity: 2, length: 120, covers }),
      line({ key: 'rest', mark: 'B', quantity: 1, length: 60, covers }),
    )
    expect(covered.marks).toEqual(['A', 'B'])
    expect(runOf(covered, 1)).toEqual({ length: 288, laps: [114, 228] })
  })

  test('a pair covers two lines alike', () => {
    const covered = onlyLine(
      line({ quantity: 4, length: 120, hands: { drawn: 'left', left: 2, right: 2 } }),
    )
    expect(covered.usualTimes).toBe(2)
    expect(runOf(covered, 2)).toEqual({ length: 236, laps: [116] })
  })

  test('lines without a number or a length are left out', () => {
    expect(counted(line({ quantity: null }), line({ key: 'b', length: null }))).toEqual([])
  })

  test('pieces that cannot be shared out evenly are told', () => {
    const covered = onlyLine(line({ quantity: 3 }))
    expect([1, 2, 3, null, 0].map((times) => canShare(covered, times))).toEqual([
      true,
      false,
      true,
      false,
      false,
    ])
    const choice = { ...usualChoice(covered), times: 2 }
    expect(countGoods([covered], () => choice, GOODS_DEFAULTS)).toBeNull()
  })
})

describe('counted goods', () => {
  const tabbed = line({
    quantity: 2,
    length: 120,
    ends: {
      left: { kind: 'square', tabs: [{ leg: 1, length: 1 }] },
      right: { kind: 'square', tabs: [] },
      lowEnd: null,
    },
  })

  test('follow laps, tabs and what a person says of the line', () => {
    const covered = counted(tabbed)
    const goods = countGoods(
      covered,
      (each) => ({ ...usualChoice(each), closed: true }),
      GOODS_DEFAULTS,
    )
    const quantity = (kind: Good['kind']) => goods?.find((good) => good.kind === kind)?.quantity
    // 236 in. with one lap and a tab on each of two pieces.
    expect(quantity('rivets')).toBe(4 + 2 * 2)
    expect(quantity('closures')).toBe(Math.ceil(236 / 36))
    expect(quantity('touchUpPaint')).toBe(1)
    const without = countGoods(
      covered,
      (each) => ({ ...usualChoice(each), fastenedLegs: 0 }),
      GOODS_DEFAULTS,
    )
    expect(without?.some(({ kind }) => kind === 'fasteners')).toBe(false)
  })

  const screws: Good = {
    kind: 'fasteners',
    quantity: 40,
    unit: 'each',
    stockId: STOCK.id,
    note: '',
  }
  const written = (change: Partial<DraftGood>): DraftGood => ({
    ...screws,
    key: 'screws',
    ...change,
  })

  test('take the place of those of their kind and color and keep their note', () => {
    expect(
      withCounted([written({ quantity: 7, note: 'long ones' })], [screws], () => 'new'),
    ).toEqual([written({ quantity: 40, note: 'long ones' })])
  })

  test('leave what was written by hand', () => {
    const own = written({ key: 'own', stockId: null, quantity: 5 })
    expect(withCounted([own], [screws], () => 'new')).toEqual([own, written({ key: 'new' })])
  })
})
