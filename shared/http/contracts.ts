import * as audit from '#shared/audit/audit.contract'
import * as brakes from '#shared/brakes/brakes.contract'
import * as bundles from '#shared/bundles/bundles.contract'
import * as handOff from '#shared/hand-off/hand-off.contract'
import type { Endpoint } from '#shared/http/endpoint'
import * as jobs from '#shared/jobs/jobs.contract'
import * as labels from '#shared/labels/labels.contract'
import * as mail from '#shared/mail/mail.contract'
import * as orders from '#shared/orders/orders.contract'
import * as accounts from '#shared/people/accounts.contract'
import * as people from '#shared/people/people.contract'
import * as lookup from '#shared/pieces/lookup.contract'
import * as pieces from '#shared/pieces/pieces.contract'
import * as plans from '#shared/plans/plans.contract'
import * as pricing from '#shared/pricing/pricing.contract'
import * as runs from '#shared/runs/runs.contract'
import * as sheets from '#shared/sheets/sheets.contract'
import * as shelf from '#shared/shelf/shelf.contract'
import * as stockItems from '#shared/stock/stock-items.contract'
import * as stock from '#shared/stock/stock.contract'

const isEndpoint = (value: unknown): value is Endpoint =>
  typeof value === 'object' &&
  value !== null &&
  'permission' in value &&
  'answer' in value &&
  'path' in value

/** Every endpoint of the API: the API document and the permission test walk this list. */
export const ENDPOINTS: readonly Endpoint[] = [
  people,
  accounts,
  jobs,
  shelf,
  stock,
  stockItems,
  pricing,
  brakes,
  plans,
  orders,
  pieces,
  lookup,
  runs,
  bundles,
  handOff,
  labels,
  mail,
  audit,
  sheets,
].flatMap((contract) => Object.values<unknown>(contract).filter(isEndpoint))
