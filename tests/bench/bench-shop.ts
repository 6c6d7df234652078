import type { Knex } from 'knex'
import { DEMO_ACCOUNTS } from '#seeds/demo'
import { createDatabase } from '#server/db/knex'
import type { Role } from '#shared/access/permissions'
import { ApiAgent } from '../support/api-agent'
import { createProductDatabase, startProduct } from '../support/product-process'

/** The built product with the demo shop, in a process and a database of its own. */
export interface BenchShop {
  readonly db: Knex
  /** A browser of the first demo person of this role. */
  readonly signIn: (role: Role) => Promise<ApiAgent>
  readonly close: () => Promise<void>
}

export async function openBenchShop(): Promise<BenchShop> {
  const database = await createProductDatabase()
  const product = await startProduct(database.url)
  const db = createDatabase(database.url, { poolSize: 2 })

  const signIn = async (role: Role) => {
    const account = DEMO_ACCOUNTS.find((each) => each.role === role)
    if (!account) throw new Error(`The demo shop has no ${role}.`)
    const agent = new ApiAgent(product.url)
    const { status } = await agent.signIn(account.email, account.password)
    if (status !== 200) throw new Error(`${account.email} could not sign in: ${status}.`)
    return agent
  }
  const close = async () => {
    await db.destroy()
    await product.stop()
    await database.drop()
  }
  return { db, signIn, close }
}
