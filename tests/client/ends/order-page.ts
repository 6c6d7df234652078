import { screen, within } from '@testing-library/react'
import { vi } from 'vitest'
import type { DraftLine, OrderDraft } from '@/features/orders/draft/order-draft'
import { readDraft, writeDraft } from '@/features/orders/draft/draft-text'
import { dayOf } from '@/features/orders/form/today'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { newKey } from '@/lib/api/idempotency'
import { startLocales } from '@/locales/index'
import { fakeApi, json, personOf } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { draft, JOB_ID, order, ORDER_ID, STOCK } from '../orders/draft-lines'

export const SUBMIT = 'POST /api/orders'

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

/** The page of an order that a crew lead writes for a job of 6/12, with these lines begun. */
export async function openOrder(
  change: Partial<OrderDraft>,
  answers: Parameters<typeof fakeApi>[0] = {},
) {
  holdCsrfToken(null)
  await startLocales('en')
  // jsdom draws nothing, so it cannot scroll and has no color scheme.
  Element.prototype.scrollIntoView = vi.fn()
  vi.stubGlobal('matchMedia', () => ({
    matches: false,
    addEventListener: vi.fn(),
    removeEventListener: vi.fn(),
  }))
  const person = personOf('crewLead', { id: newKey() })
  const kept = `foldyard.order-draft.${person.id}.new.${JOB_ID}`
  const neededBy = dayOf(new Date(Date.now() + 86_400_000))
  window.localStorage.setItem(kept, writeDraft(draft({ neededBy, ...change })))
  const api = fakeApi({
    'GET /api/session': () => json({ person, csrfToken: 'inside' }),
    [`GET /api/jobs/${JOB_ID}`]: () => json(job),
    'GET /api/jobs': () => json({ items: [job], next: null }),
    'GET /api/orders': () => json({ items: [], next: null }),
    [`GET /api/orders/${ORDER_ID}`]: () => json(order()),
    'GET /api/stocks': () => json({ items: [STOCK] }),
    'GET /api/brakes': () => json({ items: [] }),
    [SUBMIT]: () => json(order(), 201),
    ...answers,
  })
  const app = renderApp(`/roof/jobs/${JOB_ID}/order`)
  await screen.findByRole('button', { name: 'Submit order' }, { timeout: 30_000 })

  /** The draft as it is kept on the device now. */
  const read = (): OrderDraft => {
    const found = readDraft(window.localStorage.getItem(kept) ?? '')
    if (!found.ok) throw new Error('The kept draft cannot be read.')
    return found.draft
  }
  return {
    ...app,
    api,
    read,
    line: (index = 0): DraftLine => {
      const line = read().lines[index]
      if (!line) throw new Error(`The draft has no line ${index}.`)
      return line
    },
    card: (name: string) => within(screen.getByRole('article', { name })),
    submit: () => app.user.click(screen.getByRole('button', { name: 'Submit order' })),
  }
}
