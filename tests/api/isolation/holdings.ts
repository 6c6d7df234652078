import { randomUUID } from 'node:crypto'
import { invitePerson } from '#shared/people/accounts.contract'
import { createShelfProfile } from '#shared/shelf/shelf.contract'
import type { Order } from '#shared/orders/order.schema'
import { askAboutOrder, submitOrder, withdrawOrder } from '#shared/orders/orders.contract'
import { createJob } from '#shared/jobs/jobs.contract'
import { printLabels } from '#shared/labels/labels.contract'
import { at, firstCode, type Floor } from '../../support/making-factories'
import type { Crew } from '../../support/shop-scene'
import { orderInput, zProfile } from '../../support/shop-factories'

/** One of everything that a company has in the shop. */
export interface Holdings {
  readonly companyId: string
  readonly companyName: string
  readonly leadName: string
  /** Invited, and without a password yet. */
  readonly personId: string
  readonly jobId: string
  readonly profileId: string
  /** Submitted, and free to be changed. */
  readonly order: Order
  /** Of that order. */
  readonly lineId: string
  /** Sent back with a question. */
  readonly asked: Order
  readonly withdrawn: Order
  /** Released, with all its pieces bent and in one bundle. */
  readonly released: Order
  readonly code: string
  readonly runId: string
  readonly runCode: string
  readonly bundleId: string
  readonly bundleCode: string
  /** Labels of the released order. */
  readonly printId: string
  readonly eventIds: readonly number[]
}

export const firstLineOf = ({ lines }: Order): string => at(lines, 0).id

export async function createHoldings(floor: Floor, crew: Crew): Promise<Holdings> {
  const { agent } = crew
  const job = await agent.call(createJob, {
    body: { name: `Roof of ${crew.lead.name}`, address: '', pitchRise: 6 },
  })
  const saved = await agent.call(createShelfProfile, {
    // A name stands once on a shelf.
    body: { name: `${randomUUID()} of ${crew.lead.name}`, profile: zProfile() },
  })
  const submit = () =>
    agent.call(submitOrder, { body: { ...orderInput([floor.line()]), jobId: job.id } })
  const order = await submit()
  const open = await submit()
  const asked = await floor.counter.call(askAboutOrder, {
    params: { orderId: open.id },
    body: { version: open.version, text: 'Which side is up?' },
  })
  const dropped = await submit()
  const withdrawn = await agent.call(withdrawOrder, {
    params: { orderId: dropped.id },
    body: { version: dropped.version, reason: 'Ordered twice.' },
  })
  const released = await floor.release(await submit())
  const code = firstCode(released)
  const bundle = await floor.bundle(released, await floor.bendAll(released))
  const piece = await floor.readPiece(code)
  const invited = await agent.call(invitePerson, {
    body: {
      name: `Called by ${crew.lead.name}`,
      email: `${randomUUID()}@example.com`,
      role: 'crewLead',
      language: 'en',
    },
  })
  const print = await floor.counter.call(printLabels, {
    body: { of: { kind: 'order', orderId: released.id } },
  })
  return {
    companyId: crew.companyId,
    companyName: job.company.name,
    leadName: crew.lead.name,
    personId: invited.id,
    jobId: job.id,
    profileId: saved.id,
    order,
    lineId: firstLineOf(order),
    asked,
    withdrawn,
    released,
    code,
    runId: piece.runId,
    runCode: (await floor.readRun(piece.runId)).code,
    bundleId: bundle.id,
    bundleCode: bundle.code,
    printId: print.id,
    eventIds: piece.events.slice(-1).map(({ id }) => id),
  }
}

/** What gives a company away wherever it turns up in an answer. */
export const marksOf = (holdings: Holdings): string[] => [
  holdings.companyId,
  holdings.companyName,
  holdings.leadName,
  holdings.personId,
  holdings.jobId,
  holdings.profileId,
  holdings.order.id,
  holdings.asked.id,
  holdings.withdrawn.id,
  holdings.released.id,
  holdings.runId,
  holdings.bundleId,
  ...[holdings.code, holdings.runCode, holdings.bundleCode].map((code) => `"${code}"`),
]
