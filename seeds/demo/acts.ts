import type { OrderLineInput } from '#shared/orders/order.schema'
import { DEMO_JOBS } from './jobs'
import { DEMO_PEOPLE, type DemoPerson } from './people'
import { DEMO_PROFILES } from './profiles'
import type { Act, LineOfStory } from './story'
import { DEMO_STOCKS } from './stocks'

const { ines } = DEMO_PEOPLE

const inputOf = ([
  mark,
  name,
  profile,
  stock,
  quantity,
  length,
  dressing = {},
]: LineOfStory): OrderLineInput => ({
  mark,
  name,
  profile: DEMO_PROFILES[profile],
  stockId: DEMO_STOCKS[stock].id,
  quantity,
  length,
  ends: dressing.ends ?? null,
  hands: dressing.hands ?? null,
  statedGirth: dressing.statedGirth ?? null,
})

export const submit: Act = async ({ shop, story, setOrder }) => {
  const order = await shop.orders.submitOrder(
    {
      jobId: DEMO_JOBS[story.job].id,
      poNumber: story.poNumber,
      neededBy: shop.calendar.day(story.neededIn),
      notes: story.notes,
      lines: story.lines.map(inputOf),
      goods: story.goods ?? [],
    },
    DEMO_PEOPLE[story.by],
  )
  setOrder(order.id)
}

export const ask =
  (text: string): Act =>
  async ({ shop, getOrder }) => {
    const { id, version } = await getOrder()
    await shop.orders.askAboutOrder(id, { version, text }, ines)
  }

export const answer =
  (text: string): Act =>
  async ({ shop, story, getOrder }) => {
    const { id, version } = await getOrder()
    await shop.orders.answerQuestion(id, { version, text }, DEMO_PEOPLE[story.by])
  }

/** Amends the order to these pieces of its first line. */
export const amendFirst =
  (quantity: number): Act =>
  async ({ shop, story, getOrder }) => {
    const { id, version, poNumber, neededBy, notes, goods } = await getOrder()
    const lines = story.lines
      .map(inputOf)
      .map((line, index) => (index === 0 ? { ...line, quantity } : line))
    const amended = { version, poNumber, neededBy, notes, lines, goods }
    await shop.orders.amendOrder(id, amended, DEMO_PEOPLE[story.by])
  }

export const withdraw =
  (reason: string, by: DemoPerson): Act =>
  async ({ shop, getOrder }) => {
    const { id, version } = await getOrder()
    await shop.orders.withdrawOrder(id, { version, reason }, DEMO_PEOPLE[by])
  }

export const release: Act = async ({ shop, getOrder }) => {
  const { id, version } = await getOrder()
  await shop.orders.releaseOrder(id, { version, overrides: [] }, ines)
}
