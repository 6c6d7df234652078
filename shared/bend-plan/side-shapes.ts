import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import { Outline } from './collision/outline'
import { chainNumbers } from './fold-frame'
import type { Chain, ChainNumbers } from './fold-frame'
import { bendsBeside } from './workpiece'
import type { PieceBend, Side, Workpiece } from './workpiece'

/** One side of a bend line with some of its bends made. */
export interface SideShape {
  readonly chain: Chain
  readonly outline: Outline
  /** Without its nose zone; undefined when nothing is left. */
  readonly pastNose: Outline | undefined
}

class OutlineChain implements Chain {
  constructor(
    private readonly outline: Outline,
    readonly firstRun: Inches,
    readonly developed: Inches,
  ) {}

  get points(): readonly Vector[] {
    return this.outline.points
  }
}

class LazySideShape implements SideShape {
  readonly outline: Outline
  readonly chain: Chain
  private madePastNose: Outline | undefined
  private isPastNoseMade = false

  constructor(
    { xs, ys, firstRun, developed }: ChainNumbers,
    private readonly noseZone: Inches,
  ) {
    this.outline = new Outline(xs, ys, false)
    this.chain = new OutlineChain(this.outline, firstRun, developed)
  }

  get pastNose(): Outline | undefined {
    if (!this.isPastNoseMade) {
      this.isPastNoseMade = true
      this.madePastNose = this.outline.withoutStart(this.noseZone)
    }
    return this.madePastNose
  }
}

export type SideShapes = (
  bend: PieceBend,
  side: Side,
  made: number,
  place: 'front' | 'rear',
) => SideShape

/** Shapes kept at a time; beyond, all are forgotten and built again as they are asked for. */
const MOST_SHAPES = 8192

/** The sides of a piece by the bends made on them, kept for the many made sets that share one. */
export const createSideShapes = (piece: Workpiece, noseZone: Inches): SideShapes => {
  const known = new Map<number, SideShape>()
  return (bend, side, made, place) => {
    const bits = made & bendsBeside(piece, bend, side)
    const key =
      ((bits * 32 + bend.index) * 2 + (side === 'A' ? 0 : 1)) * 2 + (place === 'front' ? 0 : 1)
    const found = known.get(key)
    if (found !== undefined) return found
    const shape = new LazySideShape(chainNumbers(piece, bend, side, bits, place), noseZone)
    if (known.size >= MOST_SHAPES) known.clear()
    known.set(key, shape)
    return shape
  }
}
