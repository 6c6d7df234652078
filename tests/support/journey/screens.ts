import type { Page } from 'playwright-core'
import type { DemoPerson } from '#seeds/demo/people'
import { getPiece } from '#shared/pieces/pieces.contract'
import { getHandOffSheet } from '#shared/hand-off/hand-off.contract'
import { listShelf } from '#shared/shelf/shelf.contract'
import { paths } from '@/app/paths'
import type { DeviceKind } from '../browser'
import { at } from '../making-factories'
import { agentOf, orderBeforehand } from './beforehand'

/** The screens of a place, each by its address, as who works there sees them. */
export interface PlaceScreens {
  readonly place: string
  readonly person: DemoPerson
  readonly device: DeviceKind
  readonly addresses: readonly string[]
}

/** Addresses of all main screens, with an order in every stage to show on them. */
export async function listScreens(): Promise<PlaceScreens[]> {
  const submitted = await orderBeforehand('Alder 1', 'submitted')
  const released = await orderBeforehand('Alder 2', 'released')
  const bent = await orderBeforehand('Alder 3', 'bent')
  const bundled = await orderBeforehand('Alder 4', 'bundled')
  const juno = await agentOf('juno')
  const { runId } = await juno.call(getPiece, { params: { code: at(released.codes, 0) } })
  const { bundles } = await juno.call(getHandOffSheet, { params: { orderId: bundled.order.id } })
  const { items: shelf } = await juno.call(listShelf)
  const piece = at(bundled.codes, 0)
  const jobId = submitted.job.id
  return [
    {
      place: 'roof',
      person: 'maren',
      device: 'phone',
      addresses: [
        paths.roof.home(),
        paths.roof.newJob(),
        paths.roof.job(jobId),
        paths.roof.board(jobId),
        paths.roof.shelf(jobId),
        paths.roof.shelfProfile(at(shelf, 0).id),
        // With a profile of the shelf on the board the order has a line to show.
        paths.roof.board(jobId, { shelf: at(shelf, 0).id }),
        paths.roof.newOrder(jobId),
        paths.roof.orders(),
        paths.roof.order(submitted.order.id),
        paths.roof.order(bundled.order.id),
        paths.piece('roof', piece),
        paths.account(),
      ],
    },
    {
      place: 'brake',
      person: 'wren',
      device: 'tablet',
      addresses: [
        paths.brake.queue(),
        paths.brake.done(),
        paths.brake.run(runId),
        paths.piece('brake', piece),
      ],
    },
    {
      place: 'rack',
      person: 'wren',
      device: 'tablet',
      addresses: [
        paths.rack.home(),
        paths.rack.order(bent.order.id),
        paths.rack.bundle(at(bundles, 0).code),
      ],
    },
    {
      place: 'counter',
      person: 'ines',
      device: 'desktop',
      addresses: [
        paths.counter.incoming(),
        paths.counter.order(submitted.order.id),
        paths.counter.order(bundled.order.id),
        paths.counter.handOff(),
        paths.counter.handOffOrder(bundled.order.id),
        paths.counter.due(),
      ],
    },
    {
      place: 'office',
      person: 'juno',
      device: 'desktop',
      addresses: [
        paths.office.home(),
        paths.office.stocks(),
        paths.office.brakes(),
        paths.office.people(),
      ],
    },
  ]
}

/** Opens an address and waits until its screen has what it shows. */
export async function openScreen(page: Page, address: string): Promise<void> {
  await page.goto(address)
  await page.getByRole('heading', { level: 1 }).waitFor()
  await page
    .getByText(/^(Loading|Cargando)$/)
    .first()
    .waitFor({ state: 'detached' })
}
