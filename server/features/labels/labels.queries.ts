import { z } from 'zod'
import type { Db } from '#server/db/knex'
import { findRow, readRows } from '#server/db/read-rows'
import { PIECES } from '#server/db/tables/pieces'
import type { LabelFacts } from '#server/features/labels/label-content'
import { lineLaySchema, pieceLay } from '#server/features/pieces/piece-lay'
import { frozenStockSchema } from '#server/features/stocks/frozen-stock'
import { labelPaperSchema, type LabelPrint } from '#shared/labels/labels.contract'
import { PIECE_STATES, pieceStateSchema, type PieceState } from '#shared/pieces/piece-state'
import { profileSchema } from '#shared/profile/profile.schema'

/** Pieces that came to their end are not there to be labelled. */
export const isLabelled = (state: PieceState): boolean =>
  state !== 'scrapped' && state !== 'withdrawn'

const LABELLED = PIECE_STATES.filter(isLabelled)

/** One of the three, and nothing else. */
export type PiecesOf =
  { readonly code: string } | { readonly run_id: string } | { readonly order_id: string }

const toPrintSchema = z.object({
  id: z.uuid(),
  code: z.string(),
  printed: z.boolean(),
})
export type PieceToPrint = z.infer<typeof toPrintSchema>

/**
 * The pieces that get a label, locked, in the order of their lines and numbers, each with whether it
 * had one before. Locking comes first, in the order of their ids as everywhere.
 */
export async function findLockedPieces(db: Db, of: PiecesOf): Promise<PieceToPrint[]> {
  const locked = await db(PIECES)
    .where(of)
    .whereIn('state', LABELLED)
    .orderBy('id')
    .forNoKeyUpdate()
    .select('id')
  return readRows(
    db,
    toPrintSchema,
    `select p.id, p.code,
       exists (select 1 from label_print_pieces where piece_id = p.id) as printed
     from pieces p join order_lines l on l.id = p.line_id
     where p.id = any(:ids)
     order by l.position, p.sequence`,
    { ids: locked.map((piece) => piece.id) },
  )
}

const pieceStandSchema = z.object({ state: pieceStateSchema, remadeAs: z.string().nullable() })

/** How a piece stands, and the piece that replaces it. */
export const findPieceStand = (db: Db, code: string) =>
  findRow(
    db,
    pieceStandSchema,
    `select p.state, remake.code as "remadeAs"
     from pieces p left join pieces remake on remake.remake_of = p.id
     where p.code = :code`,
    { code },
  )

/** The number that people call an order or a run by. */
export async function findNumber(
  db: Db,
  table: 'orders' | 'runs',
  id: string,
): Promise<number | undefined> {
  const row = await db(table).where({ id }).first('number')
  return row?.number
}

/** The contract's print, with its two lists still apart as rows of the database. */
const printRowSchema = z.object({
  id: z.uuid(),
  paper: labelPaperSchema,
  codes: z.array(z.string()),
  reprinted: z.array(z.string()),
  by: z.string(),
  at: z.date(),
})

const PRINTS = `
  select l.id, l.paper, person.name as by, l.at, listed.codes, listed.reprinted
  from label_prints l
  join people person on person.id = l.person_id
  cross join lateral (
    select array_agg(p.code order by x.position) as codes,
      coalesce(array_agg(p.code order by x.position) filter (where x.reprinted), '{}') as reprinted
    from label_print_pieces x join pieces p on p.id = x.piece_id where x.print_id = l.id
  ) listed`

const toPrint = ({ at, ...print }: z.infer<typeof printRowSchema>): LabelPrint => ({
  ...print,
  at: at.toISOString(),
})

export async function findPrint(db: Db, id: string): Promise<LabelPrint | undefined> {
  const row = await findRow(db, printRowSchema, `${PRINTS} where l.id = :id`, { id })
  return row && toPrint(row)
}

/** Prints with a label of this piece, newest first. */
export async function listPrints(db: Db, code: string): Promise<LabelPrint[]> {
  const rows = await readRows(
    db,
    printRowSchema,
    `${PRINTS}
     where l.id in (
       select x.print_id from label_print_pieces x join pieces p on p.id = x.piece_id
       where p.code = :code)
     order by l.at desc, l.id`,
    { code },
  )
  return rows.map(toPrint)
}

const factsRowSchema = lineLaySchema.extend({
  lineId: z.uuid(),
  code: z.string(),
  state: pieceStateSchema,
  mark: z.string(),
  sequence: z.int(),
  quantity: z.int(),
  name: z.string(),
  profile: profileSchema,
  stock: frozenStockSchema,
  length: z.number(),
  weight: z.number(),
  orderNumber: z.int(),
  poNumber: z.string(),
  company: z.string(),
  job: z.string(),
})

export interface LineFacts {
  readonly lineId: string
  readonly state: PieceState
  readonly facts: LabelFacts
}

/** What the labels of a print say, in its order, by what was frozen at the release. */
export async function readLabelFacts(db: Db, printId: string): Promise<LineFacts[]> {
  const rows = await readRows(
    db,
    factsRowSchema,
    `select l.id as "lineId", p.code, p.state, l.mark, p.sequence, l.quantity, l.name, l.profile,
       l.frozen -> 'stock' as stock, l.length, l.ends, l.hands,
       cast(l.frozen ->> 'pieceWeight' as double precision) as weight,
       o.number as "orderNumber", o.po_number as "poNumber", c.name as company, j.name as job
     from label_print_pieces x
     join pieces p on p.id = x.piece_id
     join order_lines l on l.id = p.line_id
     join orders o on o.id = p.order_id
     join companies c on c.id = o.company_id
     join jobs j on j.id = o.job_id
     where x.print_id = :printId
     order by x.position`,
    { printId },
  )
  return rows.map(({ lineId, state, ends, hands, ...written }) => ({
    lineId,
    state,
    facts: { ...written, ...pieceLay({ ends, hands }, written.sequence) },
  }))
}
