import { DEMO_PEOPLE } from './people'
import type { DemoShop } from './shop'
import type { Step, Story, Told } from './story'

interface Happening {
  readonly moment: Date
  readonly step: Step
  readonly told: Omit<Told, 'now'>
}

/** Lets all stories happen, each step in its turn, so that numbers and events run with the time. */
export async function tellStories(shop: DemoShop, stories: readonly Story[]): Promise<void> {
  const happenings = stories.flatMap((story) => happeningsOf(shop, story))
  happenings.sort((a, b) => a.moment.getTime() - b.moment.getTime())
  for (const { moment, step, told } of happenings) {
    shop.setTime(moment)
    await step.act({ ...told, now: moment })
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
  return story.steps.map((step) => ({
    moment: shop.calendar.moment(step.day, step.time),
    step,
    told,
  }))
}
