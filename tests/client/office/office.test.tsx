import { configure, screen, within } from '@testing-library/react'
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { fakeApi, json, personOf } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { OTHER_ORDER_ID, orderSummaryOf } from '../counter/counter-data'

const NONE = { queued: 0, bent: 0, bundled: 0, pickedUp: 0, scrapped: 0, withdrawn: 0 }

const inOffice = (answers: Parameters<typeof fakeApi>[0]) =>
  fakeApi({
    'GET /api/session': () => json({ person: personOf('manager'), csrfToken: 'inside' }),
    ...answers,
  })

// Pages are loaded when somebody goes there, which is not what is tested here; and a busy machine
// takes longer over a page than the second that is waited otherwise.
vi.setConfig({ testTimeout: 20_000, hookTimeout: 30_000 })
configure({ asyncUtilTimeout: 8000 })
beforeAll(async () => {
  await import('@/pages/office/OverviewPage')
  await import('@/pages/office/PeoplePage')
})

beforeEach(() => holdCsrfToken(null))

describe('the overview', () => {
  it('counts open orders and their pieces by state, and lists what is late', async () => {
    const late = orderSummaryOf({
      neededBy: '2001-01-01',
      state: 'inWork',
      progress: { ...NONE, queued: 3, bundled: 2 },
    })
    const inTime = orderSummaryOf({
      id: OTHER_ORDER_ID,
      number: 2050,
      progress: { ...NONE, bundled: 5 },
    })
    inOffice({ 'GET /api/orders': () => json({ items: [late, inTime], next: null }) })
    renderApp('/office')
    const orders = await screen.findByRole('region', { name: /Open orders/ })
    expect(
      within(orders)
        .getAllByRole('listitem')
        .map((item) => item.textContent),
    ).toEqual(['question0', 'submitted0', 'released0', 'in work1', 'ready1', 'part picked up0'])
    const pieces = screen.getByRole('region', { name: 'Pieces of open orders' })
    expect(
      within(pieces)
        .getAllByRole('listitem')
        .map((item) => item.textContent),
    ).toEqual(['queued3', 'bent0', 'bundled7', 'picked up0'])
    const lateList = screen.getByRole('region', { name: /Late/ })
    expect(
      within(lateList)
        .getAllByRole('link')
        .map((link) => link.textContent),
    ).toEqual(['F-2047'])
  })

  it('says so when nothing is late', async () => {
    inOffice({ 'GET /api/orders': () => json({ items: [orderSummaryOf()], next: null }) })
    renderApp('/office')
    expect(await screen.findByText('Nothing is late')).toBeVisible()
  })
})

describe('people', () => {
  it('are listed with role, company and whether the account is open', async () => {
    inOffice({
      'GET /api/people': () =>
        json({
          items: [
            {
              id: OTHER_ORDER_ID,
              name: 'Pell Aster',
              email: 'pell@example.com',
              role: 'crewLead',
              company: { id: OTHER_ORDER_ID, name: 'Tamsin & Reed Roofing' },
              active: false,
              invited: false,
              lastSignInAt: null,
            },
          ],
        }),
      'GET /api/companies': () => json({ items: [] }),
    })
    renderApp('/office/people')
    const row = (await screen.findAllByRole('row')).at(-1)
    expect(
      within(row ?? document.body)
        .getAllByRole('cell')
        .map((cell) => cell.textContent),
    ).toEqual([
      'Pell Aster',
      'crew lead',
      'Tamsin & Reed Roofing',
      'pell@example.com',
      'never',
      'closed',
      'Open again',
    ])
  })
})
