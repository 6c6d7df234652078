import { sheetSpeech, type SheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import type { Language, Units } from '#shared/people/people.contract'
import { orderSheetWords, type OrderSheetWords } from '#shared/sheets/words/order-sheet-words'
import { sheetWords } from '#shared/sheets/words/sheet-words'
import type { Cents } from '#shared/units/brands'
import { printMoney } from '#shared/units/money'

/** How an order sheet says things to the person who reads it. */
export interface OrderSpeech extends SheetSpeech {
  readonly order: OrderSheetWords
  readonly count: (count: number) => string
  readonly money: (cents: Cents) => string
  /** A calendar day, `YYYY-MM-DD`, in words. */
  readonly day: (day: string) => string
  /** A moment by the shop's clock. */
  readonly moment: (iso: string) => string
}

/** `timeZone` is the shop's, an IANA name. */
export function orderSpeech(
  { language, units }: { readonly language: Language; readonly units: Units },
  timeZone: string,
): OrderSpeech {
  const numbers = new Intl.NumberFormat(language)
  // A calendar day has no time zone.
  const days = new Intl.DateTimeFormat(language, { dateStyle: 'full', timeZone: 'UTC' })
  const moments = new Intl.DateTimeFormat(language, {
    dateStyle: 'medium',
    timeStyle: 'short',
    timeZone,
  })
  return {
    ...sheetSpeech(sheetWords(language), units),
    order: orderSheetWords(language),
    count: (count) => numbers.format(count),
    money: (cents) => printMoney(cents, language),
    day: (day) => days.format(new Date(`${day}T00:00:00Z`)),
    moment: (iso) => moments.format(new Date(iso)),
  }
}
