import type { Clock } from '#server/adapters/clock'
import { companyScope } from '#server/db/company-scope'
import type { JobsQueries } from '#server/features/jobs/jobs.queries'
import { isBeforeRelease } from '#server/features/orders/before-release'
import { orderConflict } from '#server/features/orders/order-conflict'
import { checkOrder, linesForPitch, stocksOf } from '#server/features/orders/order-lines'
import type { OrderReader } from '#server/features/orders/order-reader'
import type { OrdersQueries } from '#server/features/orders/orders.queries'
import type { OrdersStore } from '#server/features/orders/orders.store'
import type { OrderMails } from '#server/features/mail/order-mails'
import type { ReleaseOrder } from '#server/features/orders/release-order'
import { dayIn } from '#server/features/orders/shop-day'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import type { SignedIn } from '#server/http/define-route'
import { invalidField, notFound, wrongState } from '#server/http/errors'
import type { Announcement } from '#server/live/announce'
import type { BodyOf, QueryOf } from '#shared/http/endpoint'
import type { Order, OrderEvent, OrderInput } from '#shared/orders/order.schema'
import type {
  amendOrder,
  answerQuestion,
  askAboutOrder,
  listOrders,
  releaseOrder,
  submitOrder,
  withdrawOrder,
} from '#shared/orders/orders.contract'

export interface OrdersDeps {
  readonly queries: OrdersQueries
  readonly reader: OrderReader
  readonly store: OrdersStore
  readonly jobs: JobsQueries
  readonly stocks: StocksQueries
  readonly release: ReleaseOrder
  readonly clock: Clock
  /** IANA name; the shop's day decides what is in the past. */
  readonly shopTimeZone: string
  readonly mails: Pick<OrderMails, 'received' | 'question' | 'released'>
  readonly announce: (announcement: Announcement) => Promise<void>
}

/** An order as it stood at the version that the person saw. */
type Standing = Pick<Order, 'state' | 'company' | 'job' | 'neededBy'>

interface Change {
  readonly kind: OrderEvent['kind']
  readonly text?: string
  /** Why an order in this state does not take the change; null when it does. */
  readonly refuse?: (state: Order['state']) => string | null
  /** Gives what the event says where that is not known before. */
  readonly act?: (standing: Standing) => Promise<string | void>
}

export const createOrdersService = (deps: OrdersDeps) => {
  const { queries, reader, store, jobs, stocks, release, clock, shopTimeZone, mails, announce } =
    deps

  const getOrder = async (id: string, person: SignedIn, signal?: AbortSignal): Promise<Order> => {
    const order = await reader.findOrder(id, companyScope(person), signal)
    if (!order) throw notFound('order')
    return order
  }

  const tell = (topic: 'orders' | 'jobs' | 'pieces', entityId: string | null, companyId: string) =>
    announce({ topic, entityId, companyId, audience: 'company' })

  const checkDay = (neededBy: string): void => {
    if (neededBy >= dayIn(shopTimeZone, clock.now())) return
    throw invalidField('neededBy', 'This day has passed. Choose today or a later day.')
  }

  const saveLines = async (orderId: string, input: OrderInput, pitchRise: number) => {
    const lines = linesForPitch(input.lines, pitchRise)
    checkOrder({ ...input, lines }, await stocks.mapStocks(stocksOf(input)))
    await store.replaceLines(orderId, lines)
  }

  /**
   * Takes the order for one change: whoever comes with an old version, or too late, gets the order
   * as it is now. The event and what the screens are told follow from the change.
   */
  const change = async (
    id: string,
    version: number,
    person: SignedIn,
    { kind, text = '', refuse, act }: Change,
  ): Promise<Order> => {
    const standing = await queries.findOrder(id, companyScope(person))
    if (!standing) throw notFound('order')
    const asSeen = standing.version === version && isBeforeRelease(standing.state)
    const refusal = asSeen ? refuse?.(standing.state) : null
    // Before the order is taken: what is shown as current must not carry the version of a change
    // that is rolled back.
    if (refusal) throw wrongState(refusal, await getOrder(id, person))
    if (!(await store.takeOrder(id, version))) throw orderConflict(await getOrder(id, person))
    const told = (await act?.(standing)) ?? text
    await store.addEvent({ order_id: id, kind, person_id: person.id, text: told })
    await tell('orders', id, standing.company.id)
    return getOrder(id, person)
  }

  return {
    listOrders: (query: QueryOf<typeof listOrders>, person: SignedIn) =>
      queries.listOrders(query, companyScope(person)),

    getOrder,

    /** @throws not-found for the job, invalid-input, profile-problem */
    async submitOrder(body: BodyOf<typeof submitOrder>, person: SignedIn): Promise<Order> {
      const job = await jobs.holdJob(body.jobId, companyScope(person))
      if (!job) throw notFound('job')
      checkDay(body.neededBy)
      const id = await store.createOrder({
        company_id: job.company.id,
        job_id: job.id,
        ordered_by: person.id,
        po_number: body.poNumber,
        needed_by: body.neededBy,
        notes: body.notes,
        goods: JSON.stringify(body.goods),
        pitch_rise: job.pitchRise,
        submitted_at: clock.now(),
      })
      await saveLines(id, body, job.pitchRise)
      await store.addEvent({ order_id: id, kind: 'submitted', person_id: person.id })
      await mails.received(id)
      await tell('orders', id, job.company.id)
      // A job shows how many orders it has.
      await tell('jobs', job.id, job.company.id)
      return getOrder(id, person)
    },

    /** @throws changed-meanwhile, wrong-state with the order as it is now; as for submitting */
    amendOrder: (id: string, body: BodyOf<typeof amendOrder>, person: SignedIn): Promise<Order> =>
      change(id, body.version, person, {
        kind: 'amended',
        text: body.answer,
        act: async ({ job, neededBy }) => {
          // A day that passed while the order waited may stay.
          if (body.neededBy !== neededBy) checkDay(body.neededBy)
          const current = await jobs.findJob(job.id, null)
          if (!current) throw new Error(`Order ${id} has no job.`)
          await saveLines(id, body, current.pitchRise)
          await store.updateOrder(id, {
            po_number: body.poNumber,
            needed_by: body.neededBy,
            notes: body.notes,
            goods: JSON.stringify(body.goods),
            pitch_rise: current.pitchRise,
          })
        },
      }),

    askAboutOrder: (
      id: string,
      body: BodyOf<typeof askAboutOrder>,
      person: SignedIn,
    ): Promise<Order> =>
      change(id, body.version, person, {
        kind: 'question',
        text: body.text,
        act: () => mails.question(id, person, body.text),
      }),

    /** @throws wrong-state when no question is open */
    answerQuestion: (
      id: string,
      body: BodyOf<typeof answerQuestion>,
      person: SignedIn,
    ): Promise<Order> =>
      change(id, body.version, person, {
        kind: 'answered',
        text: body.text,
        refuse: (state) => (state === 'question' ? null : 'No question is open on this order.'),
      }),

    /**
     * @throws wrong-state, changed-meanwhile, cannot-bend, profile-problem, invalid-input for an
     *   override; nothing is released then
     */
    releaseOrder: (
      id: string,
      body: BodyOf<typeof releaseOrder>,
      person: SignedIn,
    ): Promise<Order> =>
      change(id, body.version, person, {
        kind: 'released',
        refuse: (state) =>
          state === 'question'
            ? 'A question to the crew is open. Release the order once it is answered.'
            : null,
        act: async ({ company }) => {
          const at = clock.now()
          const told = await release(id, { person, at, overrides: body.overrides })
          await store.updateOrder(id, { released_at: at })
          await mails.released(id)
          await tell('pieces', null, company.id)
          await announce({ topic: 'runs', entityId: null, companyId: null, audience: 'shop' })
          return told
        },
      }),

    withdrawOrder: (
      id: string,
      body: BodyOf<typeof withdrawOrder>,
      person: SignedIn,
    ): Promise<Order> =>
      change(id, body.version, person, {
        kind: 'withdrawn',
        text: body.reason,
        act: () => store.updateOrder(id, { withdrawn_at: clock.now() }),
      }),
  }
}

export type OrdersService = ReturnType<typeof createOrdersService>
