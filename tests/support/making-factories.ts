import { RUNS } from '#server/db/tables/runs'
import { createBundle, type Bundle } from '#shared/bundles/bundles.contract'
import { handOff, type HandOffSheet } from '#shared/hand-off/hand-off.contract'
import type { Order, OrderLineInput, PieceSummary } from '#shared/orders/order.schema'
import { pieceStateSchema } from '#shared/pieces/piece-state'
import {
  bendPiece,
  getPiece,
  pieceConflictSchema,
  scrapPiece,
  undoMoves,
  type Moved,
  type Piece,
} from '#shared/pieces/pieces.contract'
import { bendCount, claimRun, getRun, type Run } from '#shared/runs/runs.contract'
import type { ApiAgent, ApiAnswer } from './api-agent'
import { openShop, type Crew } from './shop-scene'

/** A shop with two benders and a manager, and verbs for what they do. */
export async function openFloor() {
  const shop = await openShop()
  const { api } = shop
  const wrenPerson = await api.make.person('bender', { name: 'Wren Bender' })
  const wren = await api.signInAs(wrenPerson)
  const oak = await api.signInAs(await api.make.person('bender', { name: 'Oak Bender' }))
  const manager = await api.signInAs(await api.make.person('manager', { name: 'Mo Manager' }))

  /** A released order, by default one line of three pieces. */
  const queue = async (lines?: OrderLineInput[], by?: Crew): Promise<Order> =>
    shop.release(await shop.submit(lines, {}, by))

  const bend = (code: string, by: ApiAgent = wren): Promise<Moved> =>
    by.call(bendPiece, { params: { code }, body: {} })

  const bendAll = async (order: Order): Promise<string[]> => {
    const codes = codesOf(order)
    for (const code of codes) await bend(code)
    return codes
  }

  const bundle = (order: Pick<Order, 'id'>, pieceCodes: string[], rackPlace = 'R1') =>
    wren.call(createBundle, { body: { orderId: order.id, pieceCodes, rackPlace } })

  return {
    ...shop,
    wrenPerson,
    wren,
    oak,
    manager,
    queue,
    bend,
    bendAll,
    bundle,
    /** A released order whose pieces are all bent and lie in one bundle. */
    bundled: async (lines?: OrderLineInput[]): Promise<{ order: Order; bundle: Bundle }> => {
      const order = await queue(lines)
      return { order, bundle: await bundle(order, await bendAll(order)) }
    },
    handOver: (order: Pick<Order, 'id'>, bundleCodes: string[]): Promise<HandOffSheet> =>
      shop.counter.call(handOff, {
        params: { orderId: order.id },
        body: { bundleCodes, receivedBy: 'Ada Ridge', signature: SIGNATURE },
      }),
    scrap: (code: string, reason = 'Kick bent to the wrong side.') =>
      wren.call(scrapPiece, { params: { code }, body: { reason } }),
    undo: (eventIds: number[], by: ApiAgent = wren, reason = 'Scanned by mistake.') =>
      by.post(undoMoves.path, { eventIds, reason }),
    claim: (runId: string, by: ApiAgent = wren): Promise<Run> =>
      by.call(claimRun, { params: { runId }, body: {} }),
    bendNext: (runId: string, count: number, by: ApiAgent = wren) =>
      by.call(bendCount, { params: { runId }, body: { count } }),
    readPiece: (code: string): Promise<Piece> => wren.call(getPiece, { params: { code } }),
    readRun: (runId: string): Promise<Run> => wren.call(getRun, { params: { runId } }),
    /** Ids of the order's runs by number. */
    runIds: async (order: Pick<Order, 'id'>): Promise<string[]> => {
      const runs = await shop.db(RUNS).where({ order_id: order.id }).orderBy('number').select('id')
      return runs.map((run) => run.id)
    },
    /** Where every piece of the order is, by the database itself. */
    statesOf: async (order: Pick<Order, 'id'>): Promise<string[]> => {
      const rows = await shop.db('pieces').where({ order_id: order.id }).orderBy('code')
      return rows.map((row) => pieceStateSchema.parse(row.state)).sort()
    },
    countEvents: async (code: string): Promise<number> =>
      (await wren.call(getPiece, { params: { code } })).events.length,
  }
}

export type Floor = Awaited<ReturnType<typeof openFloor>>

export const SIGNATURE: [number, number][][] = [
  [
    [100, 200],
    [180.5, 120],
  ],
]

export const piecesOf = (order: Pick<Order, 'lines'>): PieceSummary[] =>
  order.lines.flatMap((line) => line.pieces)

/** In the order of the lines and of their numbers. */
export const codesOf = (order: Pick<Order, 'lines'>): string[] =>
  piecesOf(order).map((piece) => piece.code)

export const firstCode = (order: Pick<Order, 'lines'>): string => at(codesOf(order), 0)

export function at<Item>(list: readonly Item[], index: number): Item {
  const item = list[index]
  if (item === undefined) throw new Error(`There is nothing at ${index}.`)
  return item
}

/** What a `wrong-state` answer shows of the piece it is about. */
export const conflictOf = (answer: ApiAnswer) => pieceConflictSchema.parse(answer.problem().current)
