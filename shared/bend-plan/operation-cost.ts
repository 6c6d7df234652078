import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Inches, Pounds } from '#shared/units/brands'
import type { FoldGround } from './fold-setup'
import { isFormedFace } from './gauge-stop'
import { ORIENTATIONS, frontSide, moveBetween, rearSide } from './orientation'
import type { Orientation } from './orientation'
import { packCost } from './packed-cost'
import type { PieceMove } from './plan.schema'
import { bendsBeside, closedHemsOf, widthBeside } from './workpiece'
import type { PieceBend } from './workpiece'

/** A front counts as wider than its rear above this difference. */
const WIDER: Inches = 1e-6

/** Pieces up to this length are handled by one person. */
const SHORT: Inches = 60

interface HandlingTable {
  readonly moves: Readonly<Record<PieceMove, number>>
  readonly bigFront: number
}

const LONG_PIECE: HandlingTable = {
  moves: { load: 0, none: 0, roll: 2, endForEnd: 3, both: 5 },
  bigFront: 4,
}

const SHORT_PIECE: HandlingTable = {
  moves: { load: 0, none: 0, roll: 2, endForEnd: 2, both: 4 },
  bigFront: 2,
}

const WIDE_FRONT = packCost({ handling: 0, wideFront: 1, faceGauge: 0 })
const FACE_GAUGE = packCost({ handling: 0, wideFront: 0, faceGauge: 1 })

/** 1 to 60 in. and 35 lb, 2 to 100 lb, else 3. */
const crewFactor = (length: Inches, weight: Pounds): number => {
  if (length <= SHORT + TOLERANCE && weight <= 35 + TOLERANCE) return 1
  return weight <= 100 + TOLERANCE ? 2 : 3
}

/** The cost of each part of a sequence, packed as integers that compare as the cost tuple does. */
export interface OperationCost {
  /** Moving the whole piece from one orientation to another (by number). */
  readonly move: (from: number, to: number) => number
  /** What never depends on the bends already made: big front and wide front. */
  readonly fixed: (bend: PieceBend, orientation: number) => number
  /** One more where the operation is gauged on a formed face. */
  readonly gauge: (made: number, bend: PieceBend, orientation: number) => number
}

export const operationCost = (ground: FoldGround, pieceLength: Inches): OperationCost => {
  const { piece, sheet, brake } = ground
  const weight = piece.width * pieceLength * sheet.thickness * sheet.density
  const crew = crewFactor(pieceLength, weight)
  const table = pieceLength <= SHORT + TOLERANCE ? SHORT_PIECE : LONG_PIECE
  const handling = (value: number) =>
    packCost({ handling: crew * value, wideFront: 0, faceGauge: 0 })
  const fixedOf = (bend: PieceBend, o: Orientation): number => {
    const front = widthBeside(piece, bend, frontSide(o))
    const rear = widthBeside(piece, bend, rearSide(o))
    if (front <= rear + WIDER) return 0
    return front > brake.bigFront + TOLERANCE ? WIDE_FRONT + handling(table.bigFront) : WIDE_FRONT
  }
  const moves = Float64Array.from(
    ORIENTATIONS.flatMap((from) =>
      ORIENTATIONS.map((to) => handling(table.moves[moveBetween(from, to)])),
    ),
  )
  const fixed = Float64Array.from(
    piece.bends.flatMap((bend) => ORIENTATIONS.map((o) => fixedOf(bend, o))),
  )
  const behind = Int32Array.from(
    piece.bends.flatMap((bend) => ORIENTATIONS.map((o) => bendsBeside(piece, bend, rearSide(o)))),
  )
  const closedHems = closedHemsOf(piece)
  const isGauged = brake.gauge !== null
  return {
    move: (from, to) => moves[from * 4 + to] ?? NaN,
    fixed: (bend, orientation) => fixed[bend.index * 4 + orientation] ?? NaN,
    gauge: (made, bend, orientation) =>
      isGauged && isFormedFace(made & (behind[bend.index * 4 + orientation] ?? NaN), closedHems)
        ? FACE_GAUGE
        : 0,
  }
}
