import { radians, vector } from '#shared/geometry/vector'
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

/** A chain as rows of numbers, which a search makes by the thousands. */
export interface ChainNumbers {
  readonly xs: readonly number[]
  readonly ys: readonly number[]
  readonly firstRun: Inches
  readonly developed: Inches
}

/**
 * The chain of one side of a bend line, given which bends are made (bits of `made`).
 * With u = turn of a made bend x sign of this bend's turn, a front heading gains u and a rear heading
 * loses u. A closed hem ends the chain at its fold once made; an open one is gap + T and its lip.
 */
export const chainNumbers = (
  { bends, legs, thickness }: Workpiece,
  bend: PieceBend,
  side: Side,
  made: number,
  place: 'front' | 'rear',
): ChainNumbers => {
  const step = side === 'B' ? 1 : -1
  const sign = Math.sign(bend.turn) * (place === 'front' ? 1 : -1)
  const xs = [0]
  const ys = [0]
  let [x, y] = [0, 0]
  let angle: Degrees = place === 'front' ? 0 : 180
  let firstRun: Inches = -1
  let developed: Inches = 0
  let run: Inches = 0
  let isEnded = false
  const endRun = () => {
    if (firstRun < 0) {
      // Exactly along the sheet, whatever a sine of 180 degrees rounds to.
      firstRun = run
      x = place === 'front' ? run : 0 - run
    } else {
      x += run * Math.cos(radians(angle))
      y += run * Math.sin(radians(angle))
    }
    xs.push(x)
    ys.push(y)
    run = 0
  }
  for (let i = bend.index; ; i += step) {
    const leg = legs[side === 'B' ? i + 1 : i] ?? 0
    developed += leg
    if (!isEnded) run += leg
    const next = bends[i + step]
    if (next === undefined) break
    if ((made & (1 << next.index)) === 0) continue
    if (isEnded) continue
    endRun()
    if (next.hem === null) angle += next.turn * sign
    else if (next.hem.open) {
      angle += (next.turn / 2) * sign
      run = next.hem.gap + thickness
      endRun()
      angle += (next.turn / 2) * sign
    } else isEnded = true
  }
  if (!isEnded) endRun()
  return { xs, ys, firstRun, developed }
}

/** The chain of `chainNumbers` with its points. */
export const chainOf = (
  piece: Workpiece,
  bend: PieceBend,
  side: Side,
  made: number,
  place: 'front' | 'rear',
): Chain => {
  const { xs, ys, firstRun, developed } = chainNumbers(piece, bend, side, made, place)
  return { points: xs.map((x, i) => vector(x, ys[i] ?? NaN)), firstRun, developed }
}
