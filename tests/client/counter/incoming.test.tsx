import { configure, screen, waitFor, within } from '@testing-library/react'
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { fakeApi, json, noAnswer, personOf } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import {
  bundleCode,
  bundleOf,
  NO_PIECES,
  ORDER_ID,
  OTHER_ORDER_ID,
  orderSummaryOf,
} from './counter-data'

const SUBMITTED = orderSummaryOf({
  state: 'submitted',
  neededBy: '2099-06-02',
  progress: NO_PIECES,
})
const SOONER = orderSummaryOf({
  id: OTHER_ORDER_ID,
  number: 2050,
  state: 'question',
  neededBy: '2099-05-01',
  progress: NO_PIECES,
})
const READY = orderSummaryOf({
  id: '00000000-0000-4000-8001-000000002001',
  number: 2001,
  neededBy: '2001-01-01',
})

const atCounter = (items = [SUBMITTED, SOONER, READY]) =>
  fakeApi({
    'GET /api/session': () => json({ person: personOf('counter'), csrfToken: 'inside' }),
    'GET /api/orders': () => json({ items, next: null }),
    'GET /api/rack': () => json({ work: [], bundles: [bundleOf(1, { orderId: READY.id })] }),
  })

const numbers = async () => {
  const table = await screen.findByRole('table')
  return within(table)
    .getAllByRole('link')
    .map((link) => link.textContent)
}

// Pages are loaded when somebody goes there, which is not what is tested here; and a busy machine
// takes longer over a page than the second that is waited otherwise.
vi.setConfig({ testTimeout: 20_000, hookTimeout: 30_000 })
configure({ asyncUtilTimeout: 8000 })
beforeAll(async () => {
  await import('@/pages/counter/IncomingPage')
  await import('@/pages/counter/HandOffPage')
  await import('@/pages/counter/HandOffSheetPage')
  await import('@/pages/counter/DuePage')
})

beforeEach(() => holdCsrfToken(null))

describe('incoming orders', () => {
  it('are those to check, the soonest needed first, with counts of all lists', async () => {
    atCounter()
    renderApp('/counter')
    expect(await numbers()).toEqual(['F-2050', 'F-2047'])
    const nav = screen.getByRole('navigation', { name: 'Counter' })
    expect(
      within(nav)
        .getAllByRole('link')
        .map((link) => link.textContent),
    ).toEqual(['Incoming2', 'Hand-off1', 'Due today1'])
  })

  it('are read page by page until there are no more', async () => {
    const api = atCounter()
    api.on('GET /api/orders', ({ url }) =>
      url.includes('after=')
        ? json({ items: [SOONER], next: null })
        : json({ items: [SUBMITTED], next: 'more' }),
    )
    renderApp('/counter')
    expect(await numbers()).toEqual(['F-2050', 'F-2047'])
  })

  it('say what to do when there are none', async () => {
    atCounter([])
    renderApp('/counter')
    expect(await screen.findByText('No order waits to be checked')).toBeVisible()
    expect(screen.getByText(/appears here by itself/)).toBeVisible()
  })

  it('say what is safe when they cannot be read', async () => {
    const api = atCounter()
    api.on('GET /api/orders', noAnswer)
    const { client, user } = renderApp('/counter')
    client.setDefaultOptions({ queries: { retry: false } })
    expect(await screen.findByText('No answer from the server.')).toBeVisible()
    api.on('GET /api/orders', () => json({ items: [SUBMITTED], next: null }))
    await user.click(screen.getByRole('button', { name: 'Try again' }))
    expect(await numbers()).toEqual(['F-2047'])
  })

  it('a search goes through all orders, in one state if one is chosen', async () => {
    const api = atCounter()
    const { user, router } = renderApp('/counter')
    await numbers()
    await user.type(screen.getByRole('searchbox'), 'larkspur')
    await waitFor(() =>
      expect(api.seen('GET /api/orders').some(({ url }) => /search=larkspur/.test(url))).toBe(true),
    )
    await user.selectOptions(screen.getByRole('combobox', { name: 'Show' }), 'ready')
    await waitFor(() =>
      expect(
        api
          .seen('GET /api/orders')
          .some(({ url }) => url.includes('search=larkspur') && url.includes('states=ready')),
      ).toBe(true),
    )
    expect(router.state.location.search).toBe('?q=larkspur&state=ready')
  })

  it('a scanned label leads to the hand-off of its order', async () => {
    const api = atCounter()
    api.on(`GET /api/codes/${bundleCode(1)}`, () =>
      json({
        kind: 'bundle',
        code: bundleCode(1),
        bundleId: bundleOf(1).id,
        orderId: ORDER_ID,
      }),
    )
    const { user, router } = renderApp('/counter')
    await numbers()
    await user.type(screen.getByRole('searchbox'), `${bundleCode(1)}{Enter}`)
    await waitFor(() =>
      expect(router.state.location.pathname).toBe(`/counter/hand-off/${ORDER_ID}`),
    )
  })
})

describe('lists beside it', () => {
  it('hand-off: orders with something on the rack, and where it lies', async () => {
    atCounter()
    renderApp('/counter/hand-off')
    expect(await numbers()).toEqual(['F-2001'])
    expect(await screen.findByText('R1')).toBeVisible()
  })

  it('due: what should have left by today', async () => {
    atCounter()
    renderApp('/counter/due')
    expect(await numbers()).toEqual(['F-2001'])
    expect(screen.getByText(/days late/)).toBeVisible()
  })
})
