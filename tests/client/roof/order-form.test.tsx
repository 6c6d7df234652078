import { screen, waitFor } from '@testing-library/react'
import { beforeEach, describe, expect, it, test, vi } from 'vitest'
import { writeDraft } from '@/features/orders/draft/draft-text'
import { dayOf } from '@/features/orders/form/today'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { newKey } from '@/lib/api/idempotency'
import { startLocales } from '@/locales/index'
import { fakeApi, json, noAnswer, personOf, problem } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { draft, JOB_ID, line, order, ORDER_ID, STOCK } from '../orders/draft-lines'

const SUBMIT = 'POST /api/orders'
const FORM = `/roof/jobs/${JOB_ID}/order`

const tomorrow = dayOf(new Date(Date.now() + 86_400_000))

const job = {
  id: JOB_ID,
  company: order().company,
  name: 'Harrow Lane house',
  address: '',
  pitchRise: 6,
  version: 1,
  orderCount: 0,
  createdAt: '2026-12-01T15:00:00.000Z',
}

let person: ReturnType<typeof personOf>
let api: ReturnType<typeof fakeApi>
let kept: string

/** A draft that this person began on this device some time ago. */
const keep = (change: Parameters<typeof draft>[0] = {}) =>
  window.localStorage.setItem(kept, writeDraft(draft({ neededBy: tomorrow, ...change })))

beforeEach(async () => {
  holdCsrfToken(null)
  await startLocales('en')
  // jsdom draws nothing, so it cannot scroll and has no color scheme.
  Element.prototype.scrollIntoView = vi.fn()
  vi.stubGlobal('matchMedia', () => ({
    matches: false,
    addEventListener: vi.fn(),
    removeEventListener: vi.fn(),
  }))
  person = personOf('crewLead', { id: newKey() })
  kept = `foldyard.order-draft.${person.id}.new.${JOB_ID}`
  api = fakeApi({
    'GET /api/session': () => json({ person, csrfToken: 'inside' }),
    [`GET /api/jobs/${JOB_ID}`]: () => json(job),
    'GET /api/jobs': () => json({ items: [job], next: null }),
    'GET /api/orders': () => json({ items: [], next: null }),
    [`GET /api/orders/${ORDER_ID}`]: () => json(order()),
    'GET /api/stocks': () => json({ items: [STOCK] }),
    'GET /api/brakes': () => json({ items: [] }),
    [SUBMIT]: () => json(order(), 201),
  })
})

/** The first screen of a test run has its page still to load. */
const submitButton = () =>
  screen.findByRole('button', { name: 'Submit order' }, { timeout: 10_000 })
const keysSent = () => api.seen(SUBMIT).map(({ headers }) => headers.get('idempotency-key'))

describe('submitting', () => {
  it('sends the draft under its own key, forgets it and shows the order', async () => {
    keep()
    const { user, router } = renderApp(FORM)
    await user.click(await submitButton())
    await waitFor(() => expect(router.state.location.pathname).toBe(`/roof/orders/${ORDER_ID}`))
    expect(keysSent()).toEqual(['key-of-the-draft'])
    expect(window.localStorage.getItem(kept)).toBeNull()
    expect(await screen.findByRole('heading', { name: 'F-2047' })).toBeVisible()
  })

  it('sends nothing while something is missing, and goes there', async () => {
    keep({ lines: [line({ length: null })] })
    const { user } = renderApp(FORM)
    await user.click(await submitButton())
    const length = screen.getByRole('textbox', { name: 'Length of a piece' })
    expect(length).toHaveAccessibleDescription('Type how long a piece is.')
    expect(length).toHaveFocus()
    expect(api.seen(SUBMIT)).toEqual([])
  })

  it("shows the server's field error at its field and keeps the draft", async () => {
    keep()
    api.on(SUBMIT, () =>
      problem('invalid-input', {
        errors: [{ path: 'lines.0.length', message: 'The longest piece today is 8 ft.' }],
      }),
    )
    const { user } = renderApp(FORM)
    await user.click(await submitButton())
    const length = await screen.findByRole('textbox', { name: 'Length of a piece' })
    await waitFor(() =>
      expect(length).toHaveAccessibleDescription('The longest piece today is 8 ft.'),
    )
    expect(window.localStorage.getItem(kept)).not.toBeNull()
    await user.clear(length)
    await user.type(length, "8'")
    expect(length).not.toHaveAccessibleDescription()
  })
})

describe('without a signal', () => {
  it('says that the order is kept, and sends it again by itself as the same order', async () => {
    keep()
    api.on(SUBMIT, noAnswer)
    const { user, router } = renderApp(FORM)
    await user.click(await submitButton())
    expect(await screen.findByText('No signal')).toBeVisible()
    api.on(SUBMIT, () => json(order(), 201))
    await waitFor(() => expect(router.state.location.pathname).toBe(`/roof/orders/${ORDER_ID}`), {
      timeout: 5000,
    })
    expect(keysSent()).toEqual(['key-of-the-draft', 'key-of-the-draft'])
  })

  it('a reload in the middle sends the same order once, on whatever screen', async () => {
    keep({ sending: true })
    const { router } = renderApp('/roof')
    await waitFor(() => expect(window.localStorage.getItem(kept)).toBeNull())
    expect(keysSent()).toEqual(['key-of-the-draft'])
    expect(router.state.location.pathname).toBe('/roof')
  })

  it('the order can be taken back to write on, and is not sent then', async () => {
    keep()
    api.on(SUBMIT, noAnswer)
    const { user } = renderApp(FORM)
    await user.click(await submitButton())
    await user.click(await screen.findByRole('button', { name: 'Do not send yet' }))
    expect(await submitButton()).toBeEnabled()
    expect(screen.getByLabelText('PO number')).toBeEnabled()
    expect(window.localStorage.getItem(kept)).toContain('"sending":false')
  })
})

test('an order whose first sending arrived is not made twice: the way leads to the list', async () => {
  keep()
  api.on(SUBMIT, () => problem('idempotency-key-reused'))
  const { user } = renderApp(FORM)
  await user.click(await submitButton())
  expect(await screen.findByText('This order has arrived already')).toBeVisible()
  expect(screen.getByRole('link', { name: 'See it among the orders' })).toHaveAttribute(
    'href',
    '/roof/orders',
  )
  expect(window.localStorage.getItem(kept)).not.toBeNull()
  api.on(SUBMIT, () => json(order(), 201))
  await user.click(screen.getByRole('button', { name: 'Send it as one more order' }))
  await waitFor(() => expect(api.seen(SUBMIT)).toHaveLength(2))
  expect(keysSent()[1]).not.toBe('key-of-the-draft')
})

test('a removed line can be put back where it was', async () => {
  keep({ lines: [line(), line({ key: 'line-b', mark: 'B', name: 'Ridge' })] })
  const { user } = renderApp(FORM)
  const [first] = await screen.findAllByRole('button', { name: 'Remove' })
  if (!first) throw new Error('No line can be removed.')
  await user.click(first)
  expect(screen.queryByRole('article', { name: 'North rake' })).toBeNull()
  await user.click(screen.getByRole('button', { name: 'Put it back' }))
  const names = screen.getAllByRole('article').map((card) => card.getAttribute('aria-labelledby'))
  expect(names.map((id) => document.getElementById(id ?? '')?.textContent)).toEqual([
    'North rake',
    'Ridge',
  ])
})

test('a kept draft that cannot be read is reported with its text', async () => {
  window.localStorage.setItem(kept, '{"version":9}')
  renderApp(FORM)
  expect(await screen.findByText('An order that was kept here cannot be read')).toBeVisible()
  expect(screen.getByText('{"version":9}')).toBeInTheDocument()
})
