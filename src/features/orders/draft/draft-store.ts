import { newKey } from '@/lib/api/idempotency'
import { readDraft, writeDraft } from './draft-text'
import { emptyDraft, isBlank, type OrderDraft } from './order-draft'

/** Under which a draft is kept: `<person>.new.<job>` or `<person>.amend.<order>`. */
export type Slot = `${string}.new.${string}` | `${string}.amend.${string}`

export const newOrderSlot = (personId: string, jobId: string): Slot => `${personId}.new.${jobId}`
export const amendSlot = (personId: string, orderId: string): Slot => `${personId}.amend.${orderId}`

export interface KeptDraft {
  readonly draft: OrderDraft
  /** The text of a draft that was kept here and cannot be read; null when there is none. */
  readonly broken: string | null
  /** False when the device refused to keep the last change: it lives in this tab alone. */
  readonly kept: boolean
}

const PREFIX = 'foldyard.order-draft.'
const BROKEN_PREFIX = 'foldyard.order-draft-broken.'

export interface SlottedDraft {
  readonly slot: Slot
  readonly draft: OrderDraft
}

const held = new Map<Slot, KeptDraft>()
const begun = new Map<string, readonly SlottedDraft[]>()
const listeners = new Set<() => void>()

function announce(): void {
  begun.clear()
  for (const listener of listeners) listener()
}

/** The device's storage; undefined where the browser bars it. */
function storage(): Storage | undefined {
  try {
    return window.localStorage
  } catch {
    // Barred storage throws on access. `kept: false` tells the person.
    return undefined
  }
}

function store(key: string, text: string): boolean {
  try {
    const place = storage()
    place?.setItem(key, text)
    return place !== undefined
  } catch {
    // Full: `kept: false` tells the person.
    return false
  }
}

function load(slot: Slot): KeptDraft {
  const place = storage()
  const aside = place?.getItem(BROKEN_PREFIX + slot) ?? null
  const text = place?.getItem(PREFIX + slot) ?? null
  if (text === null) return { draft: emptyDraft(newKey()), broken: aside, kept: true }
  const read = readDraft(text)
  if (read.ok) return { draft: read.draft, broken: aside, kept: true }
  // Moved aside, so that a new draft does not write over what might still be saved by hand.
  if (store(BROKEN_PREFIX + slot, text)) place?.removeItem(PREFIX + slot)
  return { draft: emptyDraft(newKey()), broken: text, kept: true }
}

/** The same object until the draft changes. */
export function readSlot(slot: Slot): KeptDraft {
  const known = held.get(slot)
  if (known) return known
  const loaded = load(slot)
  held.set(slot, loaded)
  return loaded
}

export function changeSlot(slot: Slot, change: (draft: OrderDraft) => OrderDraft): void {
  const before = readSlot(slot)
  const draft = change(before.draft)
  held.set(slot, { ...before, draft, kept: store(PREFIX + slot, writeDraft(draft)) })
  announce()
}

/** Forgets the draft; the next one has a key of its own. */
export function clearSlot(slot: Slot): void {
  storage()?.removeItem(PREFIX + slot)
  held.set(slot, { ...readSlot(slot), draft: emptyDraft(newKey()), kept: true })
  announce()
}

/** Throws away a draft that could not be read, once the person has been told. */
export function dropBroken(slot: Slot): void {
  storage()?.removeItem(BROKEN_PREFIX + slot)
  held.set(slot, { ...readSlot(slot), broken: null })
  announce()
}

const isSlotOf = (personId: string, name: string): name is Slot =>
  name.startsWith(`${personId}.new.`) || name.startsWith(`${personId}.amend.`)

/** The slots of a person in which something is kept, on the device or in this tab. */
function slotsOf(personId: string): Slot[] {
  const place = storage()
  const stored = Array.from({ length: place?.length ?? 0 }, (_, index) => place?.key(index) ?? '')
    .filter((key) => key.startsWith(PREFIX))
    .map((key) => key.slice(PREFIX.length))
  return [...new Set([...stored, ...held.keys()])].filter((name) => isSlotOf(personId, name)).sort()
}

/** What a person has begun on this device; the same array until a draft changes. */
export function draftsOf(personId: string): readonly SlottedDraft[] {
  const known = begun.get(personId)
  if (known) return known
  const drafts = slotsOf(personId)
    .map((slot) => ({ slot, draft: readSlot(slot).draft }))
    .filter(({ draft }) => !isBlank(draft))
  begun.set(personId, drafts)
  return drafts
}

function onStorage({ key }: StorageEvent): void {
  // Another tab wrote or cleared; null means that everything was cleared.
  if (key === null) held.clear()
  else if (key.startsWith(PREFIX)) {
    for (const slot of [...held.keys()]) if (PREFIX + slot === key) held.delete(slot)
  } else return
  announce()
}

export function followDrafts(listener: () => void): () => void {
  if (listeners.size === 0) window.addEventListener('storage', onStorage)
  listeners.add(listener)
  return () => {
    listeners.delete(listener)
    if (listeners.size === 0) window.removeEventListener('storage', onStorage)
  }
}
