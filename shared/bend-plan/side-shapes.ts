import type { Inches } from '#shared/units/brands'
import { cutStart, sheetOutline } from './collision/outline'
import type { Outline } from './collision/outline'
import { chainOf } from './fold-frame'
import type { Chain } from './fold-frame'
import { bendsBeside } from './workpiece'
import type { PieceBend, Side, Workpiece } from './workpiece'

/** One side of a bend line with some of its bends made. */
export interface SideShape {
  readonly chain: Chain
  readonly outline: Outline
  /** Without its nose zone; undefined when nothing is left. */
  readonly pastNose: Outline | undefined
}

class LazySideShape implements SideShape {
  readonly outline: Outline
  private madePastNose: { readonly outline: Outline | undefined } | undefined

  constructor(
    readonly chain: Chain,
    private readonly noseZone: Inches,
  ) {
    this.outline = sheetOutline(chain.points)
  }

  get pastNose(): Outline | undefined {
    if (this.madePastNose === undefined) {
      const points = cutStart(this.chain.points, this.noseZone)
      this.madePastNose = { outline: points && sheetOutline(points) }
    }
    return this.madePastNose.outline
  }
}

export type SideShapes = (
  bend: PieceBend,
  side: Side,
  made: number,
  place: 'front' | 'rear',
) => SideShape

/** Shapes kept at a time; beyond, all are forgotten and built again as they are asked for. */
const MOST_SHAPES = 16_384

/** The sides of a piece by the bends made on them, kept for the many made sets that share one. */
export const createSideShapes = (piece: Workpiece, noseZone: Inches): SideShapes => {
  const known = new Map<number, SideShape>()
  return (bend, side, made, place) => {
    const bits = made & bendsBeside(piece, bend, side)
    const key =
      ((bits * 32 + bend.index) * 2 + (side === 'A' ? 0 : 1)) * 2 + (place === 'front' ? 0 : 1)
    const found = known.get(key)
    if (found !== undefined) return found
    const shape = new LazySideShape(chainOf(piece, bend, side, bits, place), noseZone)
    if (known.size >= MOST_SHAPES) known.clear()
    known.set(key, shape)
    return shape
  }
}
