import type { Db } from '#server/db/knex'
import { BRAKES } from '#server/db/tables/brakes'
import { CALIBRATIONS } from '#server/db/tables/calibrations'
import { JOBS, type JobInsert } from '#server/db/tables/jobs'
import { SHELF_PROFILES } from '#server/db/tables/shelf-profiles'
import { STOCKS, type StockInsert } from '#server/db/tables/stocks'
import type { Brake } from '#shared/bend-plan/brake.schema'
import { DEMO_BRAKES } from '#shared/bend-plan/demo-brakes'
import type { OrderInput, OrderLineInput } from '#shared/orders/order.schema'
import type { TestBendInput } from '#shared/stock/stock.contract'
import type { Calibration } from '#shared/stock/stock.schema'
import type { Profile } from '#shared/profile/profile.schema'
import { getStarter } from '#shared/profile/starters'

/** Long before every test's day and long after: what a test does not care about never expires. */
export const FAR_DAY = '2099-12-31'

let count = 0
const next = (): number => (count += 1)

const only = <Row>([row]: Row[]): Row => {
  if (row === undefined) throw new Error('Nothing was inserted.')
  return row
}

/** A painted 24 ga steel that takes pieces of ten and a half feet. */
export async function createStock(db: Db, given: Partial<StockInsert> = {}): Promise<string> {
  const position = next()
  const row = only(
    await db(STOCKS)
      .insert({
        position,
        metal: 'steel',
        thickness_name: '24 ga',
        color_name: `Kiln ${position}`,
        color_hex: '#7a3b2e',
        painted: true,
        thickness: 0.0239,
        inside_radius: 0.03,
        k_factor: 0.4,
        density: 0.284,
        springback_per_90: 2,
        widest_strip: 48,
        longest_piece: 126,
        k_source: 'handbookHard',
        ...given,
      })
      .returning('id'),
  )
  return row.id
}

/** In the order given, by default the three demo brakes. */
export async function createBrakes(db: Db, brakes: readonly Brake[] = DEMO_BRAKES): Promise<void> {
  await db(BRAKES).insert(
    brakes.map((brake) => ({
      position: next(),
      name: brake.name,
      definition: JSON.stringify(brake),
    })),
  )
}

export async function createJob(
  db: Db,
  given: Pick<JobInsert, 'company_id' | 'created_by'> & Partial<JobInsert>,
): Promise<string> {
  const row = only(
    await db(JOBS)
      .insert({ name: `Barn ${next()}`, address: '', pitch_rise: 6, ...given })
      .returning('id'),
  )
  return row.id
}

export async function createSavedProfile(
  db: Db,
  owner: { companyId: string } | { starterKey: string },
  name = `Saved ${next()}`,
): Promise<string> {
  const row = only(
    await db(SHELF_PROFILES)
      .insert({
        company_id: 'companyId' in owner ? owner.companyId : null,
        starter_key: 'starterKey' in owner ? owner.starterKey : null,
        name,
        profile: JSON.stringify(zProfile()),
      })
      .returning('id'),
  )
  return row.id
}

/** Flange, web, flange: bends on every demo brake. */
export const zProfile = (legs: readonly [number, number, number] = [1.25, 2, 1.25]): Profile => ({
  ...getStarter('zClosure').profile,
  legs: [...legs],
})

/** Flanges too short for the apron of any demo brake one way, too short to clamp the other. */
export const unbendableProfile = (): Profile => zProfile([0.3, 2, 0.3])

export const lineInput = (
  stockId: string,
  given: Partial<OrderLineInput> = {},
): OrderLineInput => ({
  mark: 'A',
  name: 'Closure',
  profile: zProfile(),
  stockId,
  quantity: 3,
  length: 120,
  ends: null,
  hands: null,
  statedGirth: null,
  ...given,
})

export const orderInput = (
  lines: readonly OrderLineInput[],
  given: Partial<OrderInput> = {},
): OrderInput => ({
  poNumber: '',
  neededBy: FAR_DAY,
  notes: '',
  lines: [...lines],
  goods: [],
  ...given,
})

/** A square bend of a strip as `createStock` makes it, its radius not measured. */
export const testBendInput = (
  brakeId: string,
  given: Partial<TestBendInput> = {},
): TestBendInput => ({
  brakeId,
  stripWidth: 4.953,
  legA: 3,
  legB: 2,
  turn: 90,
  thickness: 0.0239,
  insideRadius: null,
  note: '',
  ...given,
})

export const calibrationOf = (
  brakeId: string,
  kFactor: number,
  insideRadius: number,
): Calibration => ({
  brakeId,
  brakeName: `Brake ${brakeId}`,
  kFactor,
  insideRadius,
  bends: 2,
  by: 'Mo Manager',
  at: '2026-03-02T14:00:00.000Z',
})

/** Takes K and radius into use on a brake, as a manager does with a fit. */
export async function calibrate(
  db: Db,
  { stockId, brakeId, personId }: { stockId: string; brakeId: string; personId: string },
  { kFactor, insideRadius }: { kFactor: number; insideRadius: number },
): Promise<void> {
  await db(CALIBRATIONS).insert({
    stock_id: stockId,
    brake_id: brakeId,
    k_factor: kFactor,
    inside_radius: insideRadius,
    bends: 2,
    person_id: personId,
  })
}
