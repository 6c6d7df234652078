import { describe, expect, test } from 'vitest'
import {
  emptyDraft,
  type DraftGood,
  isBlank,
  nextMark,
  withGoods,
  withLine,
  withLinePatch,
  withoutLine,
} from '@/features/orders/draft/order-draft'
import { readDraft, writeDraft } from '@/features/orders/draft/draft-text'
import { draft, line, RAKE, STOCK } from './draft-lines'

const SCREWS: DraftGood = {
  key: 'screws',
  kind: 'fasteners',
  quantity: 250,
  unit: 'each',
  stockId: null,
  note: '',
}

/** As a device kept it before pieces had ends and orders small goods. */
const FIRST_VERSION = JSON.stringify({
  version: 1,
  draft: {
    key: 'key-of-the-draft',
    poNumber: '',
    neededBy: '2026-12-20',
    notes: 'Call first',
    lines: [
      {
        key: 'line-a',
        mark: 'A',
        name: 'North rake',
        profile: RAKE,
        stockId: STOCK.id,
        quantity: 6,
        length: 120,
      },
    ],
    sending: false,
    amends: null,
  },
})

const marked = (...marks: string[]) => ({
  lines: marks.map((mark) => line({ key: mark, mark })),
})

describe('the next mark', () => {
  test('is A in an empty order', () => {
    expect(nextMark({ lines: [] })).toBe('A')
  })

  test('is the first letter that is free, also in a gap', () => {
    expect(nextMark(marked('A', 'C'))).toBe('B')
    expect(nextMark(marked('A', 'B', 'C'))).toBe('D')
  })

  test('counts a small letter and blanks around it as the same mark', () => {
    expect(nextMark(marked(' a ', 'b'))).toBe('C')
  })

  test('passes over marks that are words', () => {
    expect(nextMark(marked('north rake'))).toBe('A')
  })

  test('goes on with AA after Z', () => {
    const alphabet = Array.from({ length: 26 }, (_, index) => String.fromCharCode(65 + index))
    expect(nextMark(marked(...alphabet))).toBe('AA')
    expect(nextMark(marked(...alphabet, 'AA'))).toBe('AB')
  })
})

describe('the lines of a draft', () => {
  test('a line goes to the end, or back to the place it was taken from', () => {
    const three = ['A', 'B', 'C'].reduce(
      (before, mark) => withLine(before, line({ key: mark, mark })),
      emptyDraft('a-key-of-its-own'),
    )
    const removed = withoutLine(three, 'B')
    expect(removed.lines.map(({ mark }) => mark)).toEqual(['A', 'C'])
    expect(withLine(removed, line({ key: 'B', mark: 'B' }), 1)).toEqual(three)
  })

  test('a patch changes its own line alone', () => {
    const before = draft({ lines: [line(), line({ key: 'other', mark: 'B' })] })
    const after = withLinePatch(before, 'other', { quantity: 9 })
    expect(after.lines.map(({ quantity }) => quantity)).toEqual([6, 9])
    expect(after.lines[0]).toBe(before.lines[0])
  })

  test('a change of the lines takes back an order that is on its way', () => {
    const sent = draft({ sending: true })
    expect(withLine(sent, line({ key: 'b' })).sending).toBe(false)
    expect(withLinePatch(sent, 'line-a', { length: 96 }).sending).toBe(false)
    expect(withoutLine(sent, 'line-a').sending).toBe(false)
    expect(withGoods(sent, [SCREWS])).toMatchObject({ sending: false, goods: [SCREWS] })
  })

  test('the key stays with the draft through every change', () => {
    expect(withoutLine(withLine(draft(), line({ key: 'b' })), 'b').key).toBe('key-of-the-draft')
  })
})

test('a draft is blank until something is written into it', () => {
  expect(isBlank(emptyDraft('a-key-of-its-own'))).toBe(true)
  expect(isBlank({ ...emptyDraft('a-key-of-its-own'), notes: 'Call first' })).toBe(false)
  expect(isBlank(draft())).toBe(false)
  expect(isBlank(withGoods(emptyDraft('a-key-of-its-own'), [SCREWS]))).toBe(false)
})

describe('a kept draft', () => {
  test('is read back as it was written', () => {
    const kept = draft({ lines: [line({ stockId: null, quantity: null, length: null })] })
    expect(readDraft(writeDraft(kept))).toEqual({ ok: true, draft: kept })
  })

  test('keeps ends and hands in which measures are still missing', () => {
    const kept = draft({
      lines: [
        line({
          ends: {
            left: { kind: 'lap', side: 'under', length: null, tabs: [{ leg: 2, length: null }] },
            right: {
              kind: 'miter',
              plane: { corner: { slopeIn: 0, slopeOut: null, plan: -90 } },
              lay: null,
              legs: [{ leg: 1, plane: { plumb: null } }],
              tabs: [],
            },
            lowEnd: 'left',
          },
          hands: { drawn: 'left', left: 3, right: null },
          quantity: null,
        }),
      ],
      goods: [{ ...SCREWS, quantity: null }],
    })
    expect(readDraft(writeDraft(kept))).toEqual({ ok: true, draft: kept })
  })

  test('of the first version is read: its pieces are square and it takes no small goods', () => {
    expect(readDraft(FIRST_VERSION)).toEqual({
      ok: true,
      draft: draft({ notes: 'Call first', lines: [line({ quantity: 6 })], goods: [] }),
    })
  })

  test('of the first version is written as the second from then on', () => {
    const read = readDraft(FIRST_VERSION)
    if (!read.ok) throw new Error('The draft was not read.')
    expect(JSON.parse(writeDraft(read.draft))).toMatchObject({ version: 2 })
    expect(readDraft(writeDraft(read.draft))).toEqual(read)
  })

  test.each([
    ['not JSON', '{"version":1,'],
    ['a version to come', writeDraft(draft()).replace('"version":2', '"version":3')],
    ['a field that is not known', writeDraft(draft()).replace('"notes"', '"remarks"')],
    ['a leg that is no number', writeDraft(draft()).replace('[4,4,0.75]', '[4,"4",0.75]')],
  ])('that cannot be read comes back as its text: %s', (_, text) => {
    expect(readDraft(text)).toEqual({ ok: false, text })
  })
})
