import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { readRows } from '#server/db/read-rows'
import { notFound } from '#server/http/errors'
import type { Bundle, BundlePiece, BundleWork } from '#shared/bundles/bundles.contract'
import { mapBundlePieces } from './bundle-pieces.queries'

const bundleRowSchema = z.object({
  id: z.uuid(),
  code: z.string(),
  number: z.int(),
  orderId: z.uuid(),
  orderNumber: z.int(),
  company: z.string(),
  job: z.string(),
  rackPlace: z.string(),
  createdAt: z.date(),
  by: z.string(),
  pickedUpAt: z.date().nullable(),
})

const BUNDLES = `
  select b.id, b.code, b.number, o.id as "orderId", o.number as "orderNumber", c.name as company,
    j.name as job, b.rack_place as "rackPlace", b.created_at as "createdAt", person.name as by,
    h.at as "pickedUpAt"
  from bundles b
  join orders o on o.id = b.order_id
  join companies c on c.id = o.company_id
  join jobs j on j.id = o.job_id
  join people person on person.id = b.created_by
  left join hand_offs h on h.id = b.hand_off_id`

/** A bundle that was opened altogether stays as a record, but nothing lies there any more. */
const HAS_PIECES = 'exists (select 1 from pieces where bundle_id = b.id)'

/** Throws `not-found`. */
export async function getBundle(
  db: Db,
  by: { readonly code: string } | { readonly id: string },
): Promise<Bundle> {
  const [where, value] = 'code' in by ? ['b.code = :value', by.code] : ['b.id = :value', by.id]
  const [bundle] = await readBundles(db, `where ${where}`, { value })
  if (!bundle) throw notFound('bundle')
  return bundle
}

/** What lies on the rack, needed soonest first. */
export const listRackBundles = (db: Db): Promise<Bundle[]> =>
  readBundles(
    db,
    `where b.hand_off_id is null and ${HAS_PIECES} order by o.needed_by, o.number, b.number`,
  )

/** The bundles of an order, those that left among them. */
export const listOrderBundles = (db: Db, orderId: string): Promise<Bundle[]> =>
  readBundles(db, `where b.order_id = :orderId and ${HAS_PIECES} order by b.number`, { orderId })

async function readBundles(
  db: Db,
  rest: string,
  values: Record<string, string> = {},
): Promise<Bundle[]> {
  const rows = await readRows(db, bundleRowSchema, `${BUNDLES} ${rest}`, values)
  const pieces = await mapBundlePieces(
    db,
    'bundle',
    rows.map((row) => row.id),
  )
  return rows.map((row) => toBundle(row, pieces.get(row.id) ?? []))
}

const toBundle = (
  { createdAt, pickedUpAt, ...row }: z.infer<typeof bundleRowSchema>,
  pieces: BundlePiece[],
): Bundle => ({
  ...row,
  pieces,
  weight: pieces.reduce((sum, piece) => sum + piece.weight, 0),
  longest: pieces.reduce((longest, piece) => Math.max(longest, piece.length), 0),
  createdAt: createdAt.toISOString(),
  pickedUpAt: pickedUpAt?.toISOString() ?? null,
})

const workRowSchema = z.object({
  orderId: z.uuid(),
  orderNumber: z.int(),
  company: z.string(),
  job: z.string(),
  neededBy: z.string(),
  queued: z.int(),
})

/** Orders with bent pieces that lie loose, needed soonest first. */
export async function listBundleWork(db: Db): Promise<BundleWork[]> {
  const rows = await readRows(
    db,
    workRowSchema,
    `select o.id as "orderId", o.number as "orderNumber", c.name as company, j.name as job,
       o.needed_by as "neededBy", counts.queued
     from (
       select order_id, count(*) filter (where state = 'queued') as queued
       from pieces where state in ('queued', 'bent')
       group by order_id having bool_or(state = 'bent')
     ) counts
     join orders o on o.id = counts.order_id
     join companies c on c.id = o.company_id
     join jobs j on j.id = o.job_id
     order by o.needed_by, o.number`,
  )
  const loose = await mapBundlePieces(
    db,
    'order',
    rows.map((row) => row.orderId),
  )
  return rows.map((row) => ({ ...row, loose: loose.get(row.orderId) ?? [] }))
}
