import type { Order, OrderLine } from '#shared/orders/order.schema'
import type { Good } from '#shared/roof-line/goods.schema'
import { endsToKeep } from '@/features/ends/model/end-edits'
import type { DraftGood, DraftLine, OrderDraft } from '../draft/order-draft'

export interface LinePair {
  /** Null where the line is on one side only. */
  readonly mine: DraftLine | null
  readonly theirs: OrderLine | null
  readonly differs: boolean
}

export interface OrderComparison {
  readonly neededBy: boolean
  readonly poNumber: boolean
  readonly notes: boolean
  readonly lines: readonly LinePair[]
  readonly goods: boolean
}

const folded = (mark: string): string => mark.trim().toLowerCase()

/** What is not there and what is undefined is the same in JSON. */
const filled = (parts: object): Map<string, unknown> =>
  new Map(Object.entries(parts).filter(([, value]) => value !== undefined))

/** The same content, however its keys are sorted. */
const isSame = (a: unknown, b: unknown): boolean => {
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return a === b
  const [mine, theirs] = [filled(a), filled(b)]
  return (
    mine.size === theirs.size && [...mine].every(([key, value]) => isSame(value, theirs.get(key)))
  )
}

/** Square ends of a level piece are no ends, however they are written. */
const endsOf = ({ ends }: Pick<DraftLine, 'ends'>) => ends && endsToKeep(ends)

const lineDiffers = (mine: DraftLine, theirs: OrderLine): boolean =>
  mine.name.trim() !== theirs.name ||
  mine.quantity !== theirs.quantity ||
  mine.length !== theirs.length ||
  mine.stockId !== theirs.stock.id ||
  mine.statedGirth !== theirs.statedGirth ||
  !isSame(mine.hands, theirs.hands) ||
  !isSame(endsOf(mine), endsOf(theirs)) ||
  !isSame(mine.profile, theirs.profile)

const goodsDiffer = (mine: readonly DraftGood[], theirs: readonly Good[]): boolean =>
  mine.length !== theirs.length ||
  mine.some(
    ({ key: _, ...good }, index) => !isSame({ ...good, note: good.note.trim() }, theirs[index]),
  )

/** What differs (true) between the draft and the order as it is now; lines are told by their marks. */
export function compareOrders(mine: OrderDraft, theirs: Order): OrderComparison {
  const pairs: LinePair[] = mine.lines.map((line) => {
    const other = theirs.lines.find(({ mark }) => folded(mark) === folded(line.mark)) ?? null
    return { mine: line, theirs: other, differs: other === null || lineDiffers(line, other) }
  })
  const matched = new Set(pairs.map(({ theirs: other }) => other?.id))
  const onlyTheirs = theirs.lines.filter(({ id }) => !matched.has(id))
  return {
    neededBy: mine.neededBy !== theirs.neededBy,
    poNumber: mine.poNumber.trim() !== theirs.poNumber,
    notes: mine.notes.trim() !== theirs.notes,
    goods: goodsDiffer(mine.goods, theirs.goods),
    lines: [...pairs, ...onlyTheirs.map((line) => ({ mine: null, theirs: line, differs: true }))],
  }
}

/** True when taking over the order as it is now would change nothing in the draft. */
export const sameContent = ({
  neededBy,
  poNumber,
  notes,
  lines,
  goods,
}: OrderComparison): boolean =>
  !neededBy && !poNumber && !notes && !goods && lines.every(({ differs }) => !differs)
