import { z } from 'zod'
import { readRows } from '#server/db/read-rows'
import type { OrderPdf } from '#server/features/mail/draw-order'
import { createSheetsService, type SheetsPorts } from '#server/features/sheets/sheets.service'
import { handsSchema } from '#shared/ends/end.schema'
import type { FileAnswer } from '#shared/http/endpoint'

const lineSchema = z.object({ id: z.uuid(), hands: handsSchema.nullable() })

/** The strip sheet of each line, and of each hand where a line has two. */
export const createStripSheetsOfOrder =
  (ports: SheetsPorts): OrderPdf =>
  async (db, orderId, reader) => {
    const sheets = createSheetsService(db, ports)
    const lines = await readRows(
      db,
      lineSchema,
      'select id, hands from order_lines where order_id = :orderId order by position',
      { orderId },
    )
    const files: FileAnswer[] = []
    for (const { id: lineId, hands } of lines) {
      const sides = (['left', 'right'] as const).filter((side) => hands !== null && hands[side] > 0)
      for (const hand of sides.length === 0 ? [undefined] : sides) {
        files.push(await sheets.stripSheet({ orderId, lineId }, { hand, paper: 'letter' }, reader))
      }
    }
    return files
  }
