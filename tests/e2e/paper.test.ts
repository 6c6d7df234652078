import { expect, inject, it } from 'vitest'
import { DEMO_ACCOUNTS } from '#seeds/demo'
import { labelsPdf, printLabels } from '#shared/labels/labels.contract'
import { getOrder, listOrders } from '#shared/orders/orders.contract'
import { orderStripSheet } from '#shared/sheets/sheets.contract'
import { ApiAgent } from '../support/api-agent'
import { at, codesOf } from '../support/making-factories'
import { codesOnPages, fontsOf } from '../support/paper'

const FACES = [
  'AtkinsonHyperlegibleNext-Bold',
  'AtkinsonHyperlegibleNext-Regular',
  'JetBrainsMono-Bold',
  'JetBrainsMono-Regular',
]

const embeddedFaces = async (bytes: Uint8Array) =>
  (await fontsOf(bytes))
    .filter(({ embedded }) => embedded)
    .map(({ name }) => name)
    .sort()

it('prints labels and strip sheets with the product’s fonts from the built server', async () => {
  const clerk = new ApiAgent(inject('productUrl'))
  const account = DEMO_ACCOUNTS.find(({ role }) => role === 'counter')
  if (!account) throw new Error('The demo shop has no counter.')
  await clerk.signIn(account.email, account.password)
  const { items } = await clerk.call(listOrders, { query: { states: 'released' } })
  const orderId = at(items, 0).id
  const order = await clerk.call(getOrder, { params: { orderId } })

  const print = await clerk.call(printLabels, { body: { of: { kind: 'order', orderId } } })
  const labels = await clerk.file(labelsPdf, { params: { printId: print.id } })
  expect(await codesOnPages(labels.bytes, 203)).toEqual(
    codesOf(order).map((code) => [`CODE-128:${code}`]),
  )
  expect(await embeddedFaces(labels.bytes)).toEqual(FACES)

  const params = { orderId, lineId: at(order.lines, 0).id }
  const sheet = await clerk.file(orderStripSheet, { params })
  expect(await embeddedFaces(sheet.bytes)).toEqual(FACES)
})
