import { describe, expect, test } from 'vitest'
import {
  draftFaults,
  faultsElsewhere,
  faultsOfErrors,
  stillStands,
} from '@/features/orders/form/order-faults'
import { orderBody } from '@/features/orders/form/order-body'
import type { DraftEnds } from '@/features/ends/model/draft-end'
import { SQUARE } from '@/features/ends/model/end-edits'
import type { DraftGood, DraftLine, OrderDraft } from '@/features/orders/draft/order-draft'
import { draft, line, STOCK } from './draft-lines'

const OPEN_LAP: DraftEnds = {
  left: { kind: 'lap', side: 'over', length: null, tabs: [] },
  right: SQUARE,
  lowEnd: null,
}

const TAPE: DraftGood = {
  key: 'tape',
  kind: 'butylTape',
  quantity: 40,
  unit: 'foot',
  stockId: null,
  note: '',
}

const ground = { stocks: [STOCK], today: '2026-12-01' }
const found = (written: OrderDraft) =>
  draftFaults(written, ground).map(({ path, code }) => `${path} ${code}`)
const withLineOf = (change: Partial<DraftLine>) => draft({ lines: [line(change)] })

test('a complete draft has no fault and can be sent', () => {
  expect(found(draft())).toEqual([])
  expect(orderBody(draft()).lines).toHaveLength(1)
})

describe('found before anything is sent', () => {
  test.each<[Partial<DraftLine>, string]>([
    [{ mark: '  ' }, 'lines.0.mark markMissing'],
    [{ mark: 'M'.repeat(21) }, 'lines.0.mark markTooLong'],
    [{ name: '' }, 'lines.0.name nameMissing'],
    [{ stockId: null }, 'lines.0.stockId stockMissing'],
    [{ stockId: '7c4b1f0e-2f6d-4c52-9a0c-0d5be1f7ffff' }, 'lines.0.stockId stockGone'],
    [{ quantity: null }, 'lines.0.quantity quantityMissing'],
    [{ quantity: 0 }, 'lines.0.quantity quantityMissing'],
    [{ quantity: 501 }, 'lines.0.quantity quantityTooMany'],
    [{ length: null }, 'lines.0.length lengthMissing'],
    [{ length: 126.5 }, 'lines.0.length lengthBeyondStock'],
    [{ length: 601 }, 'lines.0.length lengthTooLong'],
    [{ statedGirth: 0 }, 'lines.0.statedGirth girthOutOfRange'],
    [{ statedGirth: 120.5 }, 'lines.0.statedGirth girthOutOfRange'],
    [{ ends: OPEN_LAP }, 'lines.0.ends endsIncomplete'],
    [
      { hands: { drawn: 'left', left: 3, right: null }, quantity: null },
      'lines.0.hands handsMissing',
    ],
  ])('%j: %s', (change, fault) => {
    expect(found(withLineOf(change))).toEqual([fault])
  })

  test('at the bounds themselves nothing is wrong', () => {
    expect(found(withLineOf({ quantity: 500, length: 126, mark: 'M'.repeat(20) }))).toEqual([])
  })

  test('the second line with a mark is at fault, whatever the case', () => {
    const lines = [line(), line({ key: 'b', mark: 'a ' })]
    expect(found(draft({ lines }))).toEqual(['lines.1.mark markTwice'])
  })

  test('a day is needed, and one that has not passed', () => {
    expect(found(draft({ neededBy: '' }))).toEqual(['neededBy neededByMissing'])
    expect(found(draft({ neededBy: '2026-11-30' }))).toEqual(['neededBy neededByPast'])
    expect(found(draft({ neededBy: '2026-12-01' }))).toEqual([])
  })

  test('a day that passed while the order waited may stay', () => {
    const late = draft({ neededBy: '2026-11-30' })
    expect(draftFaults(late, { ...ground, mayStay: '2026-11-30' })).toEqual([])
    expect(draftFaults(late, { ...ground, mayStay: '2026-11-29' })).toHaveLength(1)
  })

  test('an order needs a line', () => {
    expect(found(draft({ lines: [] }))).toEqual(['lines noLines'])
  })

  test('small goods need a number, and a stock that the shop has', () => {
    const goods = [
      { ...TAPE, quantity: null },
      { ...TAPE, quantity: 100_001 },
      { ...TAPE, note: 'n'.repeat(201) },
      { ...TAPE, stockId: '7c4b1f0e-2f6d-4c52-9a0c-0d5be1f7ffff' },
      { ...TAPE, stockId: STOCK.id },
    ]
    expect(found(draft({ goods }))).toEqual([
      'goods.0.quantity goodMissing',
      'goods.1.quantity goodTooMany',
      'goods.2.note noteTooLong',
      'goods.3.stockId stockGone',
    ])
    expect(found(draft({ goods: Array.from({ length: 41 }, () => TAPE) }))).toEqual([
      'goods tooManyGoods',
    ])
  })

  test('stocks are not judged while they are not known', () => {
    expect(draftFaults(draft(), { ...ground, stocks: [] })).toEqual([])
  })
})

describe('field errors of the server', () => {
  test('belong to the field of their path', () => {
    expect(faultsOfErrors([{ path: 'lines.1.length', message: 'Too long.' }])).toEqual([
      { path: 'lines.1.length', code: 'server', message: 'Too long.' },
    ])
  })

  test('inside a drawing belong to the figure of its line, one for all of them', () => {
    const faults = faultsOfErrors([
      { path: 'lines.2.profile.legs.0', message: 'Leg 1 is too short.', code: 'legEatenByBends' },
      { path: 'lines.2.profile.bends.1', message: 'Bend 2 …', code: 'turnOutOfRange' },
    ])
    expect(faults.map(({ path, code }) => [path, code])).toEqual([['lines.2.profile', 'profile']])
  })

  test('inside ends and hands belong to the one place the form has for them', () => {
    const faults = faultsOfErrors([
      { path: 'lines.1.ends.left.length', message: 'Too long.' },
      { path: 'lines.0.hands', message: 'Left and right together must be the quantity.' },
    ])
    expect(faults.map(({ path, code }) => [path, code])).toEqual([
      ['lines.1.ends', 'server'],
      ['lines.0.hands', 'server'],
    ])
  })

  test('that no field of the form shows are said elsewhere, none is lost', () => {
    const faults = faultsOfErrors([
      { path: 'jobId', message: 'No such job.' },
      { path: 'lines.0.length', message: 'Too long.' },
      { path: 'lines.0.ends', message: 'Cannot be cut.' },
      { path: 'lines.4.length', message: 'Too long.' },
      { path: 'goods.0.quantity', message: 'At least one.' },
      { path: 'neededBy', message: 'Passed.' },
    ])
    expect(faultsElsewhere(faults, draft()).map(({ path }) => path)).toEqual([
      'jobId',
      'lines.4.length',
      'goods.0.quantity',
    ])
  })

  test('stand until their own field is changed', () => {
    const [fault] = faultsOfErrors([{ path: 'lines.0.length', message: 'Too long.' }])
    if (!fault) throw new Error('The error was not mapped.')
    const sent = draft()
    expect(stillStands(fault, sent, { ...sent, notes: 'other' })).toBe(true)
    expect(stillStands(fault, sent, withLineOf({ length: 96 }))).toBe(false)
  })

  test('do not pass to the line that moved up when theirs was removed', () => {
    const [fault] = faultsOfErrors([{ path: 'lines.0.length', message: 'Too long.' }])
    if (!fault) throw new Error('The error was not mapped.')
    const other = line({ key: 'b', mark: 'B' })
    expect(stillStands(fault, draft({ lines: [line(), other] }), draft({ lines: [other] }))).toBe(
      false,
    )
  })
})
