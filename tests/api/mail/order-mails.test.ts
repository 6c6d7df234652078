import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { MAIL_ATTACHMENTS, MAILS, SLIPS } from '#server/db/tables/mails'
import { createOrderMails } from '#server/features/mail/order-mails'
import { enqueueMail } from '#server/features/mail/mail-ports'
import { newCode } from '#server/features/pieces/new-code'
import { systemClock } from '#server/adapters/clock'
import { askAboutOrder, submitOrder } from '#shared/orders/orders.contract'
import { getMail, listMails, mailAttachment } from '#shared/mail/mail.contract'
import { updateSelf } from '#shared/people/people.contract'
import { resolveCode } from '#shared/pieces/lookup.contract'
import { at, openFloor, type Floor } from '../../support/making-factories'
import { orderInput } from '../../support/shop-factories'

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const mailsAbout = (orderId: string) =>
  floor.db(MAILS).where({ order_id: orderId }).orderBy('number').select('*')

const submit = () =>
  floor.crew.agent.call(submitOrder, {
    body: { ...orderInput([floor.line()]), jobId: floor.crew.jobId },
  })

describe('who ordered gets a mail', () => {
  it('when the order is in, with the drawings as PDF', async () => {
    const order = await submit()
    await floor.api.runJobs()
    const [mail] = await mailsAbout(order.id)
    expect(mail).toMatchObject({
      template: 'orderReceived',
      to_address: floor.crew.lead.email,
      state: 'sent',
      attempts: 1,
    })
    const shown = await floor.manager.call(getMail, { params: { mailId: mail?.id ?? '' } })
    expect(shown.attachments).toHaveLength(1)
    const file = await floor.manager.file(mailAttachment, {
      params: { mailId: shown.id, position: '1' },
    })
    expect(Buffer.from(file.bytes).subarray(0, 5).toString()).toBe('%PDF-')
  })

  it('when the shop asks, in the language that they read', async () => {
    await floor.crew.agent.call(updateSelf, { body: { language: 'es' } })
    const order = await submit()
    await floor.counter.call(askAboutOrder, {
      params: { orderId: order.id },
      body: { version: order.version, text: 'Which <side> is up?' },
    })
    const mail = at(await mailsAbout(order.id), 1)
    expect(mail).toMatchObject({ template: 'question', language: 'es' })
    expect(mail.subject).toContain('Pregunta sobre el pedido')
    expect(mail.text).toContain('> Which <side> is up?')
    expect(mail.html).toContain('Which &lt;side&gt; is up?')
    await floor.crew.agent.call(updateSelf, { body: { language: 'en' } })
  })

  it('when it is released, and once all of it lies in bundles, with the slip', async () => {
    const order = await floor.release(await submit())
    const codes = await floor.bendAll(order)
    const [first, ...rest] = codes
    await floor.bundle(order, [first ?? ''])
    expect((await mailsAbout(order.id)).map(({ template }) => template)).toEqual([
      'orderReceived',
      'released',
    ])
    const bundle = await floor.bundle(order, rest)
    await floor.api.runJobs()
    const ready = at(await mailsAbout(order.id), 2)
    const slip = await floor.db(SLIPS).where({ order_id: order.id }).first('code')
    expect(ready).toMatchObject({ template: 'ready', state: 'sent' })
    for (const word of [slip?.code ?? '?', bundle.code, bundle.rackPlace]) {
      expect(ready.text).toContain(word)
    }
    expect(await floor.counter.call(resolveCode, { params: { code: slip?.code ?? '' } })).toEqual({
      kind: 'slip',
      code: slip?.code,
      orderId: order.id,
    })
    const shown = await floor.manager.call(getMail, { params: { mailId: ready.id } })
    expect(shown.html).toContain('src="data:image/png;base64,')
    expect(shown.attachments).toEqual([])
  })

  it('and none when the change is rolled back', async () => {
    const order = await submit()
    const before = (await mailsAbout(order.id)).length
    const change = floor.db.transaction(async (trx) => {
      const ports = { clock: systemClock, publicUrl: 'http://x', enqueue: enqueueMail }
      await createOrderMails(trx, { ...ports, drawCode: newCode }).released(order.id)
      throw new Error('It was not to be.')
    })
    await expect(change).rejects.toThrow('It was not to be.')
    expect(await mailsAbout(order.id)).toHaveLength(before)
    await floor.api.runJobs()
    const { items } = await floor.manager.call(listMails, { query: { state: 'queued' } })
    expect(items).toEqual([])
  })

  it('is sent once, however often its job runs', async () => {
    const order = await submit()
    const mail = at(await mailsAbout(order.id), 0)
    await floor.api.runJobs()
    await enqueueMail(floor.db, mail.id)
    await floor.api.runJobs()
    expect(at(await mailsAbout(order.id), 0)).toMatchObject({ state: 'sent', attempts: 1 })
    const files = await floor.db(MAIL_ATTACHMENTS).where({ mail_id: mail.id }).select('position')
    expect(files).toHaveLength(1)
  })
})
