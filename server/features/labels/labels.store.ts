import type { Db } from '#server/db/knex'
import { LABEL_PRINT_PIECES, LABEL_PRINTS } from '#server/db/tables/label-prints'
import type { PieceToPrint } from '#server/features/labels/labels.queries'
import type { LabelPaper } from '#shared/labels/labels.contract'

/** Rows of one statement, well below what PostgreSQL takes. */
const BATCH = 1000

/** Writes down a print and its pieces; gives its id. Without `at` the database says when. */
export async function insertPrint(
  db: Db,
  print: { readonly paper: LabelPaper; readonly personId: string; readonly at: Date | undefined },
  pieces: readonly PieceToPrint[],
): Promise<string> {
  const [row] = await db(LABEL_PRINTS)
    .insert({ paper: print.paper, person_id: print.personId, ...(print.at && { at: print.at }) })
    .returning('id')
  if (!row) throw new Error('The print was not written down.')
  const rows = pieces.map((piece, index) => ({
    print_id: row.id,
    position: index + 1,
    piece_id: piece.id,
    reprinted: piece.printed,
  }))
  await db.batchInsert(LABEL_PRINT_PIECES, rows, BATCH)
  return row.id
}
