import { expect, it } from 'vitest'
import { getOrder } from '#shared/orders/orders.contract'
import { labelsPdf } from '#shared/labels/labels.contract'
import { orderStripSheet, orderStripSvg } from '#shared/sheets/sheets.contract'
import { fileHref } from '@/lib/api/file-href'

const orderId = '5b0c7f0e-8f3a-4f0e-9d55-0a7f6f3a9b10'
const lineId = '7c1f9a52-0b6d-4f7e-8f9e-1a2b3c4d5e6f'

it('leads to the file below /api, with what is asked of it', () => {
  expect(fileHref(labelsPdf, { params: { printId: orderId } })).toBe(
    `/api/label-prints/${orderId}/labels.pdf`,
  )
  expect(fileHref(orderStripSheet, { params: { orderId, lineId }, query: { hand: 'right' } })).toBe(
    `/api/orders/${orderId}/lines/${lineId}/strip-sheet.pdf?hand=right`,
  )
})

it('leaves out what is not asked', () => {
  expect(fileHref(orderStripSvg, { params: { orderId, lineId }, query: { hand: undefined } })).toBe(
    `/api/orders/${orderId}/lines/${lineId}/strip.svg`,
  )
})

it('takes no endpoint that answers with JSON, and no file without its parameters', () => {
  // @ts-expect-error -- an order is no file
  expect(fileHref(getOrder, { params: { orderId } })).toBe(`/api/orders/${orderId}`)
  // @ts-expect-error -- which print?
  expect(() => fileHref(labelsPdf, {})).toThrow('printId')
})
