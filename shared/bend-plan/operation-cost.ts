import { TOLERANCE } from '#shared/geometry/tolerance'
import type { Inches, Pounds } from '#shared/units/brands'
import type { FoldGround } from './fold-setup'
import { restsOn } from './gauge-stop'
import { frontSide, getOrientation, moveBetween, rearSide } from './orientation'
import { packCost } from './packed-cost'
import type { PieceMove } from './plan.schema'
import { widthBeside } from './workpiece'
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
  return {
    move: (from, to) =>
      handling(table.moves[moveBetween(getOrientation(from), getOrientation(to))]),
    fixed: (bend, orientation) => {
      const o = getOrientation(orientation)
      const front = widthBeside(piece, bend, frontSide(o))
      const rear = widthBeside(piece, bend, rearSide(o))
      if (front <= rear + WIDER) return 0
      const wide = packCost({ handling: 0, wideFront: 1, faceGauge: 0 })
      return front > brake.bigFront + TOLERANCE ? wide + handling(table.bigFront) : wide
    },
    gauge: (made, bend, orientation) =>
      brake.gauge !== null &&
      restsOn(piece, bend, rearSide(getOrientation(orientation)), made) === 'formedFace'
        ? packCost({ handling: 0, wideFront: 0, faceGauge: 1 })
        : 0,
  }
}
