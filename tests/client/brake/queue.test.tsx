import { configure, screen } from '@testing-library/react'
import { beforeAll, expect, it, vi } from 'vitest'
import type { RunSummary } from '#shared/runs/runs.contract'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { fakeApi, json, personOf } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { lineOf, NO_PIECES } from '../counter/counter-data'

vi.setConfig({ testTimeout: 20_000, hookTimeout: 30_000 })
configure({ asyncUtilTimeout: 8000 })
beforeAll(async () => {
  await import('@/pages/brake/QueuePage')
})

const { id, profile, stock, strip } = lineOf('A')

const runOf = (number: number, sameStock: boolean): RunSummary => ({
  id: id.replace(/.$/, String(number)),
  number,
  code: `R00000${number}X`,
  name: `Run of ${number}`,
  profile,
  stock,
  strip,
  brakeId: id,
  brakeName: 'Long folder',
  company: 'Tamsin & Reed Roofing',
  job: 'Larkspur barn',
  orderNumber: 2047,
  neededBy: '2099-06-01',
  lengths: [{ length: 120, count: 3 }],
  progress: { ...NO_PIECES, queued: 3 },
  sameStock,
  override: null,
  claimedBy: null,
})

it('marks the runs of the stock that lies at the brake', async () => {
  holdCsrfToken(null)
  vi.stubGlobal('matchMedia', () => new EventTarget())
  fakeApi({
    'GET /api/session': () => json({ person: personOf('bender'), csrfToken: 'inside' }),
    'GET /api/runs': () => json({ items: [runOf(1, false), runOf(2, true)] }),
    'GET /api/brakes': () => json({ items: [] }),
  })
  renderApp('/brake')
  const marks = await screen.findAllByText('same stock as the last run')
  expect(marks.map((mark) => mark.closest('li')?.textContent)).toEqual([
    expect.stringContaining('Run of 2'),
  ])
})
