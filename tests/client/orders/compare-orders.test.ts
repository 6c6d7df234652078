import { describe, expect, test } from 'vitest'
import { compareOrders, sameContent } from '@/features/orders/form/compare-orders'
import { draftOfOrder, orderBody } from '@/features/orders/form/order-body'
import { line, order, RAKE } from './draft-lines'

const theirs = order()
const mine = draftOfOrder(theirs, 'key-of-the-draft')

test('an order as a draft says the same as the order', () => {
  expect(sameContent(compareOrders(mine, theirs))).toBe(true)
  expect(orderBody(mine).lines[0]).toMatchObject({ mark: 'A', quantity: 6, length: 120 })
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
  ])('a line by its %s', (_, change) => {
    const changed = { ...mine, lines: mine.lines.map((each) => ({ ...each, ...change })) }
    expect(compareOrders(changed, theirs).lines.map(({ differs }) => differs)).toEqual([true])
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
