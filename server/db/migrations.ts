import type { Knex } from 'knex'
import * as people from '#migrations/0001_people'
import * as liveEvents from '#migrations/0002_live_events'
import * as shop from '#migrations/0003_shop'
import * as jobsAndShelf from '#migrations/0004_jobs_and_shelf'
import * as orders from '#migrations/0005_orders'
import * as runsAndBundles from '#migrations/0006_runs_and_bundles'
import * as pieces from '#migrations/0007_pieces'
import * as orderStates from '#migrations/0008_order_states'
import * as planCache from '#migrations/0009_plan_cache'
import * as overrides from '#migrations/0010_overrides'
import * as endsAndGoods from '#migrations/0011_ends_and_goods'
import * as testBends from '#migrations/0012_test_bends'
import * as labelPrints from '#migrations/0013_label_prints'
import * as mails from '#migrations/0014_mails'
import * as accounts from '#migrations/0015_accounts'
import * as auditLog from '#migrations/0016_audit_log'
import * as priceBooks from '#migrations/0017_price_books'
import * as stockItems from '#migrations/0018_stock_items'
import * as shelfVersions from '#migrations/0019_shelf_versions'

interface NamedMigration {
  readonly name: string
  readonly migration: Required<Pick<Knex.Migration, 'up' | 'down'>>
}

/**
 * Every migration in order. A static list with names that have no extension runs the same from
 * TypeScript, from the tests and from the bundled server.
 */
const MIGRATIONS: readonly NamedMigration[] = [
  { name: '0001_people', migration: people },
  { name: '0002_live_events', migration: liveEvents },
  { name: '0003_shop', migration: shop },
  { name: '0004_jobs_and_shelf', migration: jobsAndShelf },
  { name: '0005_orders', migration: orders },
  { name: '0006_runs_and_bundles', migration: runsAndBundles },
  { name: '0007_pieces', migration: pieces },
  { name: '0008_order_states', migration: orderStates },
  { name: '0009_plan_cache', migration: planCache },
  { name: '0010_overrides', migration: overrides },
  { name: '0011_ends_and_goods', migration: endsAndGoods },
  { name: '0012_test_bends', migration: testBends },
  { name: '0013_label_prints', migration: labelPrints },
  { name: '0014_mails', migration: mails },
  { name: '0015_accounts', migration: accounts },
  { name: '0016_audit_log', migration: auditLog },
  { name: '0017_price_books', migration: priceBooks },
  { name: '0018_stock_items', migration: stockItems },
  { name: '0019_shelf_versions', migration: shelfVersions },
]

export const migrationSource: Knex.MigrationSource<NamedMigration> = {
  getMigrations: () => Promise.resolve([...MIGRATIONS]),
  getMigrationName: ({ name }) => name,
  getMigration: ({ migration }) => Promise.resolve({ up: migration.up, down: migration.down }),
}
