import { describe, expect, test } from 'vitest'
import {
  emptyDraft,
  isBlank,
  nextMark,
  withLine,
  withLinePatch,
  withoutLine,
} from '@/features/orders/draft/order-draft'
import { readDraft, writeDraft } from '@/features/orders/draft/draft-text'
import { draft, line } from './draft-lines'

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
  })

  test('the key stays with the draft through every change', () => {
    expect(withoutLine(withLine(draft(), line({ key: 'b' })), 'b').key).toBe('key-of-the-draft')
  })
})

test('a draft is blank until something is written into it', () => {
  expect(isBlank(emptyDraft('a-key-of-its-own'))).toBe(true)
  expect(isBlank({ ...emptyDraft('a-key-of-its-own'), notes: 'Call first' })).toBe(false)
  expect(isBlank(draft())).toBe(false)
})

describe('a kept draft', () => {
  test('is read back as it was written', () => {
    const kept = draft({ lines: [line({ stockId: null, quantity: null, length: null })] })
    expect(readDraft(writeDraft(kept))).toEqual({ ok: true, draft: kept })
  })

  test.each([
    ['not JSON', '{"version":1,'],
    ['another version', writeDraft(draft()).replace('"version":1', '"version":2')],
    ['a field that is not known', writeDraft(draft()).replace('"notes"', '"remarks"')],
    ['a leg that is no number', writeDraft(draft()).replace('[4,4,0.75]', '[4,"4",0.75]')],
  ])('that cannot be read comes back as its text: %s', (_, text) => {
    expect(readDraft(text)).toEqual({ ok: false, text })
  })
})
