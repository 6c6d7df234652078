import { BRAKES } from '#server/db/tables/brakes'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { DEMO_PEOPLE } from './people'
import type { DemoShop } from './shop'
import { DEMO_STOCKS } from './stocks'
import type { ShopStep } from './story'

const STOCK_ID = DEMO_STOCKS.harbor.id
const BRAKE = DEMO_BRAKE.upAndDown

async function getBrakeId({ db }: DemoShop): Promise<string> {
  const brake = await db(BRAKES).where({ name: BRAKE.name }).first('id')
  if (!brake) throw new Error(`The demo shop has no ${BRAKE.name}.`)
  return brake.id
}

/** Wren cuts a strip of 5 in., bends it and measures; figures invented. */
const measure =
  (turn: number, legA: number, legB: number, note: string): ShopStep['act'] =>
  async (shop) => {
    const brakeId = await getBrakeId(shop)
    const measured = { stripWidth: 5, legA, legB, turn, thickness: 0.0322, insideRadius: null }
    const { wren } = DEMO_PEOPLE
    await shop.testBends.recordTestBend(STOCK_ID, { brakeId, ...measured, note }, wren)
  }

const takeIntoUse: ShopStep['act'] = async (shop) => {
  const { fits } = await shop.testBends.getTestBends(STOCK_ID)
  const [found] = fits
  if (!found) throw new Error('The demo test bends give no K.')
  const { brakeId, kFactor, insideRadius } = found
  const fit = { kFactor, insideRadius }
  await shop.testBends.calibrateStock(STOCK_ID, { brakeId, fit }, DEMO_PEOPLE.juno)
}

/** Two bends of one stock on one brake, and what they give taken into use. */
export const TEST_BEND_STEPS: readonly ShopStep[] = [
  { day: -3, time: '18:30', act: measure(90, 3.031, 2.031, 'Middle of the brake.') },
  { day: -3, time: '18:45', act: measure(135, 3.008, 2.008, 'Same strip width, same place.') },
  { day: -2, time: '20:20', act: takeIntoUse },
]
