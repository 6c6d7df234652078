import { DEMO_PEOPLE } from './people'
import type { DemoShop } from './shop'
import type { ShopStep, Story } from './story'

interface Happening {
  readonly moment: Date
  readonly happen: () => Promise<void>
}

/**
 * Lets all stories happen, and what happens in the shop beside them, each step in its turn, so that
 * numbers and events run with the time.
 */
export async function tellStories(
  shop: DemoShop,
  stories: readonly Story[],
  steps: readonly ShopStep[],
): Promise<void> {
  const happenings = [
    ...stories.flatMap((story) => happeningsOf(shop, story)),
    ...steps.map(({ day, time, act }) => ({
      moment: shop.calendar.moment(day, time),
      happen: () => act(shop),
    })),
  ]
  happenings.sort((a, b) => a.moment.getTime() - b.moment.getTime())
  for (const { moment, happen } of happenings) {
    // What took longer than it was given lets the next thing begin later.
    const now = shop.clock.now()
    shop.setTime(moment > now ? moment : now)
    await happen()
  }
}

function happeningsOf(shop: DemoShop, story: Story): Happening[] {
  let orderId: string | undefined
  const told = {
    shop,
    story,
    getOrder: () => {
      if (orderId === undefined) throw new Error('Nothing was submitted yet.')
      return shop.orders.getOrder(orderId, DEMO_PEOPLE.juno)
    },
    setOrder: (id: string) => {
      orderId = id
    },
  }
  return story.steps.map(({ day, time, act }) => ({
    moment: shop.calendar.moment(day, time),
    happen: () => act(told),
  }))
}
