import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest'
import { newKey } from '@/lib/api/idempotency'
import {
  amendSlot,
  changeSlot,
  clearSlot,
  draftsOf,
  dropBroken,
  followDrafts,
  newOrderSlot,
  readSlot,
  type Slot,
} from '@/features/orders/draft/draft-store'
import { withLine } from '@/features/orders/draft/order-draft'
import { line } from './draft-lines'

const PREFIX = 'foldyard.order-draft.'

let person: string
let slot: Slot

beforeEach(() => {
  person = newKey()
  slot = newOrderSlot(person, newKey())
})

afterEach(() => vi.restoreAllMocks())

/** What another tab's write looks like here: the storage has changed and an event tells of it. */
function writeInAnotherTab(text: string | null) {
  if (text === null) window.localStorage.removeItem(PREFIX + slot)
  else window.localStorage.setItem(PREFIX + slot, text)
  window.dispatchEvent(new StorageEvent('storage', { key: PREFIX + slot }))
}

describe('a slot', () => {
  test('is read as the same object until it changes', () => {
    expect(readSlot(slot)).toBe(readSlot(slot))
    const before = readSlot(slot)
    changeSlot(slot, (draft) => ({ ...draft, notes: 'Call first' }))
    expect(readSlot(slot)).not.toBe(before)
  })

  test('is on the device with every change', () => {
    changeSlot(slot, (draft) => withLine(draft, line()))
    const { draft, kept } = readSlot(slot)
    expect(kept).toBe(true)
    expect(JSON.parse(window.localStorage.getItem(PREFIX + slot) ?? '')).toEqual({
      version: 2,
      draft,
    })
  })

  test('has another key after it was cleared, so that the next order is another one', () => {
    changeSlot(slot, (draft) => withLine(draft, line()))
    const before = readSlot(slot).draft.key
    clearSlot(slot)
    expect(readSlot(slot).draft.lines).toEqual([])
    expect(readSlot(slot).draft.key).not.toBe(before)
    expect(window.localStorage.getItem(PREFIX + slot)).toBeNull()
  })

  test('follows what another tab writes and clears', () => {
    const told = vi.fn()
    const leave = followDrafts(told)
    changeSlot(slot, (draft) => ({ ...draft, notes: 'here' }))
    const text = window.localStorage.getItem(PREFIX + slot) ?? ''
    writeInAnotherTab(text.replace('here', 'there'))
    expect(readSlot(slot).draft.notes).toBe('there')
    writeInAnotherTab(null)
    expect(readSlot(slot).draft.notes).toBe('')
    expect(told).toHaveBeenCalledTimes(3)
    leave()
  })

  test('that the device refuses to keep says so and goes on in this tab', () => {
    vi.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
      throw new DOMException('The quota has been exceeded.', 'QuotaExceededError')
    })
    changeSlot(slot, (draft) => ({ ...draft, notes: 'Call first' }))
    expect(readSlot(slot)).toMatchObject({ kept: false, draft: { notes: 'Call first' } })
  })
})

describe('a kept draft that cannot be read', () => {
  test('is reported with its text and put aside, not written over', () => {
    window.localStorage.setItem(PREFIX + slot, '{"version":7}')
    expect(readSlot(slot).broken).toBe('{"version":7}')
    changeSlot(slot, (draft) => ({ ...draft, notes: 'new' }))
    expect(readSlot(slot).broken).toBe('{"version":7}')
    expect(window.localStorage.getItem(`foldyard.order-draft-broken.${slot}`)).toBe('{"version":7}')
  })

  test('is gone once the person has thrown it away', () => {
    window.localStorage.setItem(PREFIX + slot, 'rubbish')
    readSlot(slot)
    dropBroken(slot)
    expect(readSlot(slot).broken).toBeNull()
    expect(window.localStorage.length).toBe(0)
  })
})

describe('the drafts of a person', () => {
  test('are those begun on the device, new ones and amendments, without blank ones', () => {
    const amendment = amendSlot(person, newKey())
    readSlot(newOrderSlot(person, newKey()))
    changeSlot(slot, (draft) => withLine(draft, line()))
    changeSlot(amendment, (draft) => ({ ...draft, notes: 'shorter' }))
    expect(draftsOf(person).map((each) => each.slot)).toEqual([amendment, slot].sort())
    expect(draftsOf(person)).toBe(draftsOf(person))
  })

  test('are not those of another person on the same device', () => {
    changeSlot(slot, (draft) => withLine(draft, line()))
    expect(draftsOf(newKey())).toEqual([])
  })
})
