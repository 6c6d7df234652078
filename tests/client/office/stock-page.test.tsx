import { configure, fireEvent, screen, within } from '@testing-library/react'
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { DEMO_BRAKES } from '#shared/bend-plan/demo-brakes'
import type { Role } from '#shared/access/permissions'
import { stockItemSchema, type StockItem } from '#shared/stock/stock-items.contract'
import type { TestBendRecord } from '#shared/stock/stock.contract'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { fakeApi, json, personOf, problem } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import { lineOf } from '../counter/counter-data'

vi.setConfig({ testTimeout: 20_000, hookTimeout: 30_000 })
configure({ asyncUtilTimeout: 8000 })
beforeAll(async () => {
  await import('@/pages/office/StockPage')
  await import('@/pages/brake/TestBendsPage')
})
// The figures ask for the system's theme, which jsdom does not know.
beforeEach(() => {
  holdCsrfToken(null)
  vi.stubGlobal('matchMedia', () => new EventTarget())
})

const { stock } = lineOf('A')
const BRAKE_ID = '00000000-0000-4000-8000-00000000000b'
const brake = { id: BRAKE_ID, position: 1, brake: DEMO_BRAKES[0] }

const BEND: TestBendRecord = {
  id: '00000000-0000-4000-8000-0000000000be',
  brakeId: BRAKE_ID,
  brakeName: DEMO_BRAKES[0]?.name ?? '',
  stripWidth: 5.9375,
  legA: 4,
  legB: 2,
  turn: 90,
  thickness: 0.0276,
  insideRadius: 0.04,
  note: 'first coil of the month',
  by: 'Ines Alder',
  at: '2026-03-02T14:00:00.000Z',
  withdrawn: null,
}

const FIT = { brakeId: BRAKE_ID, kFactor: 0.382, insideRadius: 0.04, bends: 1, spread: 0 }
const bends = (more: object = {}) => ({ stock, bends: [BEND], fits: [FIT], ...more })

const shopOf = (role: Role, answers: Parameters<typeof fakeApi>[0] = {}) =>
  fakeApi({
    'GET /api/session': () => json({ person: personOf(role), csrfToken: 'inside' }),
    'GET /api/stocks': () => json({ items: [stock] }),
    'GET /api/brakes': () => json({ items: [brake] }),
    [`GET /api/stocks/${stock.id}/test-bends`]: () => json(bends()),
    [`GET /api/stocks/${stock.id}/items`]: () => json({ items: [] }),
    ...answers,
  })

const openOffice = () => renderApp(`/office/stocks/${stock.id}`)

describe('the page of a stock', () => {
  it('says what is reckoned with and where it comes from', async () => {
    shopOf('manager')
    openOffice()
    const table = await screen.findByRole('table', { name: 'How it folds on each brake' })
    const [, row] = within(table).getAllByRole('row')
    expect(row).toHaveTextContent('0.408')
    expect(row).toHaveTextContent('handbook: half-hard copper and brass, soft steel, aluminum')
    expect(row).toHaveTextContent('K 0.382')
    expect(screen.getByText('DIN 6935 would give').nextSibling).toHaveTextContent('0.364')
  })

  it('lists the coils, sheets and drops on hand with their lots', async () => {
    const item = { film: 'painted', rackMark: null, receivedOn: '2026-02-03', width: 48, count: 1 }
    const items: StockItem[] = [
      { ...item, id: BEND.id, kind: 'coil', lot: 'KIL-0417', length: 3744, film: 'none' },
      { ...item, id: BRAKE_ID, kind: 'sheet', lot: 'KIL-0398', length: 120, count: 14 },
      { ...item, id: stock.id, kind: 'drop', lot: 'KIL-0398', length: 88.5, rackMark: 'D2' },
    ].map((each) => stockItemSchema.parse(each))
    shopOf('manager', { [`GET /api/stocks/${stock.id}/items`]: () => json({ items }) })
    openOffice()
    const table = await screen.findByRole('table', { name: 'What is on hand' })
    const rows = within(table).getAllByRole('row').slice(1)
    const textsOf = (row: HTMLElement) =>
      [...row.querySelectorAll('td, th')].slice(0, 7).map((cell) => cell.textContent)
    expect(rows.map(textsOf)).toEqual([
      ['coil', 'KIL-0417', '48"', `312'`, '–', 'none', '–'],
      ['sheets', 'KIL-0398', '48"', `10'`, '14', 'on the painted face', '–'],
      ['drop', 'KIL-0398', '48"', `7' 4 1/2"`, '–', 'on the painted face', 'D2'],
    ])
  })

  it('says so where nothing of it is on hand', async () => {
    shopOf('manager')
    openOffice()
    expect(await screen.findByText('Nothing of this stock is on hand')).toBeVisible()
  })

  it('takes the fit of a brake into use, as it was seen', async () => {
    const used = {
      ...stock,
      calibrations: [
        {
          brakeId: BRAKE_ID,
          brakeName: 'Up-only brake',
          kFactor: 0.382,
          insideRadius: 0.04,
          bends: 1,
          by: 'Juno Marsh',
          at: '2026-03-03T09:00:00.000Z',
        },
      ],
    }
    const api = shopOf('manager', {
      [`POST /api/stocks/${stock.id}/calibrations`]: () => json(bends({ stock: used })),
    })
    openOffice()
    fireEvent.click(await screen.findByRole('button', { name: /^Use these on/ }))
    expect(await screen.findByText(/taken into use by Juno Marsh/)).toBeVisible()
    expect(api.seen(`POST /api/stocks/${stock.id}/calibrations`)[0]?.body).toEqual({
      brakeId: BRAKE_ID,
      fit: { kFactor: 0.382, insideRadius: 0.04 },
    })
    expect(screen.queryByRole('button', { name: /^Use these on/ })).toBeNull()
    expect(screen.getByRole('button', { name: /^Back to the stock’s own/ })).toBeVisible()
  })

  it('says that the fit is another by now and keeps the old figures', async () => {
    shopOf('manager', {
      [`POST /api/stocks/${stock.id}/calibrations`]: () => problem('changed-meanwhile'),
    })
    openOffice()
    fireEvent.click(await screen.findByRole('button', { name: /^Use these on/ }))
    expect(await screen.findByRole('alert')).toBeVisible()
    expect(screen.getByRole('button', { name: /^Use these on/ })).toBeVisible()
  })
})

describe('a test bend', () => {
  const type = (label: string | RegExp, text: string) => {
    const field = screen.getByRole('textbox', { name: label })
    fireEvent.change(field, { target: { value: text } })
    fireEvent.blur(field)
  }

  it('is recorded by the bender, who sees the K it gives before', async () => {
    const api = shopOf('bender', {
      [`POST /api/stocks/${stock.id}/test-bends`]: () => json(bends(), 201),
    })
    renderApp(`/brake/test-bends?stock=${stock.id}`)
    await screen.findByRole('button', { name: 'Record this bend' })
    expect(screen.queryByRole('button', { name: /^Use these on/ })).toBeNull()
    type('Strip width before', '5 15/16')
    type('First leg', '4')
    type('Second leg', '2')
    type('Inside radius, if measured', '0.04')
    expect(screen.getByText(/This bend gives K 0\.\d{3}/)).toBeVisible()
    fireEvent.click(screen.getByRole('button', { name: 'Record this bend' }))
    await vi.waitFor(() =>
      expect(api.seen(`POST /api/stocks/${stock.id}/test-bends`)[0]?.body).toEqual({
        brakeId: BRAKE_ID,
        stripWidth: 5.9375,
        legA: 4,
        legB: 2,
        turn: 90,
        thickness: 0.0276,
        insideRadius: 0.04,
        note: '',
      }),
    )
  })

  it('is not sent while a measure is missing, and names it', async () => {
    const api = shopOf('bender')
    renderApp(`/brake/test-bends?stock=${stock.id}`)
    await screen.findByRole('button', { name: 'Record this bend' })
    type('First leg', '4')
    fireEvent.click(screen.getByRole('button', { name: 'Record this bend' }))
    expect(await screen.findAllByText('Measure this first.')).toHaveLength(2)
    expect(api.seen(`POST /api/stocks/${stock.id}/test-bends`)).toHaveLength(0)
  })

  it('warns where no K can be meant, and where the sheet is not what its name says', async () => {
    shopOf('bender')
    renderApp(`/brake/test-bends?stock=${stock.id}`)
    await screen.findByRole('button', { name: 'Record this bend' })
    type('Strip width before', '7')
    type('First leg', '4')
    type('Second leg', '2')
    expect(screen.getByText(/No K fits these measures/)).toBeVisible()
    type('Thickness', '0.05')
    expect(screen.getByText(/Thicker than 24 ga may be/)).toBeVisible()
  })

  it('stays in the list with its reason when it does not count any more', async () => {
    const withdrawn = { by: 'Ines Alder', at: '2026-03-04T09:00:00.000Z', reason: 'read wrong' }
    const api = shopOf('bender', {
      [`POST /api/stocks/${stock.id}/test-bends/${BEND.id}/withdrawal`]: () =>
        json(bends({ bends: [{ ...BEND, withdrawn }], fits: [] })),
    })
    renderApp(`/brake/test-bends?stock=${stock.id}`)
    fireEvent.click(await screen.findByRole('button', { name: 'Does not count…' }))
    type('Reason', 'read wrong')
    fireEvent.click(screen.getByRole('button', { name: 'It does not count' }))
    expect(await screen.findByText('no: read wrong (Ines Alder)')).toBeVisible()
    expect(
      api.seen(`POST /api/stocks/${stock.id}/test-bends/${BEND.id}/withdrawal`)[0]?.body,
    ).toEqual({ reason: 'read wrong' })
  })
})
