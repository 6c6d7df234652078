import { describe, expect, test } from 'vitest'
import { pieceEndsSchema } from '#shared/ends/end.schema'
import type { Good } from '#shared/roof-line/goods.schema'
import { BOTH_SQUARE } from '@/features/ends/model/end-edits'
import { compareOrders, sameContent } from '@/features/orders/form/compare-orders'
import { draftOfOrder, orderBody } from '@/features/orders/form/order-body'
import { line, order, RAKE } from './draft-lines'

const theirs = order()
const mine = draftOfOrder(theirs, 'key-of-the-draft')

test('an order as a draft says the same as the order', () => {
  expect(sameContent(compareOrders(mine, theirs))).toBe(true)
  expect(orderBody(mine).lines[0]).toMatchObject({ mark: 'A', quantity: 6, length: 120 })
  expect(orderBody(mine).lines[0]).not.toHaveProperty('covers')
})

describe('what differs', () => {
  test('is told field by field', () => {
    const { neededBy, poNumber, notes } = compareOrders(
      { ...mine, poNumber: 'T-2' },
      { ...theirs, neededBy: '2026-12-21' },
    )
    expect({ neededBy, poNumber, notes }).toEqual({ neededBy: true, poNumber: true, notes: false })
  })

  test('blanks around a text are no difference', () => {
    expect(sameContent(compareOrders({ ...mine, notes: '  ' }, theirs))).toBe(true)
  })

  test.each([
    ['quantity', { quantity: 7 }],
    ['length', { length: 96 }],
    ['name', { name: 'South rake' }],
    ['drawing', { profile: { ...RAKE, legs: [4, 5, 0.75] } }],
    ['ends', { ends: { ...BOTH_SQUARE, lowEnd: 'left' as const } }],
    ['hands', { hands: { drawn: 'left' as const, left: 6, right: 0 } }],
    ['expected girth', { statedGirth: 9 }],
  ])('a line by its %s', (_, change) => {
    const changed = { ...mine, lines: mine.lines.map((each) => ({ ...each, ...change })) }
    expect(compareOrders(changed, theirs).lines.map(({ differs }) => differs)).toEqual([true])
  })

  test('square ends of a level piece are no difference from no ends', () => {
    const squared = { ...mine, lines: mine.lines.map((each) => ({ ...each, ends: BOTH_SQUARE })) }
    expect(sameContent(compareOrders(squared, theirs))).toBe(true)
  })

  test('the same ends are no difference, whatever order their parts are written in', () => {
    const lap = { kind: 'lap' as const, side: 'over' as const, length: 4, tabs: [] }
    const again = { tabs: [], length: 4, side: 'over' as const, kind: 'lap' as const }
    const [ours, shops] = [
      { ...BOTH_SQUARE, left: lap },
      { ...BOTH_SQUARE, left: again },
    ]
    const written = { ...mine, lines: mine.lines.map((each) => ({ ...each, ends: ours })) }
    const kept = {
      ...theirs,
      lines: theirs.lines.map((each) => ({ ...each, ends: pieceEndsSchema.parse(shops) })),
    }
    expect(sameContent(compareOrders(written, kept))).toBe(true)
  })

  test('small goods by what they are, how many and in which order', () => {
    const tape: Good = { kind: 'butylTape', quantity: 40, unit: 'foot', stockId: null, note: '' }
    const shops = { ...theirs, goods: [tape] }
    expect(compareOrders(mine, shops).goods).toBe(true)
    expect(compareOrders({ ...mine, goods: [{ ...tape, key: 'a' }] }, shops).goods).toBe(false)
    expect(
      compareOrders({ ...mine, goods: [{ ...tape, key: 'a', quantity: 41 }] }, shops).goods,
    ).toBe(true)
    expect(draftOfOrder(shops, 'another-key').goods).toMatchObject([tape])
  })

  test('lines are told by their marks, though ids change with every amendment', () => {
    const again = { ...theirs, lines: theirs.lines.map((each) => ({ ...each, id: `${each.id}2` })) }
    expect(sameContent(compareOrders(mine, again))).toBe(true)
  })

  test('a line on one side only stands alone', () => {
    const added = { ...mine, lines: [...mine.lines, line({ key: 'b', mark: 'B' })] }
    expect(compareOrders(added, theirs).lines.at(-1)).toMatchObject({ theirs: null, differs: true })
    const emptied = { ...mine, lines: [] }
    expect(compareOrders(emptied, theirs).lines).toMatchObject([{ mine: null, differs: true }])
  })
})
