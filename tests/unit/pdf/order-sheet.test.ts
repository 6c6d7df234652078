import { describe, expect, it } from 'vitest'
import { PAGE_SIZES } from '#server/adapters/pdf/page-frame'
import { orderPdf } from '#server/features/sheets/order-sheet/order-pdf'
import { orderSpeech } from '#server/features/sheets/order-sheet/order-speech'
import type { PrintedLine, PrintedOrder } from '#server/features/sheets/order-sheet/printed-order'
import { ORDER_STATES } from '#shared/orders/order.schema'
import type { Language, Units } from '#shared/people/people.contract'
import { GOOD_KINDS, GOOD_UNITS } from '#shared/roof-line/goods.schema'
import type { PriceBook } from '#shared/pricing/price-book.schema'
import { quoteLine } from '#shared/pricing/line-quote'
import type { Paper } from '#shared/sheets/sheets.contract'
import { printMoney } from '#shared/units/money'
import { factsOf, fontsOf, outsideOf, overlapsOf, textOfPages, wordsOf } from '../../support/paper'
import {
  LONG_WORDS,
  MITER_AND_LAP,
  sheetLine,
  STOCK,
  TWELVE_BENDS,
} from '../../support/paper-lines'
import { NAMED_PROFILES } from '../drawing/named-profiles'

interface Manner {
  readonly language: Language
  readonly units: Units
  readonly paper: Paper
}
const US: Manner = { language: 'en', units: 'fraction', paper: 'letter' }
const ES: Manner = { language: 'es', units: 'mm', paper: 'a4' }

const line = (given: Parameters<typeof sheetLine>[0] = {}): PrintedLine => ({
  ...sheetLine(given),
  price: null,
})

const order = (given: Partial<PrintedOrder> = {}): PrintedOrder => ({
  number: 2047,
  company: { id: 'b0f6a3c8-5a4f-4d5c-8d1d-0a63f1b7a201', name: 'Tamsin & Reed' },
  job: { id: '2f0c1f1e-7d1f-4c3f-9b62-5a3f6f1e0a11', name: 'Larkspur barn', pitchRise: 6 },
  orderedBy: 'Tamsin Larkspur',
  poNumber: '1187',
  neededBy: '2026-03-09',
  submittedAt: '2026-03-02T15:00:00.000Z',
  state: 'submitted',
  pieceCount: 6,
  notes: '',
  priceCents: null,
  lines: [line()],
  goods: [],
  ...given,
})

const draw = (printed: PrintedOrder, { language, units, paper }: Manner = US) =>
  orderPdf(printed, orderSpeech({ language, units }, 'America/Chicago'), {
    paper,
    language,
    at: new Date('2026-03-02T15:00:00Z'),
    day: 'Mar 2, 2026',
  })

const plain = async (bytes: Uint8Array) =>
  (await textOfPages(bytes)).map((page) => page.replace(/\s+/g, ' '))

const hands = { drawn: 'left', left: 4, right: 2 } as const
const named = ['coping', 'W valley', 'square spiral', 'many ribs', 'flat strip', 'open hems'].map(
  (name) => {
    const profile = NAMED_PROFILES[name]
    if (!profile) throw new Error(`There is no profile ${name}.`)
    return line({ name, profile })
  },
)
const goods = GOOD_KINDS.map((kind, index) => ({
  kind,
  quantity: index === 0 ? 1250 : index,
  unit: GOOD_UNITS[index % GOOD_UNITS.length] ?? 'each',
  colorName: index % 2 === 0 ? 'Kiln 4' : null,
  note: index === 0 ? 'Color-matched heads with a washer, as on the last order. '.repeat(3) : '',
}))
const dressed = line({ ends: MITER_AND_LAP, hands, statedGirth: 9.5 })
const longest = line({
  ...LONG_WORDS,
  profile: TWELVE_BENDS,
  ends: MITER_AND_LAP,
  hands,
  statedGirth: 30,
})

const BOOK: PriceBook = {
  currency: 'USD',
  stocks: [{ stockId: STOCK.id, rates: [{ upTo: 12, centsPerFoot: 300 }] }],
  perBend: 25,
  perHem: 50,
  perDressedEnd: 400,
  setUp: 1000,
  minimum: 2000,
}

const ORDERS: [string, PrintedOrder][] = [
  ['one gable', order()],
  ['a pair with a miter and a lap', order({ lines: [dressed] })],
  [
    'the longest words, twelve bends, notes and small goods',
    order({
      company: { id: '', name: LONG_WORDS.company },
      job: { id: '', name: LONG_WORDS.job, pitchRise: 6.25 },
      poNumber: LONG_WORDS.poNumber,
      notes: `Gate code at the office.\n\n${'Stack it by the north wall, the drip on top. '.repeat(21)}`,
      lines: [longest, dressed, longest],
      goods,
    }),
  ],
  ['shapes that are hard to dimension', order({ lines: named })],
  ['fifty lines', order({ lines: Array.from({ length: 50 }, () => line()) })],
  ['notes of a line each', order({ notes: Array(500).fill('x').join('\n') })],
]

describe.each(ORDERS)('the order sheet of %s', (_name, printed) => {
  it.each([US, ES])('has room for everything: %o', async (manner) => {
    const words = await wordsOf(await draw(printed, manner))
    expect(overlapsOf(words)).toEqual([])
    expect(outsideOf(words, PAGE_SIZES[manner.paper], 20)).toEqual([])
  })
})

describe('the order sheet', () => {
  it('says whose order it is, what was ordered and what to mind, on one page', async () => {
    const bytes = await draw(order({ notes: 'Gate code at the office.', goods: goods.slice(0, 1) }))
    const [page = '', ...others] = await plain(bytes)
    expect(others).toEqual([])
    for (const text of [
      'Order sheet',
      'F-2047',
      'Company Tamsin & Reed',
      'Job Larkspur barn',
      'Pitch 6/12',
      'Ordered by Tamsin Larkspur',
      'State submitted',
      'Needed by Monday, March 9, 2026',
      'Ordered Mar 2, 2026, 9:00 AM',
      'P.O. number 1187',
      'Gate code at the office.',
      'C Gable, north rake',
      `Piece, tip to tip 10' 6"`,
      'Girth (stretch-out) 10 1/4"',
      'Strip width 10 5/32"',
      'A piece weighs 10 lb',
      'All of them weigh 60.2 lb',
      'Kiln 4, 24 ga steel',
      'Ends both square',
      '3 1/2"',
      '5 1/2"',
      '1,250 pieces · Fasteners, Kiln 4 · Color-matched heads',
      'Pieces 6',
      'Cut edges and burrs are sharp: gloves on.',
      'Edge metal that must resist wind uplift is designed and tested to its own standard',
      'not whether it keeps a roof on.',
      'page 1 of 1',
    ]) {
      expect(page).toContain(text)
    }
    expect((await fontsOf(bytes)).every(({ embedded }) => embedded)).toBe(true)
    expect(await factsOf(bytes)).toMatchObject({ Title: 'Order sheet F-2047', Tagged: 'yes' })
  })

  it('says ends, hands, the longer blank and the girth that the crew expects', async () => {
    const [page = ''] = await plain(await draw(order({ lines: [dressed] })))
    for (const text of [
      'Pieces 6: 4 L · 2 R',
      'The drawing shows left hand',
      `Cut the blank 10' 6 11/16"`,
      'Girth the crew expects 9 1/2"',
      'Left: miter, plumb at 26.6° + 1" tab',
      'Right: lap 4" over',
      'Low end left',
    ]) {
      expect(page).toContain(text)
    }
  })

  it('leaves out a price that is not known, and prints one that is', async () => {
    const [without = ''] = await plain(await draw(order()))
    expect(without).not.toContain('Price')
    const { price } = quoteLine({ ...sheetLine(), stockId: STOCK.id }, BOOK)
    if (price === null) throw new Error('The book has no rate for the gable.')
    const priced = order({ lines: [{ ...line(), price }], priceCents: 123_456 })
    const [page = ''] = await plain(await draw(priced))
    expect(page).toContain(`Price ${printMoney(price.cents, 'en')}`)
    expect(page).toContain('Price $1,234.56')
    expect(page).toContain('Without tax and small goods.')
  })

  it('is Spanish and metric for who reads it so', async () => {
    const [page = ''] = await plain(await draw(order({ lines: [dressed], goods }), ES))
    for (const text of [
      'Hoja del pedido',
      'Se necesita para lunes, 9 de marzo de 2026',
      'Estado enviado',
      'Kiln 4, acero 24 ga',
      'Izquierdo: inglete, a plomo con 26.6° + lengüeta de 25.4 mm',
      'Material menudo',
      'Los remates de borde que deben resistir la succión del viento',
      'página 1 de 1',
    ]) {
      expect(page).toContain(text)
    }
  })

  it.each(ORDER_STATES)('has a word for the state %s in both languages', async (state) => {
    for (const manner of [US, ES]) {
      const { order: words } = orderSpeech(manner, 'America/Chicago')
      const [page = ''] = await plain(await draw(order({ state }), manner))
      expect(page).toContain(`${words.state} ${words.states[state]}`)
    }
  })

  it('puts two lines on a page and breaks none over two', async () => {
    const marks = Array.from({ length: 20 }, (_, index) => `M${index + 1}`)
    const pages = await plain(await draw(order({ lines: marks.map((mark) => line({ mark })) })))
    expect(pages.length).toBeLessThanOrEqual(11)
    pages.forEach((page, index) => expect(page).toContain(`page ${index + 1} of ${pages.length}`))
    for (const mark of marks) {
      const on = pages.filter((page) => page.includes(`${mark} Gable, north rake`))
      expect(on).toHaveLength(1)
    }
    const count = (page: string, text: string) => page.split(text).length - 1
    for (const page of pages) {
      expect(count(page, 'Gable, north rake')).toBe(count(page, 'Strip, left side up'))
    }
  })

  it('lists in words what its figure has no room for', async () => {
    const ribs = named.find(({ name }) => name === 'many ribs')
    if (!ribs) throw new Error('There are no ribs.')
    const [page = ''] = await plain(await draw(order({ lines: [ribs] })))
    expect(page).toMatch(/Not in the figure: .*bend \d+ 90°/)
  })

  it('keeps the lines of a note as they were written', async () => {
    const [page = ''] = await textOfPages(await draw(order({ notes: 'First.\n\nThird.' })))
    expect(page).toMatch(/First\.\n+\s*Third\./)
  })
})
