import { screen, within } from '@testing-library/react'
import { beforeEach, expect, it, vi } from 'vitest'
import type { Order } from '#shared/orders/order.schema'
import type { Role } from '#shared/access/permissions'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { startLocales } from '@/locales/index'
import { fakeApi, json, personOf } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { order, ORDER_ID } from './draft-lines'

const dressed = (): Order => {
  const plain = order()
  return {
    ...plain,
    lines: plain.lines.map((line) => ({
      ...line,
      ends: {
        left: { kind: 'miter', plane: { plumb: 26.6 }, lay: 0, legs: [], tabs: [] },
        right: { kind: 'lap', side: 'under', length: 4, tabs: [{ leg: 1, length: 1 }] },
        lowEnd: 'left',
      },
      hands: { drawn: 'left', left: 2, right: 4 },
      statedGirth: 9,
    })),
    goods: [
      { kind: 'butylTape', quantity: 40, unit: 'foot', stockId: null, note: 'grey' },
      {
        kind: 'rivets',
        quantity: 24,
        unit: 'each',
        stockId: plain.lines[0]?.stock.id ?? null,
        note: '',
      },
    ],
  }
}

beforeEach(async () => {
  holdCsrfToken(null)
  await startLocales('en')
  // jsdom has no color scheme.
  vi.stubGlobal('matchMedia', () => ({
    matches: false,
    addEventListener: vi.fn(),
    removeEventListener: vi.fn(),
  }))
})

it.each<[Role, string]>([
  ['crewLead', `/roof/orders/${ORDER_ID}`],
  ['counter', `/counter/orders/${ORDER_ID}`],
])('a %s reads ends, hands, low end, girth and small goods at %s', async (role, address) => {
  fakeApi({
    'GET /api/session': () => json({ person: personOf(role), csrfToken: 'inside' }),
    [`GET /api/orders/${ORDER_ID}`]: () => json(dressed()),
    'GET /api/orders': () => json({ items: [], next: null }),
    'GET /api/brakes': () => json({ items: [] }),
  })
  renderApp(address)
  const line = within(
    await screen.findByRole('article', { name: 'North rake' }, { timeout: 30_000 }),
  )
  expect(
    line.getByText(/^Left: miter, plumb at 26\.6° · Right: lap 4" under \+ 1" tab$/),
  ).toBeVisible()
  expect(line.getByText('Low end left')).toBeVisible()
  expect(line.getByText('2 L · 4 R')).toBeInTheDocument()
  expect(line.getByText('2 left, 4 right')).toBeInTheDocument()
  expect(
    line.getByText(/Expected is a girth of 9": the drawing is 1\/4" short of it/),
  ).toBeVisible()
  const goods = within(screen.getByRole('region', { name: 'Small goods' }))
  expect(goods.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
    'Butyl tape40 ftgrey',
    'Rivets, Kiln 424 pieces',
  ])
})
