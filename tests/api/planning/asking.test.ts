import { randomUUID } from 'node:crypto'
import { afterEach, describe, expect, it } from 'vitest'
import { PLAN_CACHE } from '#server/db/tables/plan-cache'
import { announce } from '#server/live/announce'
import { sourceWorker } from '#server/planning/source-worker'
import { startPlanning } from '#server/planning/start-planning'
import { livePlanSchema } from '#shared/live/live'
import { sessionSchema } from '#shared/people/people.contract'
import { planDrawing } from '#shared/plans/plans.contract'
import { hardProfile } from '../../support/hard-profile'
import { LiveStream } from '../../support/live-stream'
import { zProfile } from '../../support/shop-factories'
import { openShop, type Shop } from '../../support/shop-scene'

let shop: Shop
const openWithRoomFor = async (mostWaiting: number) => {
  shop = await openShop({
    planning: (deps) =>
      startPlanning({ program: sourceWorker, threads: 1, mostWaiting, reportEvery: 0 }, deps),
  })
}

const leaving: AbortController[] = []
const streams: LiveStream[] = []
afterEach(async () => {
  for (const stream of streams.splice(0)) stream.close()
  for (const each of leaving.splice(0)) each.abort()
  await shop.close()
})

const drawing = (seed: number, progressKey?: string) => ({
  profile: hardProfile(seed),
  stockId: shop.stockId,
  pieceLength: 120,
  ...(progressKey !== undefined && { progressKey }),
})

/** Asks as a page does that may be closed before the answer. */
async function askAndLeave(body: object) {
  const session = sessionSchema.parse((await shop.counter.get('/session')).body)
  const page = new AbortController()
  leaving.push(page)
  const answer = shop.counter.fetch('/plans', {
    method: 'POST',
    headers: { 'content-type': 'application/json', 'x-csrf-token': session.csrfToken },
    body: JSON.stringify(body),
    signal: page.signal,
  })
  const ended = answer.then(
    () => 'answered',
    () => 'left',
  )
  return { leave: () => page.abort(), ended }
}

async function follow(agent: Shop['counter']): Promise<LiveStream> {
  const stream = await LiveStream.open(agent)
  streams.push(stream)
  expect(await stream.next()).toMatchObject({ name: 'ready' })
  return stream
}

const underWay = async (stream: LiveStream, key: string) => {
  for (;;) {
    const event = await stream.next()
    if (event?.name !== 'plan') throw new Error(`No progress but ${JSON.stringify(event)}.`)
    const progress = livePlanSchema.parse(event.data)
    if (progress.key === key) return progress
  }
}

describe('Asking for a plan', () => {
  it('that takes long is told of to who asked, and to nobody else', async () => {
    await openWithRoomFor(10)
    const [mine, other] = [await follow(shop.counter), await follow(shop.crew.agent)]
    const key = randomUUID()
    const asked = await askAndLeave(drawing(1, key))
    const progress = await underWay(mine, key)
    expect(progress.nodes).toBeGreaterThan(0)
    asked.leave()
    expect(await asked.ended).toBe('left')
    await announce(shop.db, { topic: 'stocks', entityId: null, companyId: null, audience: 'all' })
    expect(await other.nextChange()).toEqual({ topic: 'stocks', entityId: null })
  })

  it('and leaving gives it up: what waits behind it is next', async () => {
    await openWithRoomFor(10)
    const stream = await follow(shop.counter)
    const key = randomUUID()
    const asked = await askAndLeave(drawing(2, key))
    await underWay(stream, key)
    asked.leave()
    expect(await asked.ended).toBe('left')
    const { brakes } = await shop.crew.agent.call(planDrawing, {
      body: { profile: zProfile(), stockId: shop.stockId, pieceLength: 120 },
    })
    expect(brakes.map(({ plan }) => plan.feasible)).toEqual([true, true, true])
    // One thread takes one plan after another: had they not been given up, these came first.
    expect(await shop.db(PLAN_CACHE)).toHaveLength(3)
  })

  it('is refused where too much waits already, with when to try again', async () => {
    // The plans of one drawing: one is made, two wait.
    await openWithRoomFor(2)
    const stream = await follow(shop.counter)
    const key = randomUUID()
    const asked = await askAndLeave(drawing(3, key))
    await underWay(stream, key)
    const refused = await shop.crew.agent.post('/plans', drawing(4))
    expect(refused.status).toBe(503)
    expect(refused.problem().code).toBe('not-ready')
    expect(refused.headers.get('retry-after')).toBe('5')
    asked.leave()
    expect(await asked.ended).toBe('left')
  })
})
