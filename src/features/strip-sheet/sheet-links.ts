import type { Side } from '#shared/ends/end.schema'
import {
  orderEndTemplates,
  orderStripDxf,
  orderStripSheet,
  orderStripSvg,
  runEndTemplates,
  runStripSheet,
} from '#shared/sheets/sheets.contract'
import { fileHref } from '@/lib/api/file-href'
import type { SheetLinks } from './components/SheetFiles'

const handQuery = (hand: Side | null) => (hand === null ? {} : { hand })

export const orderSheetLinks =
  (orderId: string, lineId: string) =>
  (hand: Side | null): SheetLinks => {
    const options = { params: { orderId, lineId }, query: handQuery(hand) }
    return {
      sheet: fileHref(orderStripSheet, options),
      ends: fileHref(orderEndTemplates, options),
      svg: fileHref(orderStripSvg, options),
      dxf: fileHref(orderStripDxf, options),
    }
  }

export const runSheetLinks =
  (runId: string, lineId: string) =>
  (hand: Side | null): SheetLinks => {
    const options = { params: { runId, lineId }, query: handQuery(hand) }
    return { sheet: fileHref(runStripSheet, options), ends: fileHref(runEndTemplates, options) }
  }
