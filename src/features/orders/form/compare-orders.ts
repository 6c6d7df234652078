import type { Order, OrderLine } from '#shared/orders/order.schema'
import type { DraftLine, OrderDraft } from '../draft/order-draft'

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
}

const folded = (mark: string): string => mark.trim().toLowerCase()

const lineDiffers = (mine: DraftLine, theirs: OrderLine): boolean =>
  mine.name.trim() !== theirs.name ||
  mine.quantity !== theirs.quantity ||
  mine.length !== theirs.length ||
  mine.stockId !== theirs.stock.id ||
  JSON.stringify(mine.profile) !== JSON.stringify(theirs.profile)

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
    lines: [...pairs, ...onlyTheirs.map((line) => ({ mine: null, theirs: line, differs: true }))],
  }
}

/** True when taking over the order as it is now would change nothing in the draft. */
export const sameContent = ({ neededBy, poNumber, notes, lines }: OrderComparison): boolean =>
  !neededBy && !poNumber && !notes && lines.every(({ differs }) => !differs)
