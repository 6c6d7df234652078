import type { Clock } from '#server/adapters/clock'
import { companyScope } from '#server/db/company-scope'
import type { Db } from '#server/db/knex'
import { drawEndTemplates } from '#server/features/sheets/end-templates'
import { orderPdf } from '#server/features/sheets/order-sheet/order-pdf'
import { orderSpeech } from '#server/features/sheets/order-sheet/order-speech'
import { findPrintedOrder } from '#server/features/sheets/order-sheet/printed-order.queries'
import { sheetPiece, type SheetLine, type SheetPiece } from '#server/features/sheets/sheet-line'
import type { SheetPaper } from '#server/features/sheets/sheet-pages'
import { findOrderLine, findRunLine } from '#server/features/sheets/sheets.queries'
import { sheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import { drawStripSheet } from '#server/features/sheets/strip-sheet/strip-sheet'
import { stripSvg } from '#server/features/sheets/strip-svg'
import { notFound } from '#server/http/errors'
import type { SignedIn } from '#server/http/signed-in'
import { toDxf } from '#shared/drawing/dxf'
import type { Side } from '#shared/ends/end.schema'
import type { FileAnswer } from '#shared/http/endpoint'
import { orderNumber } from '#shared/orders/order.schema'
import { HAND_LETTERS } from '#shared/pieces/piece-mark'
import type { Paper } from '#shared/sheets/sheets.contract'
import { sheetWords } from '#shared/sheets/words/sheet-words'
import { foldedSection } from '#shared/strip/folded-section'

/** Which line of what is meant. */
export type LineMeant =
  | { readonly orderId: string; readonly lineId: string }
  | { readonly runId: string; readonly lineId: string }

interface Wish {
  readonly hand?: Side | undefined
}

type Printed = Wish & { readonly paper: Paper }

type Draw<W extends Wish> = (meant: LineMeant, wish: W, person: SignedIn) => Promise<FileAnswer>

/** All throw `not-found`; `invalid-input` for a hand that the line has no pieces of. */
export interface SheetsService {
  readonly stripSheet: Draw<Printed>
  readonly endTemplates: Draw<Printed>
  readonly stripSvg: Draw<Wish>
  readonly stripDxf: Draw<Wish>
  /** The whole order, every line drawn. */
  readonly orderSheet: (
    orderId: string,
    wish: { readonly paper: Paper },
    person: SignedIn,
  ) => Promise<FileAnswer>
}

export interface SheetsPorts {
  readonly clock: Clock
  /** IANA name. */
  readonly shopTimeZone: string
}

export const createSheetsService = (db: Db, ports: SheetsPorts): SheetsService => {
  async function pieceOf(meant: LineMeant, { hand }: Wish, person: SignedIn): Promise<SheetPiece> {
    return sheetPiece(await getLine(db, meant, person), hand)
  }

  const paperOf = (paper: Paper, { language }: SignedIn): SheetPaper => {
    const at = ports.clock.now()
    const day = new Intl.DateTimeFormat(language, {
      dateStyle: 'medium',
      timeZone: ports.shopTimeZone,
    }).format(at)
    return { paper, language, at, day }
  }

  const speechOf = ({ language, units }: SignedIn) => sheetSpeech(sheetWords(language), units)

  return {
    stripSheet: async (meant, wish, person) => {
      const piece = await pieceOf(meant, wish, person)
      const bytes = await drawStripSheet(piece, speechOf(person), paperOf(wish.paper, person))
      return { name: fileName(piece, 'strip.pdf'), bytes }
    },

    endTemplates: async (meant, wish, person) => {
      const piece = await pieceOf(meant, wish, person)
      const bytes = await drawEndTemplates(piece, speechOf(person), paperOf(wish.paper, person))
      return { name: fileName(piece, 'ends.pdf'), bytes }
    },

    stripSvg: async (meant, wish, person) => {
      const piece = await pieceOf(meant, wish, person)
      return { name: fileName(piece, 'strip.svg'), bytes: utf8(stripSvg(piece, speechOf(person))) }
    },

    stripDxf: async (meant, wish, person) => {
      const piece = await pieceOf(meant, wish, person)
      const { profile, stock, strip } = piece.line
      const section = foldedSection(profile, stock.sheet)
      const text = toDxf({ layout: piece.layout, strip, section })
      return { name: fileName(piece, 'strip.dxf'), bytes: utf8(text) }
    },

    orderSheet: async (orderId, { paper }, person) => {
      const order = await findPrintedOrder(db, orderId, companyScope(person))
      if (!order) throw notFound('order')
      const speech = orderSpeech(person, ports.shopTimeZone)
      const bytes = await orderPdf(order, speech, paperOf(paper, person))
      return { name: `${orderNumber(order.number)}-order.pdf`, bytes }
    },
  }
}

const utf8 = (text: string): Uint8Array<ArrayBuffer> => new TextEncoder().encode(text)

async function getLine(db: Db, meant: LineMeant, person: SignedIn): Promise<SheetLine> {
  const line =
    'runId' in meant
      ? await findRunLine(db, meant)
      : await findOrderLine(db, meant, companyScope(person))
  if (!line) throw notFound('line')
  return line
}

/** `F-2047-north-rake-L-strip.pdf`: letters, digits, dots and dashes, whatever the mark is. */
function fileName({ line, hand }: SheetPiece, what: string): string {
  const mark = line.mark
    .normalize('NFD')
    .replace(/\p{Mark}+/gu, '')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
  const parts = [orderNumber(line.orderNumber), mark, hand && HAND_LETTERS[hand], what]
  return parts.filter(Boolean).join('-')
}
