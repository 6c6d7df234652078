import { ORIGIN, add, heading, scale } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Degrees, Inches } from '#shared/units/brands'
import type { PieceBend, Side, Workpiece } from './workpiece'

/**
 * One side of the piece in the fold frame: the centre line from the bend line (the origin) outwards.
 * The front leaves at heading 0, the rear at heading 180; the front swings up.
 */
export interface Chain {
  /** The bend line, the corners of the bends made, the end. */
  readonly points: readonly Vector[]
  /** From the bend line to the first made bend or the edge. */
  readonly firstRun: Inches
  /** Developed width of this side, made or not. */
  readonly developed: Inches
}

interface Turn {
  /** Degrees in the walk from A to B. */
  readonly turn: Degrees
  /** The straight run that follows it. */
  readonly run: Inches
}

/** The runs outwards from a bend line: the first, then each with the turn that leads into it. */
const runsOf = (piece: Workpiece, bend: PieceBend, side: Side, made: number) => {
  const step = side === 'B' ? 1 : -1
  const legAt = (bendIndex: number): Inches =>
    piece.legs[side === 'B' ? bendIndex + 1 : bendIndex] ?? 0
  let firstRun = legAt(bend.index)
  let developed = firstRun
  const turns: Turn[] = []
  const extend = (run: Inches) => {
    const last = turns.pop()
    if (last === undefined) firstRun += run
    else turns.push({ turn: last.turn, run: last.run + run })
  }
  for (let i = bend.index + step; ; i += step) {
    const next = piece.bends[i]
    if (next === undefined) break
    const leg = legAt(i)
    developed += leg
    if ((made & (1 << i)) === 0) extend(leg)
    else if (next.hem === null) turns.push({ turn: next.turn, run: leg })
    else if (next.hem.open) {
      const quarter = next.turn / 2
      turns.push(
        { turn: quarter, run: next.hem.gap + piece.thickness },
        { turn: quarter, run: leg },
      )
    }
  }
  return { firstRun, developed, turns }
}

/**
 * The chain of one side of a bend line, given which bends are made (bits of `made`).
 * With u = turn of a made bend x sign of this bend's turn, a front heading gains u and a rear heading
 * loses u. A closed hem ends the chain at its fold once made; an open one is gap + T and its lip.
 */
export const chainOf = (
  piece: Workpiece,
  bend: PieceBend,
  side: Side,
  made: number,
  place: 'front' | 'rear',
): Chain => {
  const { firstRun, developed, turns } = runsOf(piece, bend, side, made)
  const sign = Math.sign(bend.turn) * (place === 'front' ? 1 : -1)
  let angle = place === 'front' ? 0 : 180
  let point = place === 'front' ? { x: firstRun, y: 0 } : { x: 0 - firstRun, y: 0 }
  const points: Vector[] = [ORIGIN, point]
  for (const { turn, run } of turns) {
    angle += turn * sign
    point = add(point, scale(heading(angle), run))
    points.push(point)
  }
  return { points, firstRun, developed }
}
