import type { OrderPdf } from '#server/features/mail/draw-order'
import { createSheetsService, type SheetsPorts } from '#server/features/sheets/sheets.service'

/** The order sheet, every line of the order drawn. */
export const createOrderSheetForMail =
  (ports: SheetsPorts): OrderPdf =>
  async (db, orderId, reader) => [
    await createSheetsService(db, ports).orderSheet(orderId, { paper: 'letter' }, reader),
  ]
