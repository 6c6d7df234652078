import { roofLineSchema } from '#shared/roof-line/roof-line.schema'
import { roofPieces } from '#shared/roof-line/roof-pieces'

/** The pieces that cover a line on the roof when all are to be of one length. Inches. */
export function equalPieces(line: {
  readonly length: number
  readonly pieceLength: number
  readonly lap: number
}): { readonly length: number; readonly count: number } {
  const covered = roofPieces(roofLineSchema.parse({ ...line, mode: 'equal' }))
  const [pieces] = covered.ok ? covered.answer.pieces : []
  if (!pieces) throw new RangeError(`A line of ${line.length} in. cannot be covered.`)
  return pieces
}
