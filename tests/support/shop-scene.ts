import type { AnswerOf } from '#shared/http/endpoint'
import type { OrderInput, OrderLineInput } from '#shared/orders/order.schema'
import { getOrder, releaseOrder, submitOrder } from '#shared/orders/orders.contract'
import type { ApiAgent } from './api-agent'
import { startApi, type Api, type ApiOptions } from './api-app'
import type { TestPerson } from './factories'
import { createBrakes, createJob, createStock, lineInput, orderInput } from './shop-factories'

export interface Crew {
  readonly lead: TestPerson
  readonly companyId: string
  readonly agent: ApiAgent
  readonly jobId: string
}

/** A shop with a stock, its brakes, a counter, and two crews that must not see each other. */
export async function openShop(options: ApiOptions = {}) {
  const api = await startApi(options)
  const stockId = await createStock(api.db)
  await createBrakes(api.db)
  const crew = await hireCrew(api, 'Ada Ridge')
  const otherCrew = await hireCrew(api, 'Bo Valley')
  const clerk = await api.make.person('counter', { name: 'Cy Counter' })
  const counter = await api.signInAs(clerk)

  return {
    api,
    db: api.db,
    stockId,
    crew,
    otherCrew,
    clerk,
    counter,
    close: api.close,
    /** A line of the shop's stock. */
    line: (given: Partial<OrderLineInput> = {}) => lineInput(stockId, given),
    /** The crew submits an order; by default one line of three pieces. */
    submit: (
      lines: OrderLineInput[] = [lineInput(stockId)],
      given: Partial<OrderInput> = {},
      by: Crew = crew,
    ) => by.agent.call(submitOrder, { body: { ...orderInput(lines, given), jobId: by.jobId } }),
    release: (order: { id: string; version: number }) =>
      counter.call(releaseOrder, {
        params: { orderId: order.id },
        body: { version: order.version },
      }),
    readOrder: (id: string): Promise<AnswerOf<typeof getOrder>> =>
      counter.call(getOrder, { params: { orderId: id } }),
  }
}

async function hireCrew(api: Api, name: string): Promise<Crew> {
  const lead = await api.make.person('crewLead', { name })
  const { companyId } = lead
  if (companyId === null) throw new Error('A crew lead has a company.')
  const agent = await api.signInAs(lead)
  const jobId = await createJob(api.db, { company_id: companyId, created_by: lead.id })
  return { lead, companyId, agent, jobId }
}

export type Shop = Awaited<ReturnType<typeof openShop>>
