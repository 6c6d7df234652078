import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { STOCKS } from '#server/db/tables/stocks'
import type { PieceEnds } from '#shared/ends/end.schema'
import type { Endpoint } from '#shared/http/endpoint'
import { orderNumber, type Order } from '#shared/orders/order.schema'
import { updateSelf } from '#shared/people/people.contract'
import {
  orderEndTemplates,
  orderStripDxf,
  orderStripSheet,
  orderStripSvg,
  runEndTemplates,
  runStripSheet,
} from '#shared/sheets/sheets.contract'
import type { ApiAgent } from '../../support/api-agent'
import { at, openFloor, type Floor } from '../../support/making-factories'
import { factsOf, fontsOf, textOfPages } from '../../support/paper'
import { zProfile } from '../../support/shop-factories'

const ENDS: PieceEnds = {
  left: { kind: 'miter', plane: { plumb: 26.565 }, lay: 0, legs: [], tabs: [] },
  right: { kind: 'lap', side: 'under', length: 4, tabs: [] },
  lowEnd: 'right',
}
const HANDS = { drawn: 'left', left: 2, right: 1 } as const

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const pair = (given: Parameters<Floor['line']>[0] = {}) =>
  floor.line({ mark: 'N. rake', name: 'North rake', ends: ENDS, hands: HANDS, ...given })

const paramsOf = (order: Order) => ({ orderId: order.id, lineId: at(order.lines, 0).id })

const read = async (
  endpoint: Endpoint,
  order: Order,
  query: Record<string, string> = {},
  by: ApiAgent = floor.counter,
) => by.file(endpoint, { params: paramsOf(order), query })

const textOf = async ({ bytes }: { bytes: Uint8Array }) =>
  (await textOfPages(bytes)).map((page) => page.replace(/\s+/g, ' '))

describe('the strip sheet of an order line', () => {
  it('is a PDF for the crew that ordered it and for the shop', async () => {
    const order = await floor.submit([pair()], { poNumber: '1187' })
    for (const agent of [floor.crew.agent, floor.counter]) {
      const file = await read(orderStripSheet, order, {}, agent)
      expect(file.headers.get('content-type')).toBe('application/pdf')
      expect(file.headers.get('content-disposition')).toBe(
        `inline; filename="${orderNumber(order.number)}-N-rake-L-strip.pdf"`,
      )
      const [first = '', second = ''] = await textOf(file)
      for (const text of [
        'North rake',
        orderNumber(order.number),
        'P.O. 1187',
        order.job.name,
        order.company.name,
        'left hand',
      ]) {
        expect(first).toContain(text)
      }
      expect(second).toMatch(/Left end HIGH END Mitered/)
      expect(second).toMatch(/Right end LOW END Lap that slips under/)
      expect((await fontsOf(file.bytes)).every(({ embedded }) => embedded)).toBe(true)
    }
  })

  it('is of the hand asked for, on the paper asked for', async () => {
    const order = await floor.submit([pair()])
    const file = await read(orderStripSheet, order, { hand: 'right', paper: 'a4' })
    const [first = '', second = ''] = await textOf(file)
    expect(first).toContain('right hand')
    expect(second).toMatch(/Right end HIGH END Mitered/)
    expect(await factsOf(file.bytes)).toMatchObject({ 'Page size': '595.28 x 841.89 pts (A4)' })
  })

  it('names the field where a hand is asked of a line that has none', async () => {
    const order = await floor.submit()
    const { orderId, lineId } = paramsOf(order)
    const path = `/orders/${orderId}/lines/${lineId}/strip-sheet.pdf`
    const answer = await floor.counter.get(`${path}?hand=left`)
    expect(answer.status).toBe(400)
    expect(answer.problem().errors).toMatchObject([{ path: 'hand' }])
    const wrong = await floor.counter.get(`${path}?paper=legal`)
    expect(wrong.problem().errors).toMatchObject([{ path: 'paper' }])
  })

  it('follows the stock until the release, and is frozen afterwards', async () => {
    const order = await floor.submit([floor.line()])
    const [before = ''] = await textOf(await read(orderStripSheet, order))
    expect(before).toContain('Brake not released yet')
    const released = await floor.release(order)
    const [frozen = ''] = await textOf(await read(orderStripSheet, released))
    expect(frozen).toContain(`Brake ${at(released.lines, 0).bendsOn[0] ?? ''}`)
    const { color_name: name } = await floor
      .db(STOCKS)
      .where({ id: floor.stockId })
      .first('color_name')
      .then((row) => row ?? { color_name: '' })
    const open = await floor.submit([floor.line()])
    try {
      await floor.db(STOCKS).where({ id: floor.stockId }).update({ color_name: 'New name' })
      expect((await textOf(await read(orderStripSheet, released)))[0]).toContain(name)
      expect((await textOf(await read(orderStripSheet, open)))[0]).toContain('New name')
    } finally {
      await floor.db(STOCKS).where({ id: floor.stockId }).update({ color_name: name })
    }
  })

  it('is in the language and the units of who prints it', async () => {
    const lead = floor.crew.agent
    await lead.call(updateSelf, { body: { language: 'es', units: 'mm' } })
    try {
      const order = await floor.submit([pair({ length: 120 })])
      const file = await read(orderStripSheet, order, {}, lead)
      const [first = ''] = await textOf(file)
      expect(first).toContain('Hoja de la tira')
      expect(first).toContain('3048 mm')
      expect((await factsOf(file.bytes)).Title).toMatch(/^Hoja de la tira F-/)
    } finally {
      await lead.call(updateSelf, { body: { language: 'en', units: 'fraction' } })
    }
  })

  it('is not found by a line of another order, nor by an unknown one', async () => {
    const order = await floor.submit()
    const other = await floor.submit()
    for (const lineId of [at(other.lines, 0).id, randomUUID()]) {
      const answer = await floor.counter.get(`/orders/${order.id}/lines/${lineId}/strip-sheet.pdf`)
      expect(answer.status).toBe(404)
      expect(answer.headers.get('content-type')).toContain('application/problem+json')
    }
  })
})

describe('the ends at full size', () => {
  it('are a PDF with the check lines', async () => {
    const order = await floor.submit([pair()])
    const file = await read(orderEndTemplates, order)
    expect(file.headers.get('content-disposition')).toContain('N-rake-L-ends.pdf')
    const pages = await textOf(file)
    for (const page of pages) expect(page).toContain('Measure this line: it must be 6 in. long.')
  })
})

describe('the drawings of a line', () => {
  it('are an SVG with every dimension', async () => {
    const order = await floor.submit([pair()])
    const file = await read(orderStripSvg, order)
    expect(file.headers.get('content-type')).toBe('image/svg+xml')
    const svg = new TextDecoder().decode(file.bytes)
    expect(svg).toMatch(/^<svg xmlns="http:\/\/www\.w3\.org\/2000\/svg"/)
    expect(svg).toContain('<title>N. rake North rake, F-')
    expect(svg).toContain('1 1/4&quot;')
    expect(svg).not.toMatch(/<script|href=/)
  })

  it('keep what a person typed out of the markup', async () => {
    const name = '<script>alert(1)</script>'
    const order = await floor.submit([pair({ name })])
    const svg = new TextDecoder().decode((await read(orderStripSvg, order)).bytes)
    expect(svg).not.toContain('<script')
    expect(svg).toContain('&lt;script&gt;')
  })

  it('are a DXF at full size in inches', async () => {
    const order = await floor.submit([pair({ length: 120 })])
    const file = await read(orderStripDxf, order)
    expect(file.headers.get('content-type')).toBe('image/vnd.dxf')
    expect(file.headers.get('content-disposition')).toContain('N-rake-L-strip.dxf')
    const lines = new TextDecoder().decode(file.bytes).split('\n')
    expect(lines).toContain('OUTLINE')
    expect(lines.slice(-3)).toEqual(['  0', 'EOF', ''])
    // The blank's right end.
    expect(lines).toContain('120')
  })
})

describe('the sheets of a run', () => {
  it('are those of its lines, for who bends them', async () => {
    const order = await floor.queue([
      pair(),
      floor.line({ mark: 'B', profile: zProfile([1.5, 3, 1.5]) }),
    ])
    const [runId = '', otherRunId = ''] = await floor.runIds(order)
    const lineId = at(order.lines, 0).id
    const sheet = await floor.wren.file(runStripSheet, { params: { runId, lineId } })
    expect((await textOf(sheet))[0]).toContain('North rake')
    const ends = await floor.wren.file(runEndTemplates, { params: { runId, lineId } })
    expect((await textOf(ends))[0]).toContain('Ends at full size')
    const elsewhere = await floor.wren.get(`/runs/${otherRunId}/lines/${lineId}/strip-sheet.pdf`)
    expect(elsewhere.status).toBe(404)
  })
})
