import type { Sheet } from '#shared/stock/stock.schema'
import type { Degrees } from '#shared/units/brands'
import type { Brake } from './brake.schema'
import { chainOf } from './fold-frame'
import type { Chain } from './fold-frame'
import { directionOf, frontSide, rearSide } from './orientation'
import type { Direction, Orientation } from './orientation'
import type { PieceBend, Workpiece } from './workpiece'

/** What stays the same for every fold of one piece on one brake. */
export interface FoldGround {
  readonly piece: Workpiece
  readonly sheet: Sheet
  readonly brake: Brake
}

/** One fold about to be made: everything that a test of it may look at, in the fold frame. */
export interface FoldSetup extends FoldGround {
  /** Bends already made, as bits; this bend is not among them. */
  readonly made: number
  readonly bend: PieceBend
  readonly orientation: Orientation
  readonly direction: Direction
  /** Degrees the front swings, springback included; a hem's first hit has none. */
  readonly swing: Degrees
  readonly front: Chain
  readonly rear: Chain
}

/** |turn| (1 + springback/90), or the brake's hem angle. */
export const swingOf = (bend: PieceBend, sheet: Sheet, brake: Brake): Degrees =>
  bend.hem === null ? Math.abs(bend.turn) * (1 + sheet.springbackPer90 / 90) : brake.hemAngle

/** The chains are built when a test first looks at them: many tests do not. */
export const foldSetup = (
  ground: FoldGround,
  made: number,
  bend: PieceBend,
  orientation: Orientation,
): FoldSetup => {
  const { piece, sheet, brake } = ground
  let front: Chain | undefined
  let rear: Chain | undefined
  return {
    piece,
    sheet,
    brake,
    made,
    bend,
    orientation,
    direction: directionOf(bend, orientation),
    swing: swingOf(bend, sheet, brake),
    get front() {
      return (front ??= chainOf(piece, bend, frontSide(orientation), made, 'front'))
    },
    get rear() {
      return (rear ??= chainOf(piece, bend, rearSide(orientation), made, 'rear'))
    },
  }
}
