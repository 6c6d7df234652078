import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { findRow, readRows } from '#server/db/read-rows'
import { findActivePerson } from '#server/features/people/people.queries'
import type { SignedIn } from '#server/http/signed-in'
import type { OrderMailData } from '#server/features/mail/templates/order-facts'
import { orderNumber, orderStateSchema } from '#shared/orders/order.schema'
import type { Language } from '#shared/people/people.contract'
import { printRun } from '#shared/units/print-length'

const orderSchema = z.object({
  number: z.int(),
  personId: z.uuid(),
  company: z.string(),
  job: z.string(),
  poNumber: z.string(),
  neededBy: z.string(),
  state: orderStateSchema,
})

const lineSchema = z.object({
  mark: z.string(),
  name: z.string(),
  quantity: z.int(),
  length: z.number(),
  color: z.string(),
  thickness: z.string(),
})

const bundleSchema = z.object({ code: z.string(), rackPlace: z.string(), pieces: z.int() })

export interface OrderForMail {
  /** Who ordered; undefined when the account is closed, which gets no mail. */
  readonly person: SignedIn | undefined
  readonly data: OrderMailData
  readonly state: z.infer<typeof orderStateSchema>
}

/** An order as its mails tell of it, in language and units of who ordered it. */
export async function readOrderForMail(
  db: Db,
  orderId: string,
  publicUrl: string,
): Promise<OrderForMail | undefined> {
  const order = await findRow(
    db,
    orderSchema,
    `select o.number, o.ordered_by as "personId", c.name as company, j.name as job,
       o.po_number as "poNumber", o.needed_by as "neededBy", s.state
     from orders o
     join companies c on c.id = o.company_id
     join jobs j on j.id = o.job_id
     join order_states s on s.order_id = o.id
     where o.id = :orderId`,
    { orderId },
  )
  if (!order) return undefined
  const person = await findActivePerson(db, order.personId)
  const { language, units, role } = person ?? { language: 'en', units: 'fraction', role: 'manager' }
  const lines = await readRows(
    db,
    lineSchema,
    `select l.mark, l.name, l.quantity, l.length, st.color_name as color,
       st.thickness_name as thickness
     from order_lines l join stocks st on st.id = l.stock_id
     where l.order_id = :orderId order by l.position`,
    { orderId },
  )
  const place = role === 'crewLead' ? 'roof' : 'counter'
  return {
    person,
    state: order.state,
    data: {
      number: orderNumber(order.number),
      name: person?.name ?? '',
      job: order.job,
      company: order.company,
      poNumber: order.poNumber,
      neededBy: dayWords(order.neededBy, language),
      lines: lines.map(({ color, thickness, length, ...line }) => ({
        ...line,
        length: printRun(length, units),
        stock: `${color} ${thickness}`,
      })),
      url: `${publicUrl}/${place}/orders/${orderId}`,
    },
  }
}

/** A calendar day has no time zone. */
const dayWords = (day: string, language: Language): string =>
  new Intl.DateTimeFormat(language, { dateStyle: 'full', timeZone: 'UTC' }).format(
    new Date(`${day}T00:00:00Z`),
  )

/** The bundles on the rack, with where they lie. */
export const listBundlesForMail = (db: Db, orderId: string) =>
  readRows(
    db,
    bundleSchema,
    `select b.code, b.rack_place as "rackPlace", cast(count(p.id) as integer) as pieces
     from bundles b join pieces p on p.bundle_id = b.id
     where b.order_id = :orderId and b.hand_off_id is null
     group by b.id order by b.number`,
    { orderId },
  )
