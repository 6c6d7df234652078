import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { newCode } from '#server/features/pieces/new-code'
import { may } from '#shared/access/permissions'
import { listBrakes } from '#shared/brakes/brakes.contract'
import { ENDPOINTS } from '#shared/http/contracts'
import type { Endpoint } from '#shared/http/endpoint'
import { getJob, listJobs } from '#shared/jobs/jobs.contract'
import type { Order } from '#shared/orders/order.schema'
import { listOrders } from '#shared/orders/orders.contract'
import { getPiece, undoMoves } from '#shared/pieces/pieces.contract'
import { listMails } from '#shared/mail/mail.contract'
import { listCrew } from '#shared/people/accounts.contract'
import { getSession } from '#shared/people/people.contract'
import { listShelf } from '#shared/shelf/shelf.contract'
import { recordTestBend } from '#shared/stock/stock.contract'
import { fillPath, type ApiAgent, type ApiAnswer } from '../../support/api-agent'
import { at, openFloor, type Floor } from '../../support/making-factories'
import { lineInput, orderInput, testBendInput, zProfile } from '../../support/shop-factories'
import { createHoldings, firstLineOf, marksOf, type Holdings } from './holdings'
import { namedThings, nameOf } from './named-things'

let floor: Floor
let foreign: Holdings
let nothing: Holdings
beforeAll(async () => {
  floor = await openFloor()
  foreign = await createHoldings(floor, floor.otherCrew)
  nothing = nowhere(foreign)
})
afterAll(() => floor.close())

/** The same holdings under ids and codes that were never given out. */
function nowhere(holdings: Holdings): Holdings {
  const never = (order: Order): Order => ({ ...order, id: randomUUID() })
  return {
    ...holdings,
    companyId: randomUUID(),
    personId: randomUUID(),
    jobId: randomUUID(),
    profileId: randomUUID(),
    order: never(holdings.order),
    asked: never(holdings.asked),
    withdrawn: never(holdings.withdrawn),
    released: never(holdings.released),
    code: newCode('piece'),
    lineId: randomUUID(),
    eventIds: [2_000_000_000],
  }
}

/**
 * What an id or code in a request of a crew lead may name: how it is taken from another company's
 * holdings, one variant for each state it can be in. `shop` is common to all companies.
 */
const TAKEN_FROM: Record<string, 'shop' | ((from: Holdings) => Partial<Holdings>[])> = {
  personId: ({ personId }) => [{ personId }],
  jobId: ({ jobId }) => [{ jobId }],
  orderId: ({ order, asked, withdrawn, released }) =>
    [order, asked, withdrawn, released].map((each) => ({
      order: each,
      asked: each,
      lineId: firstLineOf(each),
    })),
  lineId: ({ lineId }) => [{ lineId }],
  profileId: ({ profileId }) => [{ profileId }],
  companyId: ({ companyId }) => [{ companyId }],
  code: ({ code }) => [{ code }],
  eventIds: ({ eventIds }) => [{ eventIds }],
  stockId: 'shop',
}

interface Request {
  readonly params?: Record<string, string>
  readonly query?: string
  readonly body?: unknown
  /** What the owner gets, where that is not what the endpoint is for. */
  readonly owner?: number
}

const input = () => orderInput([lineInput(floor.stockId)])
const job = { name: 'Cow barn', address: '', pitchRise: 4 }
const drawn = { name: 'Rake', profile: zProfile() }

const ofLine = ({ order, lineId }: Holdings): Request => ({
  params: { orderId: order.id, lineId },
})

/** A request that its owner may make, for everything a crew lead may do by an id or a code. */
const REQUESTS: Record<string, (own: Holdings) => Request> = {
  'POST /people': ({ companyId }) => ({
    body: {
      name: 'Odo Fernhill',
      email: `${randomUUID()}@example.com`,
      role: 'crewLead',
      language: 'en',
      companyId,
    },
  }),
  'POST /people/:personId/invitation': ({ personId }) => ({ params: { personId } }),
  'POST /jobs': ({ companyId }) => ({ body: { ...job, companyId } }),
  'GET /jobs/:jobId': ({ jobId }) => ({ params: { jobId } }),
  'PATCH /jobs/:jobId': ({ jobId }) => ({ params: { jobId }, body: { version: 1, name: 'Mine' } }),
  'POST /profiles': ({ companyId }) => ({ body: { ...drawn, companyId } }),
  'PUT /profiles/:profileId': ({ profileId }) => ({
    params: { profileId },
    body: { ...drawn, name: `Rake ${profileId}`, version: 1 },
  }),
  'GET /profiles/:profileId/versions': ({ profileId }) => ({ params: { profileId } }),
  'GET /orders': ({ jobId }) => ({ query: `?jobId=${jobId}` }),
  'POST /orders': ({ jobId }) => ({ body: { ...input(), jobId } }),
  'GET /orders/:orderId': ({ order }) => ({ params: { orderId: order.id } }),
  'PUT /orders/:orderId': ({ order: { id, version } }) => ({
    params: { orderId: id },
    body: { ...input(), version },
  }),
  'POST /orders/:orderId/answers': ({ asked: { id, version } }) => ({
    params: { orderId: id },
    body: { version, text: 'The painted one.' },
  }),
  'POST /orders/:orderId/withdrawal': ({ order: { id, version } }) => ({
    params: { orderId: id },
    body: { version, reason: 'Not needed.' },
  }),
  'GET /orders/:orderId/order-sheet.pdf': ({ order }) => ({ params: { orderId: order.id } }),
  'GET /orders/:orderId/lines/:lineId/strip-sheet.pdf': ofLine,
  'GET /orders/:orderId/lines/:lineId/ends.pdf': ofLine,
  'GET /orders/:orderId/lines/:lineId/strip.svg': ofLine,
  'GET /orders/:orderId/lines/:lineId/strip.dxf': ofLine,
  'GET /pieces/:code': ({ code }) => ({ params: { code } }),
  'POST /piece-events/undo': ({ eventIds }) => ({
    body: { eventIds, reason: 'A slip.' },
    // A crew moves no pieces, so it takes no move back: not even one of its own pieces.
    owner: 403,
  }),
}

const send = (agent: ApiAgent, endpoint: Endpoint, request: Request): Promise<ApiAnswer> =>
  agent.send(
    endpoint.method,
    fillPath(endpoint.path, request.params ?? {}) + (request.query ?? ''),
    request.body,
  )

const mayCrew = ({ permission }: Endpoint): boolean =>
  permission === 'public' || may('crewLead', permission)

const crewEndpoints = ENDPOINTS.filter(mayCrew)
const shopEndpoints = ENDPOINTS.filter((endpoint) => !mayCrew(endpoint))

/** The things a request names that belong to one company. */
const ownedThings = (endpoint: Endpoint): string[] =>
  namedThings(endpoint).filter((name) => TAKEN_FROM[name] !== 'shop')

const byThing = crewEndpoints.flatMap((endpoint) =>
  ownedThings(endpoint).map(
    (thing) => [`${nameOf(endpoint)} by ${thing}`, endpoint, thing] as const,
  ),
)

describe('the table of what a request names', () => {
  it('knows every id and code that a crew lead may send', () => {
    const names = new Set(crewEndpoints.flatMap(namedThings))
    expect([...names].filter((name) => !(name in TAKEN_FROM))).toEqual([])
    expect(names.size).toBe(Object.keys(TAKEN_FROM).length)
  })

  it('has a request for every endpoint that takes one of a company', () => {
    const taking = new Set(byThing.map(([, endpoint]) => nameOf(endpoint)))
    expect([...taking].sort()).toEqual(Object.keys(REQUESTS).sort())
  })
})

describe.each(byThing)('%s', (_name, endpoint, thing) => {
  const request = (holdings: Holdings): Request => {
    const make = REQUESTS[nameOf(endpoint)]
    if (!make) throw new Error(`${nameOf(endpoint)} has no request in the table.`)
    return make(holdings)
  }
  const variants = (from: Holdings): Partial<Holdings>[] => {
    const take = TAKEN_FROM[thing]
    if (take === undefined || take === 'shop') throw new Error(`${thing} is not in the table.`)
    return take(from)
  }

  it('serves the owner, and finds nothing of another company', async () => {
    const own = await createHoldings(floor, floor.crew)
    const answers = async (from: Holdings) => {
      const all: ApiAnswer[] = []
      for (const taken of variants(from)) {
        all.push(await send(floor.crew.agent, endpoint, request({ ...own, ...taken })))
      }
      return all
    }
    const before = await readByOwner()
    const theirs = await answers(foreign)
    const unknown = await answers(nothing)
    if (endpoint.path === listOrders.path && endpoint.method === 'GET') {
      expect(theirs.map(({ body }) => body)).toEqual([{ items: [], next: null }])
    } else {
      expect(theirs.map(({ status }) => status)).toEqual(theirs.map(() => 404))
      // The words do not tell whether there is such a thing elsewhere.
      expect(theirs.map(wordsWithoutNames)).toEqual(unknown.map(wordsWithoutNames))
    }
    expect(await readByOwner()).toEqual(before)

    const granted = request(own)
    const answer = await send(floor.crew.agent, endpoint, granted)
    expect(answer.status).toBe(granted.owner ?? endpoint.success)
  })
})

/** A problem without what it says of the request itself. */
const wordsWithoutNames = (answer: ApiAnswer): unknown => {
  const text = JSON.stringify(answer.problem())
  return JSON.parse(
    text.replaceAll(/[0-9a-f]{8}-[0-9a-f-]{27}/g, 'ID').replaceAll(/\b[PBR][0-9A-Z]{7}\b/g, 'CODE'),
  )
}

/** All that could have been changed, as its owner reads it. */
async function readByOwner(): Promise<unknown> {
  const { agent } = floor.otherCrew
  return {
    job: await agent.call(getJob, { params: { jobId: foreign.jobId } }),
    jobs: await agent.call(listJobs),
    shelf: await agent.call(listShelf),
    crew: await agent.call(listCrew),
    orders: await agent.call(listOrders),
    piece: await agent.call(getPiece, { params: { code: foreign.code } }),
  }
}

describe('what the shop alone may do', () => {
  let bendId: string
  let mailId: string
  beforeAll(async () => {
    const mails = await floor.manager.call(listMails)
    mailId = at(mails.items, 0).id
    const { items } = await floor.manager.call(listBrakes)
    const { bends } = await floor.wren.call(recordTestBend, {
      params: { stockId: floor.stockId },
      body: testBendInput(at(items, 0).id),
    })
    bendId = at(bends, 0).id
  })

  /** By the place of the id in the path; the shop's endpoints name no other things there. */
  const theirParams = (endpoint: Endpoint): Record<string, string> => ({
    personId: foreign.personId,
    mailId,
    position: '1',
    orderId: foreign.order.id,
    runId: foreign.runId,
    bundleId: foreign.bundleId,
    printId: foreign.printId,
    lineId: foreign.lineId,
    stockId: floor.stockId,
    bendId,
    code: endpoint.path.startsWith('/bundles') ? foreign.bundleCode : foreign.code,
  })
  const unknownParams = {
    personId: randomUUID(),
    mailId: randomUUID(),
    position: '1',
    orderId: randomUUID(),
    runId: randomUUID(),
    bundleId: randomUUID(),
    printId: randomUUID(),
    lineId: randomUUID(),
    stockId: randomUUID(),
    bendId: randomUUID(),
    code: newCode('piece'),
  }

  it.each(shopEndpoints.map((endpoint) => [nameOf(endpoint), endpoint] as const))(
    '%s does not tell a crew lead whether the thing is there',
    async (_name, endpoint) => {
      const answer = await send(floor.crew.agent, endpoint, { params: theirParams(endpoint) })
      const unknown = await send(floor.crew.agent, endpoint, { params: unknownParams })
      expect(answer.status).toBe(403)
      expect(answer.problem().code).toBe('not-allowed')
      expect(wordsWithoutNames(answer)).toEqual(wordsWithoutNames(unknown))
    },
  )
})

describe('lists', () => {
  const lists = crewEndpoints.filter(({ method, path }) => method === 'GET' && !path.includes('/:'))

  it('show a crew lead the rows of the own company and none of another', async () => {
    await createHoldings(floor, floor.crew)
    const limited: string[] = []
    for (const endpoint of lists) {
      const read = async (agent: ApiAgent) => {
        const { body } = await agent.get(endpoint.path)
        return JSON.stringify(body)
      }
      const marks = marksOf(foreign)
      const seen = await read(floor.crew.agent)
      expect(marks.filter((mark) => seen.includes(mark))).toEqual([])
      const byOwner = await read(floor.otherCrew.agent)
      if (marks.some((mark) => byOwner.includes(mark))) limited.push(endpoint.path)
    }
    // The others are the shop's own: stocks, brakes and prices.
    expect(limited.sort()).toEqual(
      [getSession, listCrew, listJobs, listOrders, listShelf].map(({ path }) => path).sort(),
    )
  })

  it('are searched within the own company only', async () => {
    for (const endpoint of [listJobs, listOrders]) {
      for (const search of [foreign.companyName, foreign.leadName, String(foreign.order.number)]) {
        const { items } = await floor.crew.agent.call(endpoint, { query: { search } })
        const marks = marksOf(foreign)
        expect(marks.filter((mark) => JSON.stringify(items).includes(mark))).toEqual([])
      }
    }
    const found = await floor.otherCrew.agent.call(listOrders, {
      query: { search: String(foreign.order.number) },
    })
    expect(found.items).toHaveLength(1)
  })
})

describe('taking back moves of several pieces', () => {
  it('finds nothing as soon as one is of another company', async () => {
    const own = await createHoldings(floor, floor.crew)
    const eventIds = [...own.eventIds, ...foreign.eventIds]
    const answer = await floor.crew.agent.post(undoMoves.path, { eventIds, reason: 'A slip.' })
    expect(answer.status).toBe(404)
  })
})
