import type { BrakesQueries } from '#server/features/brakes/brakes.queries'
import { lineStrip } from '#server/features/orders/line-strip'
import { planLine } from '#server/features/orders/plan-line'
import type { OrderPiecesQueries } from '#server/features/orders/order-pieces.queries'
import type { OrdersQueries, StoredLine } from '#server/features/orders/orders.queries'
import type { PricesQueries } from '#server/features/prices/prices.queries'
import type { StocksQueries } from '#server/features/stocks/stocks.queries'
import type { PlannedBrake, Planner } from '#server/planning/planner'
import type { Order, OrderLine } from '#shared/orders/order.schema'
import { keptQuote, quoteLine } from '#shared/pricing/line-quote'
import type { PriceBook } from '#shared/pricing/price-book.schema'
import { sumPrices } from '#shared/pricing/price-line'
import type { Stock } from '#shared/stock/stock.schema'

export interface OrderReaderDeps {
  readonly queries: OrdersQueries
  readonly pieces: OrderPiecesQueries
  readonly stocks: StocksQueries
  readonly brakes: BrakesQueries
  readonly prices: PricesQueries
  readonly planner: Planner
}

type MadeOf = Pick<
  OrderLine,
  'stock' | 'strip' | 'pieceWeight' | 'price' | 'noPrice' | 'bendsOn' | 'override'
>

/** What an open line is held against: all as it is now. */
interface ShopNow {
  readonly stocks: ReadonlyMap<string, Stock>
  readonly brakes: readonly PlannedBrake[]
  readonly book: PriceBook | null
}

/** Reads an order as its page shows it: frozen values once it is released, the kernel's before. */
export const createOrderReader = (deps: OrderReaderDeps) => {
  const { queries, pieces, stocks, brakes, prices, planner } = deps

  /**
   * What holds before release: stock, brakes and prices as they are now. Which brake it will be is not known
   * yet, so the strip is that of the stock's own K; the plans are each brake's.
   */
  async function computeLine(
    line: StoredLine,
    now: ShopNow,
    signal: AbortSignal | undefined,
  ): Promise<MadeOf> {
    const stock = getStock(now.stocks, line.stockId)
    const plans = await planLine({ line, stock, brakes: now.brakes, planner, signal })
    const feasible = plans.filter(({ plan }) => plan.feasible)
    return {
      stock,
      ...lineStrip(line, stock.sheet),
      ...quoteLine(line, now.book),
      bendsOn: feasible.map(({ brakeName }) => brakeName),
      override: null,
    }
  }

  async function readLines(orderId: string, signal: AbortSignal | undefined): Promise<OrderLine[]> {
    const lines = await queries.listLines(orderId)
    const piecesByLine = await pieces.mapPieces(orderId)
    const open = lines.filter(({ frozen }) => frozen === null)
    const now: ShopNow = {
      stocks: await stocks.mapStocks(open.map(({ stockId }) => stockId)),
      brakes: open.length > 0 ? await brakes.listBrakes() : [],
      book: open.length > 0 ? await prices.findBook() : null,
    }
    const answers: OrderLine[] = []
    for (const line of lines) {
      const { frozen, stockId: _, ...written } = line
      const madeOf = frozen
        ? {
            stock: frozen.stock,
            strip: frozen.strip,
            pieceWeight: frozen.pieceWeight,
            ...keptQuote(frozen),
            bendsOn: [frozen.brakeName],
            override: frozen.override,
          }
        : await computeLine(line, now, signal)
      answers.push({ ...written, ...madeOf, pieces: piecesByLine.get(line.id) ?? [] })
    }
    return answers
  }

  return {
    /**
     * The version is read before the lines, so that a change in between is met as a conflict later
     * and never saved over. `signal` ends the planning of lines that are not released.
     */
    async findOrder(
      id: string,
      scope: string | null,
      signal?: AbortSignal,
    ): Promise<Order | undefined> {
      const order = await queries.findOrder(id, scope)
      if (!order) return undefined
      const lines = await readLines(id, signal)
      return {
        ...order,
        lines,
        priceCents: sumPrices(lines.map(({ price }) => price)),
        events: await queries.listEvents(id),
      }
    },
  }
}

function getStock(stockById: ReadonlyMap<string, Stock>, id: string): Stock {
  const stock = stockById.get(id)
  if (!stock) throw new Error(`Stock ${id} of an order line is not there.`)
  return stock
}

export type OrderReader = ReturnType<typeof createOrderReader>
