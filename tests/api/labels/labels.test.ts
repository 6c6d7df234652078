import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { newCode } from '#server/features/pieces/new-code'
import { labelsPdf, listLabelPrints, printLabels } from '#shared/labels/labels.contract'
import type { LabelPaper, LabelPrint, LabelsOf } from '#shared/labels/labels.contract'
import { orderNumber, type Order } from '#shared/orders/order.schema'
import { updateSelf } from '#shared/people/people.contract'
import { pieceSchema } from '#shared/pieces/pieces.contract'
import type { ApiAgent } from '../../support/api-agent'
import {
  at,
  codesOf,
  firstCode,
  openFloor,
  piecesOf,
  type Floor,
} from '../../support/making-factories'
import { codesOnPages, factsOf, fontsOf, textOfPages } from '../../support/paper'

/** Dots per inch of a thermal printer. */
const THERMAL = 203

let floor: Floor
beforeAll(async () => {
  floor = await openFloor()
})
afterAll(() => floor.close())

const print = (of: LabelsOf, paper: LabelPaper = 'roll4x2', by: ApiAgent = floor.counter) =>
  by.call(printLabels, { body: { of, paper } })

const ofOrder = (order: Pick<Order, 'id'>): LabelsOf => ({ kind: 'order', orderId: order.id })

const pdfOf = async ({ id }: Pick<LabelPrint, 'id'>, by: ApiAgent = floor.counter) =>
  (await by.file(labelsPdf, { params: { printId: id } })).bytes

const refusal = async (of: LabelsOf, by: ApiAgent = floor.counter) =>
  (await by.post(printLabels.path, { of })).problem()

const marked = (codes: readonly string[]) => codes.map((code) => `CODE-128:${code}`)

describe('printing labels', () => {
  it('writes down who printed which labels, in the order of lines and numbers', async () => {
    const order = await floor.queue([
      floor.line({ mark: 'A', quantity: 2 }),
      floor.line({ mark: 'B', quantity: 3 }),
    ])
    const made = await print(ofOrder(order), 'letter')
    expect(made).toMatchObject({ paper: 'letter', by: 'Cy Counter', reprinted: [] })
    expect(made.codes).toEqual(codesOf(order))
  })

  it('tells which of the pieces had a label before', async () => {
    const order = await floor.queue()
    const [first = '', ...others] = codesOf(order)
    await print({ kind: 'piece', code: first })
    const again = await print(ofOrder(order))
    expect(again.codes).toEqual([first, ...others])
    expect(again.reprinted).toEqual([first])
    const { items } = await floor.wren.call(listLabelPrints, { params: { code: first } })
    expect(items.map(({ id }) => id)).toHaveLength(2)
    expect(items[0]).toEqual(again)
  })

  it('prints the same labels once, however often the request arrives', async () => {
    const order = await floor.queue()
    const body = { of: ofOrder(order) }
    const options = { idempotencyKey: randomUUID() }
    const first = await floor.counter.post(printLabels.path, body, options)
    const second = await floor.counter.post(printLabels.path, body, options)
    expect(second.body).toEqual(first.body)
    const code = firstCode(order)
    const { items } = await floor.counter.call(listLabelPrints, { params: { code } })
    expect(items).toHaveLength(1)
  })

  it('takes the pieces of a run, and a code however it was typed', async () => {
    const order = await floor.queue([
      floor.line({ mark: 'A', quantity: 2 }),
      floor.line({
        mark: 'B',
        quantity: 1,
        profile: { ...floor.line().profile, legs: [1.5, 3, 1.5] },
      }),
    ])
    const runId = at(await floor.runIds(order), 1)
    const ofRun = await print({ kind: 'run', runId }, 'roll4x2', floor.wren)
    const run = await floor.readRun(runId)
    expect(ofRun.codes).toEqual(run.pieces.map(({ code }) => code))
    const code = firstCode(order)
    const typed = `${code.slice(0, 4).toLowerCase()} ${code.slice(4)}`
    expect((await print({ kind: 'piece', code: typed })).codes).toEqual([code])
  })

  it('leaves out what was scrapped, and labels its remake', async () => {
    const order = await floor.queue()
    const [spoiled = ''] = codesOf(order)
    const answer = await floor.scrap(spoiled)
    const remake = answer.piece.remadeAs ?? ''
    const { codes } = await print(ofOrder(order))
    expect(codes).not.toContain(spoiled)
    expect(codes).toHaveLength(3)
    expect(codes).toContain(remake)
    const problem = await refusal({ kind: 'piece', code: spoiled })
    expect(problem.code).toBe('wrong-state')
    expect(problem.detail).toContain(`Print the label of ${remake}`)
  })

  it('refuses an order that has no pieces yet, and says so', async () => {
    const order = await floor.submit()
    const problem = await refusal(ofOrder(order))
    expect(problem.code).toBe('wrong-state')
    expect(problem.detail).toContain(`${orderNumber(order.number)} has no pieces`)
  })

  it.each([
    ['order', { kind: 'order', orderId: randomUUID() }],
    ['run', { kind: 'run', runId: randomUUID() }],
    ['piece', { kind: 'piece', code: newCode('piece') }],
  ] as const)('finds no %s that is not there', async (what, of) => {
    const problem = await refusal(of)
    expect(problem.code).toBe('not-found')
    expect(problem.detail).toContain(`no such ${what}`)
  })

  it('names the field of a code that cannot be right', async () => {
    const problem = await refusal({ kind: 'piece', code: newCode('bundle') })
    expect(problem.errors).toMatchObject([{ path: 'of.code' }])
  })

  it('is never changed or taken back in the database', async () => {
    await print(ofOrder(await floor.queue()))
    for (const change of [
      `update label_prints set paper = 'a4'`,
      'delete from label_prints',
      'update label_print_pieces set reprinted = true',
      'delete from label_print_pieces',
    ]) {
      await expect(floor.db.raw(change)).rejects.toThrow('is append-only')
    }
  })
})

describe('the labels', () => {
  it('are one to a page of 4 x 2 in. on a roll, and read as their pieces’ codes', async () => {
    const order = await floor.queue([floor.line({ quantity: 12 })])
    const made = await print(ofOrder(order))
    const bytes = await pdfOf(made)
    expect(await factsOf(bytes)).toMatchObject({ Pages: '12', 'Page size': '288 x 144 pts' })
    const read = await codesOnPages(bytes, THERMAL)
    expect(read).toEqual(codesOf(order).map((code) => marked([code])))
  })

  it.each([
    ['letter', '612 x 792 pts (letter)'],
    ['a4', '595.28 x 841.89 pts (A4)'],
  ] as const)('lie ten to a sheet on %s paper', async (paper, size) => {
    const order = await floor.queue([floor.line({ quantity: 13 })])
    const bytes = await pdfOf(await print(ofOrder(order), paper))
    expect(await factsOf(bytes)).toMatchObject({ Pages: '2', 'Page size': size })
    const codes = codesOf(order)
    const read = await codesOnPages(bytes, THERMAL)
    expect(read.map((page) => page.toSorted())).toEqual(
      [codes.slice(0, 10), codes.slice(10)].map((page) => marked(page).toSorted()),
    )
  })

  it('say what the piece is, whose it is and how it is lifted', async () => {
    const order = await floor.release(
      await floor.submit(
        [floor.line({ mark: 'C', name: 'Gable, north rake', quantity: 3, length: 126 })],
        { poNumber: '1187' },
      ),
    )
    const bytes = await pdfOf(await print(ofOrder(order)))
    const pages = await textOfPages(bytes)
    expect(pages).toHaveLength(3)
    const page = pages[1] ?? ''
    const piece = at(piecesOf(order), 1)
    const { stock } = at(order.lines, 0)
    for (const text of [
      'C-2',
      '2 of 3',
      'Gable, north rake',
      `10' 6"`,
      stock.thicknessName,
      stock.colorName,
      orderNumber(order.number),
      'P.O. 1187',
      order.job.name,
      order.company.name,
      piece.code,
      'Two people lift',
    ]) {
      expect(page.replace(/\s+/g, ' ')).toContain(text)
    }
    expect((await fontsOf(bytes)).every(({ embedded }) => embedded)).toBe(true)
    expect(await pdfOf(await print(ofOrder(order)))).not.toHaveLength(0)
  })

  it('ask for no second pair of hands where one person is enough', async () => {
    const order = await floor.queue([floor.line({ length: 60 })])
    const [page = ''] = await textOfPages(await pdfOf(await print(ofOrder(order))))
    expect(page).toContain(`5'`)
    expect(page).not.toContain('people')
  })

  it('show hand and low end of each piece, on the bare side it is stuck on', async () => {
    const square = { kind: 'square' as const, tabs: [] }
    const order = await floor.queue([
      floor.line({
        quantity: 2,
        ends: { left: square, right: square, lowEnd: 'left' },
        hands: { drawn: 'left', left: 1, right: 1 },
      }),
    ])
    const { codes } = await print(ofOrder(order))
    const bytes = await pdfOf(await print({ kind: 'order', orderId: order.id }))
    const pages = (await textOfPages(bytes)).map((page) => page.replace(/\s+/g, ' '))
    const pieces = await Promise.all(codes.map((code) => floor.readPiece(code)))
    expect(pieces.map(({ hand, lowEnd }) => [hand, lowEnd])).toEqual([
      ['left', 'left'],
      ['right', 'right'],
    ])
    // The color is on the left side, so that the label is read from the other side.
    expect(at(order.lines, 0).profile.colorSide).toBe('left')
    expect(pages[0]).toMatch(/\bL\b.*high end low end/)
    expect(pages[1]).toMatch(/\bR\b.*low end high end/)
    expect(pages[0]).toContain('edge A')
  })

  it('are in the language and the units of who prints them', async () => {
    const clerk = await floor.api.signInAs('counter')
    await clerk.call(updateSelf, { body: { language: 'es', units: 'mm' } })
    const order = await floor.queue([floor.line({ length: 120 })])
    const bytes = await pdfOf(await print(ofOrder(order)), clerk)
    const [page = ''] = await textOfPages(bytes)
    expect(page).toContain('1 de 3')
    expect(page).toContain('3048 mm')
    expect(page).toContain('Levantar entre dos')
    expect(await factsOf(bytes)).toMatchObject({ Title: 'Etiquetas de piezas' })
  })

  it('have the same bytes whenever they are opened, and are kept by nobody', async () => {
    const made = await print(ofOrder(await floor.queue()))
    const answer = await floor.counter.file(labelsPdf, { params: { printId: made.id } })
    expect(answer.bytes).toEqual(await pdfOf(made))
    expect(answer.headers.get('content-type')).toBe('application/pdf')
    expect(answer.headers.get('content-disposition')).toBe(
      `inline; filename="labels-${made.id.slice(0, 8)}.pdf"`,
    )
    expect(answer.headers.get('cache-control')).toBe('no-store')
  })

  it('are not printed of pieces that were scrapped since', async () => {
    const order = await floor.queue([floor.line({ quantity: 1 })])
    const made = await print(ofOrder(order))
    await floor.scrap(firstCode(order))
    const answer = await floor.counter.get(`/label-prints/${made.id}/labels.pdf`)
    expect(answer.status).toBe(409)
    expect(answer.problem().code).toBe('wrong-state')
  })

  it('of a print that is not there are not found', async () => {
    const answer = await floor.counter.get(`/label-prints/${randomUUID()}/labels.pdf`)
    expect(answer.problem()).toMatchObject({ code: 'not-found', status: 404 })
  })
})

describe('a piece', () => {
  it('without a label has no prints; an unknown one is not found', async () => {
    const code = firstCode(await floor.queue())
    expect(await floor.wren.call(listLabelPrints, { params: { code } })).toEqual({ items: [] })
    const unknown = await floor.wren.get(`/pieces/${newCode('piece')}/label-prints`)
    expect(unknown.problem().code).toBe('not-found')
  })

  it('is not moved by its label', async () => {
    const order = await floor.queue()
    const before = pieceSchema.parse(await floor.readPiece(firstCode(order)))
    await print(ofOrder(order))
    expect(await floor.readPiece(firstCode(order))).toEqual(before)
  })
})
