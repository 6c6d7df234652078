import type { OrderState } from '#shared/orders/order.schema'
import type { Language } from '#shared/people/people.contract'
import type { GoodKind, GoodUnit } from '#shared/roof-line/goods.schema'
import type { Metal } from '#shared/stock/stock.schema'
import { ORDER_EN } from '#shared/sheets/words/order-sheet-en'
import { ORDER_ES } from '#shared/sheets/words/order-sheet-es'

/** What an order sheet says beyond `SheetWords`, in one language. Lengths and counts come as text. */
export interface OrderSheetWords {
  readonly title: string
  readonly company: string
  readonly job: string
  readonly pitch: string
  readonly orderedBy: string
  readonly ordered: string
  readonly neededBy: string
  readonly poNumber: string
  readonly state: string
  readonly states: Readonly<Record<OrderState, string>>
  readonly notes: string
  readonly metal: Readonly<Record<Metal, string>>
  readonly stock: (color: string, thickness: string, metal: string) => string
  readonly drawn: string
  readonly weightOfAll: string
  readonly price: string
  /** Dimensions that the figure has no room for. */
  readonly notInFigure: string
  readonly leg: (leg: number, length: string) => string
  readonly bend: (bend: number, angle: string) => string
  readonly hem: (edge: 'A' | 'B', length: string) => string
  readonly ends: {
    readonly title: string
    readonly bothSquare: string
    readonly left: (end: string) => string
    readonly right: (end: string) => string
    readonly square: string
    readonly over: (length: string) => string
    readonly under: (length: string) => string
    readonly miter: (cut: string) => string
    readonly plumb: (slope: string) => string
    readonly corner: (angle: string) => string
    readonly free: string
    /** A tab with its length; several with theirs. */
    readonly tabs: (lengths: readonly string[]) => string
    readonly low: { readonly left: string; readonly right: string }
  }
  readonly goods: {
    readonly title: string
    readonly kind: Readonly<Record<GoodKind, string>>
    readonly amount: Readonly<Record<GoodUnit, (count: number, shown: string) => string>>
    readonly inColor: (kind: string, color: string) => string
  }
  readonly totals: {
    readonly title: string
    readonly pieces: string
    readonly weight: string
    readonly price: string
    readonly priceMeaning: string
  }
  readonly wind: string
}

const WORDS: Readonly<Record<Language, OrderSheetWords>> = { en: ORDER_EN, es: ORDER_ES }

export const orderSheetWords = (language: Language): OrderSheetWords => WORDS[language]
