import { configure, fireEvent, screen, waitFor, within } from '@testing-library/react'
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { fakeApi, json, personOf, problem } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'
import {
  bundleCode,
  bundleOf,
  ORDER_ID,
  OTHER_ORDER_ID,
  orderSummaryOf,
  pieceCode,
  sheetOf,
} from './counter-data'

const SHEET = `GET /api/orders/${ORDER_ID}/hand-off`
const HAND_OVER = `POST /api/orders/${ORDER_ID}/hand-off`
const GONE = { pickedUpAt: '2026-03-04T13:42:00.000Z' }

const atCounter = (sheet = sheetOf()) =>
  fakeApi({
    'GET /api/session': () => json({ person: personOf('counter'), csrfToken: 'inside' }),
    'GET /api/orders': () => json({ items: [], next: null }),
    'GET /api/rack': () => json({ work: [], bundles: sheet.bundles }),
    [SHEET]: () => json(sheet),
  })

const button = (name: string | RegExp) => screen.getByRole('button', { name })

async function open(sheet = sheetOf()) {
  const api = atCounter(sheet)
  const app = renderApp(`/counter/hand-off/${ORDER_ID}`)
  const scanField = await screen.findByRole('textbox', { name: 'Scan a bundle of this order' })
  const scan = (code: string) => app.user.type(scanField, `${code}{Enter}`)
  return { api, scan, ...app }
}

/** A line across the pad, as a pen draws it; the pad has no size of its own here. */
function sign() {
  const pad = screen.getByTestId('signature-pad')
  pad.getBoundingClientRect = () => new DOMRect(0, 0, 500, 200)
  const pen = { pointerId: 1, button: 0, buttons: 1 }
  fireEvent.pointerDown(pad, { ...pen, clientX: 50, clientY: 100 })
  fireEvent.pointerMove(pad, { ...pen, clientX: 200, clientY: 60 })
  fireEvent.pointerUp(pad, { pointerId: 1, button: 0, buttons: 0 })
}

// Pages are loaded when somebody goes there, which is not what is tested here; and a busy machine
// takes longer over a page than the second that is waited otherwise.
vi.setConfig({ testTimeout: 20_000, hookTimeout: 30_000 })
configure({ asyncUtilTimeout: 8000 })
beforeAll(async () => {
  await import('@/pages/counter/HandOffSheetPage')
})

beforeEach(() => holdCsrfToken(null))

describe('handing over', () => {
  it('is asked for step by step by its one button, and sends what was scanned and signed', async () => {
    const { api, scan, user } = await open()
    expect(button('Scan bundles to hand over')).toBeDisabled()
    await scan(bundleCode(1))
    expect(button('Type who takes it')).toBeDisabled()
    // Pressed instead of scanned.
    await user.click(button(/^B2 waiting for scan/))
    await user.type(screen.getByRole('textbox', { name: 'Name' }), ' Joss Marlow ')
    expect(button('Sign to hand over')).toBeDisabled()
    sign()
    expect(screen.getByText('B3 stays on the rack, at R3.')).toBeVisible()

    api.on(HAND_OVER, () => json(sheetOf(), 201))
    await user.click(button('Hand over 2 bundles'))
    expect(await screen.findByText('2 bundles handed over to Joss Marlow.')).toBeVisible()
    expect(api.seen(HAND_OVER)[0]?.body).toEqual({
      bundleCodes: [bundleCode(1), bundleCode(2)],
      receivedBy: ' Joss Marlow ',
      signature: [
        [
          [100, 200],
          [400, 120],
        ],
      ],
    })
    expect(screen.getByRole('textbox', { name: 'Name' })).toHaveValue('')
    expect(screen.getByRole('textbox', { name: 'Scan a bundle of this order' })).toHaveFocus()
  })

  it('goes without a pointer: signed on paper, with no signature kept', async () => {
    const { api, scan, user } = await open()
    await scan(bundleCode(1))
    await user.type(screen.getByRole('textbox', { name: 'Name' }), 'Joss')
    await user.click(screen.getByRole('checkbox', { name: /Signed on paper/ }))
    expect(screen.queryByTestId('signature-pad')).not.toBeInTheDocument()
    api.on(HAND_OVER, () => json(sheetOf(), 201))
    await user.click(button('Hand over 1 bundle'))
    await screen.findByText('1 bundle handed over to Joss.')
    expect(api.seen(HAND_OVER)[0]?.body).toMatchObject({ signature: [] })
  })

  it('that came too late names the bundle, who let it go, and shows what is here now', async () => {
    const { api, scan, user } = await open()
    await scan(bundleCode(1))
    await user.type(screen.getByRole('textbox', { name: 'Name' }), 'Joss')
    await user.click(screen.getByRole('checkbox', { name: /Signed on paper/ }))
    api.on(HAND_OVER, () =>
      problem('wrong-state', {
        current: {
          code: bundleCode(1),
          state: 'pickedUp',
          at: '2026-03-04T13:42:00.000Z',
          by: 'Wren Ashgrove',
          station: 'counter',
        },
      }),
    )
    api.on(SHEET, () => json(sheetOf({ bundles: [bundleOf(1, GONE), bundleOf(2), bundleOf(3)] })))
    await user.click(button('Hand over 1 bundle'))
    const alert = await screen.findByRole('alert')
    expect(alert).toHaveTextContent('B1 is out already.')
    expect(alert).toHaveTextContent('Wren Ashgrove handed it over')
    expect(alert).toHaveTextContent('Nothing was handed over')
    await waitFor(() => expect(button('Scan bundles to hand over')).toBeDisabled())
    expect(screen.getByRole('textbox', { name: 'Name' })).toHaveValue('Joss')
  })
})

describe('a scan', () => {
  it('of a piece ticks the bundle it is strapped into', async () => {
    const { scan } = await open()
    await scan(pieceCode(22))
    expect(await screen.findByRole('button', { name: 'B2 scanned' })).toHaveAttribute(
      'aria-pressed',
      'true',
    )
  })

  it('of another order says whose it is, ticks nothing and leads there', async () => {
    const { api, scan } = await open()
    const stray = bundleOf(9, { orderId: OTHER_ORDER_ID, orderNumber: 2050, company: 'Ridge & Co' })
    api.on(`GET /api/bundles/${bundleCode(9)}`, () => json(stray))
    await scan(bundleCode(9))
    expect(await screen.findByText('This belongs to F-2050, Ridge & Co.')).toBeVisible()
    expect(screen.getByRole('link', { name: 'Go to that order' })).toHaveAttribute(
      'href',
      `/counter/hand-off/${OTHER_ORDER_ID}`,
    )
    expect(button('Scan bundles to hand over')).toBeDisabled()
  })

  it('of a bundle strapped a moment ago is found by reading the sheet anew', async () => {
    const { api, scan } = await open()
    api.on(`GET /api/bundles/${bundleCode(4)}`, () => json(bundleOf(4)))
    api.on(SHEET, () => json(sheetOf({ bundles: [bundleOf(1), bundleOf(4)] })))
    await scan(bundleCode(4))
    expect(await screen.findByRole('button', { name: 'B4 scanned' })).toBeVisible()
  })

  it('into the field of the name is taken as a scan', async () => {
    const { user } = await open()
    const name = screen.getByRole('textbox', { name: 'Name' })
    await user.type(name, `Joss${bundleCode(3)}{Enter}`)
    expect(name).toHaveValue('Joss')
    expect(button('B3 scanned')).toBeVisible()
  })

  it('of what is out already says so', async () => {
    const { scan } = await open(sheetOf({ bundles: [bundleOf(1, GONE), bundleOf(2)] }))
    await scan(bundleCode(1))
    expect(await screen.findByText('Out already.')).toBeVisible()
    expect(button('Scan B2 to hand over')).toBeDisabled()
  })
})

describe('what has gone', () => {
  const handOffs = [
    {
      id: '00000000-0000-4000-8000-0000000000aa',
      at: GONE.pickedUpAt,
      receivedBy: 'Joss Marlow',
      handedBy: 'Ines Calder',
      bundleCodes: [bundleCode(1)],
      signature: [],
    },
  ]
  const sheet = sheetOf({
    bundles: [bundleOf(1, GONE)],
    handOffs,
    order: orderSummaryOf({
      state: 'pickedUp',
      progress: { queued: 0, bent: 0, bundled: 0, pickedUp: 6, scrapped: 0, withdrawn: 0 },
    }),
  })

  it('is told with who received it, and leaves no button that does nothing', async () => {
    await open(sheet)
    expect(screen.getByRole('heading', { name: 'All of it is picked up' })).toBeVisible()
    const gone = screen.getByRole('region', { name: 'Handed over' })
    expect(gone).toHaveTextContent('Joss Marlow')
    expect(gone).toHaveTextContent('signed on paper')
    expect(screen.queryByRole('button', { name: /to hand over/ })).not.toBeInTheDocument()
  })

  it('is taken back for a reason', async () => {
    const { api, user } = await open(sheet)
    const back = `POST /api/bundles/${bundleOf(1).id}/returned`
    api.on(back, () => json(sheetOf({ bundles: [bundleOf(1)] })))
    await user.click(button('Take back B1'))
    const dialog = await screen.findByRole('alertdialog')
    const confirm = within(dialog).getByRole('button', { name: 'Take it back' })
    expect(confirm).toBeDisabled()
    await user.type(within(dialog).getByRole('textbox', { name: 'Reason' }), 'Truck was full')
    await user.click(confirm)
    expect(await screen.findByText('Taken back. Put it at R1.')).toBeVisible()
    expect(api.seen(back)[0]?.body).toEqual({ reason: 'Truck was full' })
  })
})
