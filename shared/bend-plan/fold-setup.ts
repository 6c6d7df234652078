import type { Sheet } from '#shared/stock/stock.schema'
import type { Degrees, Inches } from '#shared/units/brands'
import type { Brake } from './brake.schema'
import { openTools, toolClearance } from './collision/open-tools'
import type { OpenTools } from './collision/open-tools'
import { directionOf, frontSide, rearSide } from './orientation'
import type { Direction, Orientation } from './orientation'
import type { Section } from './plan.schema'
import { createSideShapes } from './side-shapes'
import type { SideShape, SideShapes } from './side-shapes'
import { workpieceOf } from './workpiece'
import type { PieceBend, Workpiece } from './workpiece'

/** What stays the same for every fold of one piece on one brake. */
export interface FoldGround {
  readonly piece: Workpiece
  readonly sheet: Sheet
  readonly brake: Brake
  /** From the sheet's centre line to a tool. */
  readonly clearance: Inches
  readonly openTools: Readonly<Record<Direction, OpenTools | null>>
  readonly sideShapes: SideShapes
}

/** One fold about to be made: everything that a test of it may look at, in the fold frame. */
export interface FoldSetup {
  readonly piece: Workpiece
  readonly brake: Brake
  readonly clearance: Inches
  /** Bends already made, as bits; this bend is not among them. */
  readonly made: number
  readonly bend: PieceBend
  readonly orientation: Orientation
  readonly direction: Direction
  /** Degrees the front swings, springback included; a hem's first hit has none. */
  readonly swing: Degrees
  /** The tools of this direction, opened. Throws RangeError where the brake has none. */
  readonly tools: OpenTools
  readonly front: SideShape
  readonly rear: SideShape
}

/** Throws RangeError where turns and legs of the section do not match or there are too many bends. */
export const foldGroundOf = (section: Section, sheet: Sheet, brake: Brake): FoldGround => {
  const clearance = toolClearance(sheet.thickness, brake)
  const piece = workpieceOf(section, sheet.thickness)
  return {
    piece,
    sheet,
    brake,
    clearance,
    openTools: {
      up: openTools(brake.up, clearance),
      down: brake.down && openTools(brake.down, clearance),
    },
    sideShapes: createSideShapes(piece, brake.noseZone),
  }
}

/** |turn| (1 + springback/90), or the brake's hem angle. */
export const swingOf = (bend: PieceBend, sheet: Sheet, brake: Brake): Degrees =>
  bend.hem === null ? Math.abs(bend.turn) * (1 + sheet.springbackPer90 / 90) : brake.hemAngle

/** Sides and tools are looked up when a test first asks: many tests do not. */
class LazyFoldSetup implements FoldSetup {
  readonly piece: Workpiece
  readonly brake: Brake
  readonly clearance: Inches
  readonly direction: Direction
  readonly swing: Degrees
  private madeFront: SideShape | undefined
  private madeRear: SideShape | undefined

  constructor(
    private readonly ground: FoldGround,
    readonly made: number,
    readonly bend: PieceBend,
    readonly orientation: Orientation,
  ) {
    this.piece = ground.piece
    this.brake = ground.brake
    this.clearance = ground.clearance
    this.direction = directionOf(bend, orientation)
    this.swing = swingOf(bend, ground.sheet, ground.brake)
  }

  get tools(): OpenTools {
    const tools = this.ground.openTools[this.direction]
    if (tools === null) throw new RangeError(`${this.brake.name} does not fold ${this.direction}.`)
    return tools
  }

  get front(): SideShape {
    const { ground, bend, orientation, made } = this
    return (this.madeFront ??= ground.sideShapes(bend, frontSide(orientation), made, 'front'))
  }

  get rear(): SideShape {
    const { ground, bend, orientation, made } = this
    return (this.madeRear ??= ground.sideShapes(bend, rearSide(orientation), made, 'rear'))
  }
}

export const foldSetup = (
  ground: FoldGround,
  made: number,
  bend: PieceBend,
  orientation: Orientation,
): FoldSetup => new LazyFoldSetup(ground, made, bend, orientation)
