import { act, configure, screen, waitFor, within } from '@testing-library/react'
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { DEMO_BRAKES } from '#shared/bend-plan/demo-brakes'
import type { Order } from '#shared/orders/order.schema'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { fakeApi, json, personOf, problem } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { lineOf, ORDER_ID, orderOf, pieceCode } from './counter-data'

const ORDER = `GET /api/orders/${ORDER_ID}`
const BRAKE_ID = '7a1e5c52-0d7f-4c39-9f0e-2b1d7a3c5e01'
const RELEASE = `POST /api/orders/${ORDER_ID}/release`

async function open(order: Order = orderOf()) {
  const api = fakeApi({
    'GET /api/session': () => json({ person: personOf('counter'), csrfToken: 'inside' }),
    'GET /api/orders': () => json({ items: [], next: null }),
    [ORDER]: () => json(order),
    'GET /api/brakes': () =>
      json({ items: [{ id: BRAKE_ID, position: 1, brake: DEMO_BRAKES[0] }] }),
    'POST /api/plans': () => problem('internal'),
  })
  const app = renderApp(`/counter/orders/${ORDER_ID}`)
  await screen.findByRole('heading', { name: 'F-2047' })
  return { api, ...app }
}

const releaseButton = () => screen.findByRole('button', { name: 'Release to the floor' })

const released = (): Order =>
  orderOf({
    state: 'released',
    version: 4,
    lines: [
      lineOf('A', {
        pieces: [1, 2, 3].map((sequence) => ({
          code: pieceCode(sequence),
          sequence,
          hand: null,
          state: 'queued',
          since: '2026-03-02T15:00:00.000Z',
          by: 'Ines Calder',
          runNumber: 121,
          bundleCode: null,
          rackPlace: null,
          remakeOf: null,
        })),
      }),
    ],
  })

// Pages are loaded when somebody goes there, which is not what is tested here; and a busy machine
// takes longer over a page than the second that is waited otherwise.
vi.setConfig({ testTimeout: 20_000, hookTimeout: 30_000 })
configure({ asyncUtilTimeout: 8000 })
beforeAll(async () => {
  await import('@/pages/counter/OrderPage')
})

beforeEach(() => {
  holdCsrfToken(null)
  // Drawings follow the theme of the system where the person left it so.
  vi.stubGlobal('matchMedia', () => ({
    matches: false,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }))
})

describe('releasing an order', () => {
  it('sends the version that was looked at, and shows the codes of its pieces', async () => {
    const { api, user } = await open()
    api.on(RELEASE, () => json(released()))
    api.on(ORDER, () => json(released()))
    await user.click(await releaseButton())
    expect(await screen.findByRole('link', { name: pieceCode(2) })).toHaveAttribute(
      'href',
      `/counter/pieces/${pieceCode(2)}`,
    )
    expect(api.seen(RELEASE)[0]?.body).toEqual({ version: 3 })
    expect(screen.queryByRole('button', { name: 'Release to the floor' })).not.toBeInTheDocument()
  })

  it('is barred while a line bends nowhere, which stands out', async () => {
    await open(orderOf({ lines: [lineOf('A'), lineOf('C', { bendsOn: [] })] }))
    expect(await releaseButton()).toBeDisabled()
    expect(screen.getByRole('alert')).toHaveTextContent('No brake of the shop bends C as drawn')
  })

  it('against the checks needs a brake and a reason, and sends both', async () => {
    const nowhere = lineOf('C', { bendsOn: [] })
    const { api, user } = await open(orderOf({ lines: [lineOf('A'), nowhere] }))
    api.on(RELEASE, () => json(released()))
    await user.click(screen.getByText('Release it all the same'))
    await screen.findByRole('option', { name: DEMO_BRAKES[0]?.name ?? '' })
    await user.selectOptions(await screen.findByLabelText('On which brake'), BRAKE_ID)
    expect(await releaseButton()).toBeDisabled()
    await user.type(screen.getByLabelText('Why it can be made'), 'In two stages')
    await user.click(await screen.findByRole('button', { name: 'Release against the checks' }))
    await waitFor(() =>
      expect(api.seen(RELEASE)[0]?.body).toEqual({
        version: 3,
        overrides: [{ lineId: nowhere.id, brakeId: BRAKE_ID, reason: 'In two stages' }],
      }),
    )
  })

  it('that is refused names the lines and the reasons', async () => {
    const { api, user } = await open()
    api.on(RELEASE, () =>
      problem('cannot-bend', {
        errors: [{ path: 'lines.1', message: 'Long folder: the throat is too small.' }],
      }),
    )
    await user.click(await releaseButton())
    const refusal = await screen.findByRole('alert')
    expect(within(refusal).getByRole('link', { name: 'C Trim C' })).toBeVisible()
    expect(within(refusal).queryByText('Trim A')).not.toBeInTheDocument()
    expect(await within(refusal).findByText('Long folder: the throat is too small.')).toBeVisible()
  })

  it('that comes too late says who was faster and what it is now', async () => {
    const { api, user } = await open()
    const now = orderOf({
      state: 'withdrawn',
      version: 4,
      events: [
        ...orderOf().events,
        {
          id: 2,
          kind: 'withdrawn',
          at: '2026-03-02T15:00:00.000Z',
          by: 'Pell Aster',
          text: 'The roof is off',
        },
      ],
    })
    api.on(RELEASE, () => problem('wrong-state', { current: now }))
    api.on(ORDER, () => json(now))
    await user.click(await releaseButton())
    const refusal = await screen.findByRole('alert')
    expect(refusal).toHaveTextContent('Pell Aster withdrew it')
    expect(refusal).toHaveTextContent('The roof is off')
    await waitFor(() =>
      expect(
        screen.queryByRole('button', { name: 'Release to the floor' }),
      ).not.toBeInTheDocument(),
    )
  })

  it('waits until a change that came meanwhile has been looked at', async () => {
    const { api, user, live } = await open()
    const amended = orderOf({
      version: 4,
      events: [
        ...orderOf().events,
        { id: 2, kind: 'amended', at: '2026-03-02T15:00:00.000Z', by: 'Pell Aster', text: '' },
      ],
    })
    api.on(ORDER, () => json(amended))
    act(() => live.last().open())
    act(() => live.last().send({ topic: 'orders', entityId: ORDER_ID }))
    expect(await screen.findByText(/Pell Aster amended it, /)).toBeVisible()
    expect(await releaseButton()).toBeDisabled()
    await user.click(screen.getByRole('button', { name: 'I have looked at it' }))
    api.on(RELEASE, () => json(released()))
    await user.click(await releaseButton())
    await waitFor(() => expect(api.seen(RELEASE)[0]?.body).toEqual({ version: 4 }))
  })
})

describe('a question to the crew', () => {
  it('is sent with its words, and the order then waits for the answer', async () => {
    const { api, user } = await open()
    const ask = `POST /api/orders/${ORDER_ID}/questions`
    const asked = orderOf({
      state: 'question',
      version: 4,
      events: [
        ...orderOf().events,
        {
          id: 2,
          kind: 'question',
          at: '2026-03-02T15:00:00.000Z',
          by: 'Ines Calder',
          text: 'Which face is painted?',
        },
      ],
    })
    api.on(ask, () => json(asked))
    api.on(ORDER, () => json(asked))
    await user.click(screen.getByRole('button', { name: 'Send back with a question' }))
    const dialog = await screen.findByRole('alertdialog')
    const send = within(dialog).getByRole('button', { name: 'Send the question' })
    expect(send).toBeDisabled()
    await user.type(
      within(dialog).getByRole('textbox', { name: 'Your question' }),
      'Which face is painted?',
    )
    await user.click(send)
    expect(await screen.findByRole('button', { name: 'Answer for the crew' })).toBeVisible()
    expect(api.seen(ask)[0]?.body).toEqual({ version: 3, text: 'Which face is painted?' })
    expect(screen.queryByText(/changed while you had it open/)).not.toBeInTheDocument()
  })
})
