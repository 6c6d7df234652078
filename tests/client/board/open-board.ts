import { screen } from '@testing-library/react'
import { vi } from 'vitest'
import type { Profile } from '#shared/profile/profile.schema'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import type { Stock } from '#shared/stock/stock.schema'
import { readDraft, writeDraft } from '@/features/orders/draft/draft-text'
import type { DraftLine } from '@/features/orders/draft/order-draft'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { newKey } from '@/lib/api/idempotency'
import { startLocales } from '@/locales/index'
import { fakeApi, json, personOf } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { draft, JOB_ID, line, order, STOCK } from '../orders/draft-lines'

interface Opening {
  readonly pitchRise?: number
  readonly stock?: Stock
  readonly shelf?: readonly ShelfProfile[]
  /** Of the line that is drawn. */
  readonly change?: Partial<DraftLine>
  /** What else the server answers. */
  readonly answers?: Parameters<typeof fakeApi>[0]
}

/** The drawing board with a line of a begun order on it, as a crew lead sees it; no brake answers. */
export async function openBoard(profile: Profile, opening: Opening = {}) {
  const { pitchRise = 6, stock = STOCK, shelf = [], change = {}, answers = {} } = opening
  holdCsrfToken(null)
  await startLocales('en')
  // jsdom lays nothing out, so it has no color scheme and no sizes.
  vi.stubGlobal('matchMedia', () => ({
    matches: false,
    addEventListener: vi.fn(),
    removeEventListener: vi.fn(),
  }))
  vi.stubGlobal(
    'ResizeObserver',
    class {
      observe() {}
      disconnect() {}
    },
  )
  const person = personOf('crewLead', { id: newKey(), company: order().company })
  const kept = `foldyard.order-draft.${person.id}.new.${JOB_ID}`
  window.localStorage.setItem(kept, writeDraft(draft({ lines: [line({ profile, ...change })] })))
  const job = {
    id: JOB_ID,
    company: order().company,
    name: 'Harrow Lane house',
    address: '',
    pitchRise,
    version: 1,
    orderCount: 0,
    createdAt: '2026-12-01T15:00:00.000Z',
  }
  const api = fakeApi({
    'GET /api/session': () => json({ person, csrfToken: 'inside' }),
    [`GET /api/jobs/${JOB_ID}`]: () => json(job),
    'GET /api/stocks': () => json({ items: [stock] }),
    'GET /api/brakes': () => json({ items: [] }),
    'GET /api/profiles': () => json({ items: shelf }),
    ...answers,
  })
  const app = renderApp(`/roof/jobs/${JOB_ID}/board?line=line-a`)
  await screen.findByRole('toolbar', { name: 'Drawing tools' }, { timeout: 30_000 })

  /** The drawing as it is kept on the device now. */
  const drawn = (): Profile => {
    const found = readDraft(window.localStorage.getItem(kept) ?? '')
    const [first] = found.ok ? found.draft.lines : []
    if (!first) throw new Error('The kept draft has no line.')
    return first.profile
  }
  return { ...app, api, drawn, person }
}
