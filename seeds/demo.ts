import type { Knex } from 'knex'
import { hashPassword } from '#server/features/people/passwords'
import { BRAKES, type BrakeInsert } from '#server/db/tables/brakes'
import { COMPANIES } from '#server/db/tables/companies'
import { JOBS } from '#server/db/tables/jobs'
import { PEOPLE } from '#server/db/tables/people'
import { PRICE_BOOKS } from '#server/db/tables/price-books'
import { SHELF_PROFILES } from '#server/db/tables/shelf-profiles'
import { STOCK_ITEMS } from '#server/db/tables/stock-items'
import { STOCKS } from '#server/db/tables/stocks'
import { DEMO_BRAKES } from '#shared/bend-plan/demo-brakes'
import { createCalendar, type Calendar } from './demo/calendar'
import { createDemoRandom, type DemoRandom } from './demo/demo-random'
import { FIRST_WEEKS } from './demo/first-weeks'
import { jobRows } from './demo/jobs'
import { ACCOUNT_STEPS } from './demo/mails'
import { DEMO_COMPANIES, DEMO_PASSWORD, DEMO_PEOPLE, personRow } from './demo/people'
import { DEMO_PRICE_BOOK } from './demo/price-book'
import { SHELF_CHANGE, shelfRows } from './demo/profiles'
import { createDemoShop } from './demo/shop'
import { stockItemRows } from './demo/stock-items'
import { DEMO_STOCKS } from './demo/stocks'

import { STORIES } from './demo/stories'
import { tellStories } from './demo/tell'
import { TEST_BEND_STEPS } from './demo/test-bends'
import { THIS_WEEK } from './demo/this-week'

/** Who can sign in to the demo shop. */
export const DEMO_ACCOUNTS: readonly {
  readonly role: string
  readonly name: string
  readonly email: string
  readonly password: string
}[] = Object.values(DEMO_PEOPLE).map(({ role, name, email }) => ({
  role,
  name,
  email,
  password: DEMO_PASSWORD,
}))

const SEED = 20_260

/**
 * Fills an empty database with the demo shop: ids and codes are always the same, days count from
 * today. All or nothing.
 */
export async function seedDemo(db: Knex): Promise<void> {
  const calendar = createCalendar(new Date())
  const random = createDemoRandom(SEED)
  const passwordHash = await hashPassword(DEMO_PASSWORD)
  await db.transaction(async (trx) => {
    await insertShop(trx, calendar, random, passwordHash)
    await tellStories(
      createDemoShop(trx, calendar, random),
      [...STORIES, ...FIRST_WEEKS, ...THIS_WEEK],
      [...TEST_BEND_STEPS, ...ACCOUNT_STEPS],
    )
  })
}

async function insertShop(
  db: Knex,
  calendar: Calendar,
  random: DemoRandom,
  passwordHash: string,
): Promise<void> {
  const opened = calendar.moment(-14, '13:00')
  await db(COMPANIES).insert(
    Object.values(DEMO_COMPANIES).map((company) => ({ ...company, created_at: opened })),
  )
  await db(PEOPLE).insert(
    Object.values(DEMO_PEOPLE).map((person) => personRow(person, passwordHash, opened)),
  )
  await db(STOCKS).insert(Object.values(DEMO_STOCKS))
  await db(STOCK_ITEMS).insert(stockItemRows(calendar))
  await db(PRICE_BOOKS).insert({
    definition: JSON.stringify(DEMO_PRICE_BOOK),
    person_id: DEMO_PEOPLE.juno.id,
    at: opened,
  })
  await db(BRAKES).insert(
    DEMO_BRAKES.map((brake, index): BrakeInsert => ({
      id: random.nextId(),
      position: index + 1,
      name: brake.name,
      definition: JSON.stringify(brake),
    })),
  )
  await db(SHELF_PROFILES).insert(
    shelfRows(random.nextId).map((row) => ({ ...row, updated_at: opened })),
  )
  await db(SHELF_PROFILES)
    .where({ company_id: SHELF_CHANGE.companyId, name: SHELF_CHANGE.name })
    .update({ ...SHELF_CHANGE.saved, updated_at: calendar.moment(-11, '15:20') })
  await db(JOBS).insert(jobRows(calendar))
}
