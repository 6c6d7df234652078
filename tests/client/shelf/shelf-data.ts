import { configure } from '@testing-library/react'
import { vi } from 'vitest'
import type { Job } from '#shared/jobs/jobs.contract'
import type { Profile } from '#shared/profile/profile.schema'
import { getStarter, type StarterKey } from '#shared/profile/starters'
import type { ShelfProfile, ShelfVersion } from '#shared/shelf/shelf.contract'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { newKey } from '@/lib/api/idempotency'
import { startLocales } from '@/locales/index'
import { fakeApi, json, personOf } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { JOB_ID, order, STOCK } from '../orders/draft-lines'

export const company = order().company

export const job: Job = {
  id: JOB_ID,
  company,
  name: 'Harrow Lane house',
  address: '',
  pitchRise: 6,
  version: 1,
  orderCount: 0,
  createdAt: '2026-12-01T15:00:00.000Z',
}

const updatedAt = '2026-12-01T15:00:00.000Z'

export const starterItem = (key: StarterKey): ShelfProfile => ({
  id: newKey(),
  company: null,
  starterKey: key,
  name: key,
  profile: getStarter(key).profile,
  version: 1,
  updatedAt,
})

export const savedItem = (name: string, profile: Profile, version = 1): ShelfProfile => ({
  id: newKey(),
  company,
  starterKey: null,
  name,
  profile,
  version,
  updatedAt,
})

export const versionOf = (
  version: number,
  profile: Profile,
  savedBy: string | null,
): ShelfVersion => ({ version, name: 'Barn rake', profile, savedBy, savedAt: updatedAt })

// A bound against hanging, not a measure: pages are loaded as they are asked for.
configure({ asyncUtilTimeout: 30_000 })

/** The client at an address of the shelf, as a crew lead with one job sees it. */
export async function openShelf(address: string, items: readonly ShelfProfile[]) {
  holdCsrfToken(null)
  await startLocales('en')
  // jsdom draws nothing, so it has no color scheme and no sizes.
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
  const api = fakeApi({
    'GET /api/session': () =>
      json({ person: personOf('crewLead', { id: newKey(), company }), csrfToken: 'inside' }),
    [`GET /api/jobs/${JOB_ID}`]: () => json(job),
    'GET /api/jobs': () => json({ items: [job], next: null }),
    'GET /api/stocks': () => json({ items: [STOCK] }),
    'GET /api/brakes': () => json({ items: [] }),
    'GET /api/profiles': () => json({ items }),
  })
  return { ...renderApp(address), api }
}
