import type { Db } from '#server/db/knex'
import { lineStrip } from '#server/features/orders/line-strip'
import { createOrdersQueries, type StoredLine } from '#server/features/orders/orders.queries'
import { createPricesQueries } from '#server/features/prices/prices.queries'
import type { PrintedLine, PrintedOrder } from '#server/features/sheets/order-sheet/printed-order'
import { createStocksQueries } from '#server/features/stocks/stocks.queries'
import { quoteLine } from '#shared/pricing/line-quote'
import type { PriceBook } from '#shared/pricing/price-book.schema'
import { sumPrices } from '#shared/pricing/price-line'
import type { Stock } from '#shared/stock/stock.schema'

/**
 * An order as its sheet shows it: frozen values once it is released, those of now before. Which
 * brakes bend it is not printed, so nothing is planned. `scope` limits to one company.
 */
export async function findPrintedOrder(
  db: Db,
  orderId: string,
  scope: string | null,
): Promise<PrintedOrder | undefined> {
  const orders = createOrdersQueries(db)
  const order = await orders.findOrder(orderId, scope)
  if (!order) return undefined
  const stored = await orders.listLines(orderId)
  const open = stored.filter(({ frozen }) => frozen === null)
  const stocks = await createStocksQueries(db).mapStocks([
    ...open.map(({ stockId }) => stockId),
    ...order.goods.flatMap(({ stockId }) => stockId ?? []),
  ])
  const book = open.length > 0 ? await createPricesQueries(db).findBook() : null
  const lines = stored.map((line) => toPrinted(line, stocks, book))
  return {
    ...order,
    lines,
    priceCents: sumPrices(lines.map(({ price }) => price)),
    goods: order.goods.map(({ stockId, ...good }) => ({
      ...good,
      colorName: (stockId === null ? undefined : stocks.get(stockId)?.colorName) ?? null,
    })),
  }
}

function toPrinted(
  { frozen, ...line }: StoredLine,
  stocks: ReadonlyMap<string, Stock>,
  book: PriceBook | null,
): PrintedLine {
  if (frozen) {
    const { stock, strip, pieceWeight, price } = frozen
    return { ...line, stock, strip, pieceWeight, price }
  }
  const stock = stocks.get(line.stockId)
  if (!stock) throw new Error(`Stock ${line.stockId} of an order line is not there.`)
  const { price } = quoteLine(line, book)
  return { ...line, stock, ...lineStrip(line, stock.sheet), price }
}
