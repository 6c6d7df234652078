import { configure, screen, within } from '@testing-library/react'
import { beforeAll, describe, expect, it, vi } from 'vitest'
import type { Order, OrderLine } from '#shared/orders/order.schema'
import { quoteLine } from '#shared/pricing/line-quote'
import { sumPrices } from '#shared/pricing/price-line'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { startLocales } from '@/locales/index'
import { fakeApi, json, personOf } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { lineOf, ORDER_ID, orderOf } from '../counter/counter-data'
import { openOrder } from '../ends/order-page'
import { line, STOCK } from '../orders/draft-lines'
import { BOOK, bookAnswer } from './a-price-book'

vi.setConfig({ testTimeout: 20_000, hookTimeout: 30_000 })
configure({ asyncUtilTimeout: 8000 })
beforeAll(async () => {
  await import('@/pages/counter/OrderPage')
  await import('@/pages/roof/orders/OrderPage')
  await import('@/pages/roof/orders/NewOrderPage')
})

const NOT_IN = 'Small goods and tax are not in it.'

const rowsOf = (table: HTMLElement): (string | null)[][] =>
  within(table)
    .getAllByRole('row')
    .map((row) => [...row.children].map((cell) => cell.textContent))

describe('an order being written', () => {
  it('has the price of each line, made of what it is made of, and of all lines', async () => {
    const tabbed = { kind: 'square', tabs: [{ leg: 1, length: 1 }] } as const
    const { user, card } = await openOrder(
      {
        lines: [
          line({
            ends: {
              left: { kind: 'square', tabs: [] },
              right: { ...tabbed, tabs: [...tabbed.tabs] },
              lowEnd: null,
            },
          }),
          line({ key: 'line-b', mark: 'B', name: 'Short rake', quantity: 1, length: 24 }),
        ],
      },
      bookAnswer(),
    )
    const rake = card('North rake')
    await user.click(await rake.findByText('$217.00'))
    expect(rowsOf(rake.getByRole('table', { name: 'What the price is made of' }))).toEqual([
      [`Metal, 10'$3.00 a foot: girth 8 3/4", rate to 9"`, '$30.00'],
      ['2 bends$0.25 each', '$0.50'],
      ['1 dressed end$4.00 each', '$4.00'],
      ['One piece', '$34.50'],
      ['6 pieces', '$207.00'],
      ['Set-up, once a line', '$10.00'],
      ['The line', '$217.00'],
    ])
    const short = card('Short rake')
    await user.click(await short.findByText('$20.00'))
    expect(rowsOf(short.getByRole('table')).slice(-3)).toEqual([
      ['Set-up, once a line', '$10.00'],
      ['To the least a line costs', '$3.50'],
      ['The line', '$20.00'],
    ])
    expect(screen.getByText('$237.00')).toBeVisible()
    expect(screen.getAllByText(NOT_IN)).toHaveLength(1)
  })

  it('has no sum as long as a line has no price, and names the line', async () => {
    await openOrder(
      { lines: [line(), line({ key: 'line-b', mark: 'B', quantity: null })] },
      bookAnswer(),
    )
    expect(await screen.findByText('Line B has no price yet.')).toBeVisible()
    expect(screen.getByText('not known yet')).toBeVisible()
  })

  it('says that the shop has no price book', async () => {
    await openOrder({ lines: [line()] }, bookAnswer(null))
    expect(await screen.findByText(/the shop has no price book yet/)).toBeVisible()
  })
})

describe('an order that is in', () => {
  const pricedLine = (mark: string): OrderLine => {
    const bare = lineOf(mark)
    return { ...bare, ...quoteLine({ ...bare, stockId: STOCK.id }, BOOK) }
  }
  const open = async (place: 'counter' | 'roof', lines: OrderLine[], language: 'en' | 'es') => {
    holdCsrfToken(null)
    await startLocales(language)
    vi.stubGlobal('matchMedia', () => new EventTarget())
    const order: Order = orderOf({ lines, priceCents: sumPrices(lines.map(({ price }) => price)) })
    fakeApi({
      'GET /api/session': () =>
        json({
          person: personOf(place === 'counter' ? 'counter' : 'crewLead', { language }),
          csrfToken: 'inside',
        }),
      'GET /api/orders': () => json({ items: [], next: null }),
      [`GET /api/orders/${ORDER_ID}`]: () => json(order),
      'GET /api/brakes': () => json({ items: [] }),
    })
    const app = renderApp(`/${place}/orders/${ORDER_ID}`)
    await screen.findByRole('heading', { name: 'F-2047' })
    return app
  }

  // 10 ft at $3 and a bend, three times, and the set-up: $100.75 a line.
  it.each(['counter', 'roof'] as const)('shows its price at the %s, once', async (place) => {
    const { user } = await open(place, [pricedLine('A'), pricedLine('C')], 'en')
    expect(screen.getByText('$201.50')).toBeVisible()
    expect(screen.getAllByText(NOT_IN)).toHaveLength(1)
    const [first] = screen.getAllByText('$100.75')
    if (!first) throw new Error('No line has its price.')
    await user.click(first)
    expect(screen.getByRole('row', { name: '3 pieces $90.75' })).toBeVisible()
  })

  it('has no sum where a line has no price', async () => {
    const bare = lineOf('C', { price: null, noPrice: { code: 'stockNotPriced', widest: null } })
    await open('counter', [pricedLine('A'), bare], 'en')
    expect(screen.getByText('Line C has no price yet.')).toBeVisible()
    expect(screen.getByText(/no rate for this stock/)).toBeVisible()
    expect(screen.getByText('not known yet')).toBeVisible()
  })

  it('tells it in Spanish', async () => {
    await open('roof', [pricedLine('A')], 'es')
    expect(screen.getByText('Precio de las líneas')).toBeVisible()
    expect(screen.getByText('El material menudo y los impuestos no están incluidos.')).toBeVisible()
    await startLocales('en')
  })
})
