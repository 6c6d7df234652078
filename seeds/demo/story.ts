import type { Order, OrderInput } from '#shared/orders/order.schema'
import type { Dressing } from './dressings'
import type { DemoJob } from './jobs'
import type { DemoPerson } from './people'
import type { DemoProfile } from './profiles'
import type { DemoShop } from './shop'
import type { DemoStock } from './stocks'

/** Mark, what the crew calls it, profile, stock, pieces, inches, and ends where they are dressed. */
export type LineOfStory = readonly [
  mark: string,
  name: string,
  profile: DemoProfile,
  stock: DemoStock,
  quantity: number,
  length: number,
  dressing?: Dressing,
]

/** One thing that happens to an order. Many take a while: they move the time on themselves. */
export type Act = (told: Told) => Promise<void>

export interface Step {
  /** Working days before today, below 0. */
  readonly day: number
  readonly time: string
  readonly act: Act
}

export interface Story {
  readonly by: DemoPerson
  readonly job: DemoJob
  readonly poNumber: string
  /** Working days from today. */
  readonly neededIn: number
  readonly notes: string
  readonly lines: readonly LineOfStory[]
  readonly goods?: OrderInput['goods']
  readonly steps: readonly Step[]
}

/** One thing that happens in the shop and to no order. */
export interface ShopStep {
  readonly day: number
  readonly time: string
  readonly act: (shop: DemoShop) => Promise<void>
}

/** A story being told: its order exists once it was submitted. */
export interface Told {
  readonly shop: DemoShop
  readonly story: Story
  readonly getOrder: () => Promise<Order>
  readonly setOrder: (id: string) => void
}

export const at = (day: number, time: string, act: Act): Step => ({ day, time, act })
