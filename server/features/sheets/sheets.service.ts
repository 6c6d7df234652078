import type { Clock } from '#server/adapters/clock'
import { companyScope } from '#server/db/company-scope'
import type { Db } from '#server/db/knex'
import { sheetPiece, type SheetLine, type SheetPiece } from '#server/features/sheets/sheet-line'
import type { SheetPaper } from '#server/features/sheets/sheet-pages'
import { findOrderLine, findRunLine } from '#server/features/sheets/sheets.queries'
import { sheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import { drawStripSheet } from '#server/features/sheets/strip-sheet/strip-sheet'
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

/** All throw `not-found`; `invalid-input` for a hand that the line has no pieces of. */
export interface SheetsService {
  readonly stripSheet: (
    meant: LineMeant,
    wish: Wish & { readonly paper: Paper },
    person: SignedIn,
  ) => Promise<FileAnswer>
  readonly stripDxf: (meant: LineMeant, wish: Wish, person: SignedIn) => Promise<FileAnswer>
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

  return {
    stripSheet: async (meant, wish, person) => {
      const piece = await pieceOf(meant, wish, person)
      const speech = sheetSpeech(sheetWords(person.language), person.units)
      const bytes = await drawStripSheet(piece, speech, paperOf(wish.paper, person))
      return { name: fileName(piece, 'strip', 'pdf'), bytes }
    },

    stripDxf: async (meant, wish, person) => {
      const { line, layout, ...piece } = await pieceOf(meant, wish, person)
      const section = foldedSection(line.profile, line.stock.sheet)
      const text = toDxf({ layout, strip: line.strip, section })
      return { name: fileName({ line, ...piece }, 'strip', 'dxf'), bytes: utf8(text) }
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
function fileName(
  { line, hand }: Pick<SheetPiece, 'line' | 'hand'>,
  what: string,
  ending: string,
): string {
  const mark = line.mark
    .normalize('NFD')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
  const parts = [orderNumber(line.orderNumber), mark, hand && HAND_LETTERS[hand], what]
  return `${parts.filter(Boolean).join('-')}.${ending}`
}
