import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { MAILS } from '#server/db/tables/mails'
import { getMail, mailAttachment } from '#shared/mail/mail.contract'
import { orderNumber, type Order } from '#shared/orders/order.schema'
import { withdrawOrder } from '#shared/orders/orders.contract'
import { updateSelf } from '#shared/people/people.contract'
import { orderSheet } from '#shared/sheets/sheets.contract'
import type { ApiAgent } from '../../support/api-agent'
import { openFloor, type Floor } from '../../support/making-factories'
import { factsOf, fontsOf, textOfPages } from '../../support/paper'
import { TWELVE_BENDS } from '../../support/paper-lines'

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const read = (order: Order, by: ApiAgent, query: Record<string, string> = {}) =>
  by.file(orderSheet, { params: { orderId: order.id }, query })

const textOf = async (bytes: Uint8Array) =>
  (await textOfPages(bytes)).map((page) => page.replace(/\s+/g, ' '))

describe('the order sheet', () => {
  it('is a PDF for the crew that ordered and for the shop', async () => {
    const order = await floor.submit([floor.line({ mark: 'N', name: 'North rake' })], {
      poNumber: '1187',
      notes: 'Stack it by the wall.',
      goods: [
        { kind: 'rivets', quantity: 250, unit: 'each', stockId: floor.stockId, note: 'long ones' },
      ],
    })
    const number = orderNumber(order.number)
    for (const agent of [floor.crew.agent, floor.counter]) {
      const { headers, bytes } = await read(order, agent)
      expect(headers.get('content-type')).toBe('application/pdf')
      expect(headers.get('content-disposition')).toBe(`inline; filename="${number}-order.pdf"`)
      const [page = ''] = await textOf(bytes)
      for (const text of [
        number,
        order.company.name,
        order.job.name,
        `Pitch ${order.job.pitchRise}/12`,
        `Ordered by ${order.orderedBy}`,
        'P.O. number 1187',
        'Stack it by the wall.',
        'N North rake',
        '250 pieces · Rivets, Kiln',
        'long ones',
        'Edge metal that must resist wind uplift',
        'page 1 of 1',
      ]) {
        expect(page).toContain(text)
      }
      expect((await fontsOf(bytes)).every(({ embedded }) => embedded)).toBe(true)
    }
  })

  it('is not found by another company', async () => {
    const order = await floor.submit()
    const answer = await floor.otherCrew.agent.get(`/orders/${order.id}/order-sheet.pdf`)
    expect(answer.status).toBe(404)
    expect(answer.headers.get('content-type')).toContain('application/problem+json')
  })

  it('is in the language and the units of who reads it, on the paper asked for', async () => {
    const lead = floor.crew.agent
    const order = await floor.submit([floor.line({ length: 120 })])
    await lead.call(updateSelf, { body: { language: 'es', units: 'mm' } })
    try {
      const { bytes } = await read(order, lead, { paper: 'a4' })
      const [page = ''] = await textOf(bytes)
      expect(page).toContain('Hoja del pedido')
      expect(page).toContain('3048 mm')
      expect(page).toContain('Estado enviado')
      expect(await factsOf(bytes)).toMatchObject({ 'Page size': '595.28 x 841.89 pts (A4)' })
    } finally {
      await lead.call(updateSelf, { body: { language: 'en', units: 'fraction' } })
    }
    const wrong = await lead.get(`/orders/${order.id}/order-sheet.pdf?paper=legal`)
    expect(wrong.problem().errors).toMatchObject([{ path: 'paper' }])
  })

  it('follows the order: released with what was frozen, withdrawn said so', async () => {
    const released = await floor.release(await floor.submit())
    expect((await textOf((await read(released, floor.counter)).bytes))[0]).toContain(
      'State released',
    )
    const open = await floor.submit()
    const { id: orderId, version } = open
    await floor.crew.agent.call(withdrawOrder, {
      params: { orderId },
      body: { version, reason: 'Not needed.' },
    })
    expect((await textOf((await read(open, floor.counter)).bytes))[0]).toContain('State withdrawn')
  })

  it('draws a line of twelve bends and an order of many lines', async () => {
    const marks = Array.from({ length: 12 }, (_, index) => `M${index + 1}`)
    const order = await floor.submit(
      marks.map((mark) => floor.line({ mark, ...(mark === 'M1' && { profile: TWELVE_BENDS }) })),
    )
    const pages = await textOf((await read(order, floor.counter)).bytes)
    expect(pages.length).toBeLessThanOrEqual(8)
    expect(pages.at(-1)).toContain(`page ${pages.length} of ${pages.length}`)
    for (const mark of marks) {
      expect(pages.filter((page) => page.includes(`${mark} Closure`))).toHaveLength(1)
    }
    expect(pages[0]).toContain('2 1/4"')
  })

  it('goes with the mail that the order is in', async () => {
    const order = await floor.submit()
    await floor.api.runJobs()
    const mail = await floor.db(MAILS).where({ order_id: order.id }).first('id')
    const { attachments } = await floor.manager.call(getMail, {
      params: { mailId: mail?.id ?? '' },
    })
    const name = `${orderNumber(order.number)}-order.pdf`
    expect(attachments).toMatchObject([{ name }])
    const params = { mailId: mail?.id ?? '', position: '1' }
    const { bytes } = await floor.manager.file(mailAttachment, { params })
    expect((await textOf(bytes))[0]).toContain('Order sheet')
  })
})
