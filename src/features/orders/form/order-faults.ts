import type { FieldError } from '#shared/http/problem'
import type { Stock } from '#shared/stock/stock.schema'
import { completeEnds } from '@/features/ends/model/draft-end'
import type { OrderDraft } from '../draft/order-draft'

/** What can be wrong in an order that is being written; each has its words in the texts. */
export type FaultCode =
  | 'noLines'
  | 'tooManyLines'
  | 'markMissing'
  | 'markTooLong'
  | 'markTwice'
  | 'nameMissing'
  | 'nameTooLong'
  | 'stockMissing'
  | 'stockGone'
  | 'quantityMissing'
  | 'quantityTooMany'
  | 'lengthMissing'
  | 'lengthTooLong'
  | 'lengthBeyondStock'
  | 'handsMissing'
  | 'girthOutOfRange'
  | 'endsIncomplete'
  | 'endsFaulty'
  | 'blankBeyondStock'
  | 'tooManyGoods'
  | 'goodMissing'
  | 'goodTooMany'
  | 'noteTooLong'
  | 'neededByMissing'
  | 'neededByPast'
  | 'profile'
  | 'server'

export interface Fault {
  /** Dotted, as in the request: `neededBy`, `lines.0.length`. */
  readonly path: string
  readonly code: FaultCode
  /** Inches, for `lengthBeyondStock` and `blankBeyondStock`. */
  readonly limit?: number
  /** The server's own sentence, in English, for `server`. */
  readonly message?: string
}

const MOST_LINES = 50
const MOST_PIECES = 500
/** Inches; the API's bound on a piece. */
const LONGEST = 600
const MARK_LETTERS = 20
const NAME_LETTERS = 80
/** Inches; the API's bound on a stated girth. */
const WIDEST_GIRTH = 120
const MOST_GOODS = 40
const MOST_OF_A_GOOD = 100_000
const NOTE_LETTERS = 200

interface Ground {
  /** Empty while the stocks are not known yet: then they are not judged. */
  readonly stocks: readonly Stock[]
  /** The day on this device, `YYYY-MM-DD`. */
  readonly today: string
  /** A day that had passed already when the order was read may stay. */
  readonly mayStay?: string
}

const markFault = (text: string, earlier: readonly string[]): FaultCode | null => {
  const mark = text.trim()
  if (mark === '') return 'markMissing'
  if (mark.length > MARK_LETTERS) return 'markTooLong'
  return earlier.some((other) => other.trim().toLowerCase() === mark.toLowerCase())
    ? 'markTwice'
    : null
}

const nameFault = (text: string): FaultCode | null => {
  if (text.trim() === '') return 'nameMissing'
  return text.trim().length > NAME_LETTERS ? 'nameTooLong' : null
}

const quantityFault = (quantity: number | null): FaultCode | null => {
  if (quantity === null || !Number.isInteger(quantity) || quantity < 1) return 'quantityMissing'
  return quantity > MOST_PIECES ? 'quantityTooMany' : null
}

const lengthFault = (length: number | null, stock: Stock | undefined): FaultCode | null => {
  if (length === null || length <= 0) return 'lengthMissing'
  if (length > LONGEST) return 'lengthTooLong'
  return stock && length > stock.longestPiece ? 'lengthBeyondStock' : null
}

const girthFault = (girth: number | null): FaultCode | null =>
  girth !== null && (girth <= 0 || girth > WIDEST_GIRTH) ? 'girthOutOfRange' : null

const goodFault = (quantity: number | null): FaultCode | null => {
  if (quantity === null || !Number.isInteger(quantity) || quantity < 1) return 'goodMissing'
  return quantity > MOST_OF_A_GOOD ? 'goodTooMany' : null
}

/** What the server would refuse, found before anything is sent. Empty when the order may go. */
export function draftFaults(draft: OrderDraft, { stocks, today, mayStay }: Ground): Fault[] {
  const faults: Fault[] = []
  const add = (path: string, code: FaultCode | null, limit?: number) => {
    if (code !== null) faults.push(limit === undefined ? { path, code } : { path, code, limit })
  }
  if (draft.neededBy === '') add('neededBy', 'neededByMissing')
  else if (draft.neededBy < today && draft.neededBy !== mayStay) add('neededBy', 'neededByPast')
  if (draft.lines.length === 0) add('lines', 'noLines')
  if (draft.lines.length > MOST_LINES) add('lines', 'tooManyLines')

  draft.lines.forEach((line, index) => {
    const at = (field: string) => `lines.${index}.${field}`
    const stock = stocks.find(({ id }) => id === line.stockId)
    const earlier = draft.lines.slice(0, index).map(({ mark }) => mark)
    add(at('mark'), markFault(line.mark, earlier))
    add(at('name'), nameFault(line.name))
    if (line.hands && line.quantity === null) add(at('hands'), 'handsMissing')
    else add(at('quantity'), quantityFault(line.quantity))
    add(at('statedGirth'), girthFault(line.statedGirth))
    if (line.ends && completeEnds(line.ends) === null) add(at('ends'), 'endsIncomplete')
    add(at('length'), lengthFault(line.length, stock), stock?.longestPiece)
    if (line.stockId === null) add(at('stockId'), 'stockMissing')
    else if (stocks.length > 0 && !stock) add(at('stockId'), 'stockGone')
  })

  if (draft.goods.length > MOST_GOODS) add('goods', 'tooManyGoods')
  draft.goods.forEach(({ quantity, note, stockId }, index) => {
    add(`goods.${index}.quantity`, goodFault(quantity))
    if (note.trim().length > NOTE_LETTERS) add(`goods.${index}.note`, 'noteTooLong')
    if (stockId !== null && stocks.length > 0 && !stocks.some(({ id }) => id === stockId)) {
      add(`goods.${index}.stockId`, 'stockGone')
    }
  })
  return faults
}

/**
 * `lines.2.profile.bends.0` speaks of the drawing of line 2: shown at its figure; so do ends and
 * hands of a line at the one place that the form has for them.
 */
const PART_PATH = /^(lines\.\d+\.(profile|ends|hands))\b/

/** The server's field errors as faults of the form's fields, one a field, the first counts. */
export function faultsOfErrors(errors: readonly FieldError[]): Fault[] {
  const byPath = new Map<string, Fault>()
  for (const { path, message } of errors) {
    const [, part, name] = PART_PATH.exec(path) ?? []
    const fault: Fault = {
      path: part ?? path,
      code: name === 'profile' ? 'profile' : 'server',
      message,
    }
    if (!byPath.has(fault.path)) byPath.set(fault.path, fault)
  }
  return [...byPath.values()]
}

export const faultAt = (faults: readonly Fault[], path: string): Fault | undefined =>
  faults.find((fault) => fault.path === path)

/** Faults that belong to no field of the form, which has to say them at its foot. */
export const faultsElsewhere = (
  faults: readonly Fault[],
  { lines, goods }: Pick<OrderDraft, 'lines' | 'goods'>,
): Fault[] => {
  const known = new Set(['neededBy', 'poNumber', 'notes', 'lines', 'goods', 'answer'])
  const inLine =
    /^lines\.(\d+)\.(mark|name|stockId|quantity|length|profile|ends|hands|statedGirth)$/
  const inGood = /^goods\.(\d+)\.(quantity|note|stockId)$/
  return faults.filter(({ path }) => {
    if (known.has(path)) return false
    const line = inLine.exec(path)?.[1]
    if (line !== undefined) return Number(line) >= lines.length
    const good = inGood.exec(path)?.[1]
    return good === undefined || Number(good) >= goods.length
  })
}

const fieldOf = (draft: OrderDraft, path: string): unknown => {
  const [, list, index, field] = /^(lines|goods)\.(\d+)\.(\w+)$/.exec(path) ?? []
  if (index !== undefined && field !== undefined) {
    const item = list === 'lines' ? draft.lines[Number(index)] : draft.goods[Number(index)]
    return item && [item.key, new Map<string, unknown>(Object.entries(item)).get(field)]
  }
  return new Map<string, unknown>(Object.entries(draft)).get(path)
}

/** Whether a fault the server found still holds: its field is as it was when it was sent. */
export const stillStands = ({ path }: Fault, sent: OrderDraft, now: OrderDraft): boolean =>
  JSON.stringify(fieldOf(sent, path)) === JSON.stringify(fieldOf(now, path))
