import type { PieceMove } from '#shared/bend-plan/plan.schema'
import { flattenArc } from '#shared/geometry/arc'
import type { Vector } from '#shared/geometry/vector'
import { degrees, vector } from '#shared/geometry/vector'
import type { DisplayItem, DisplayList } from './display-list'
import { path } from './strip-items'

/** Drawn in a frame of 64 by 44, then scaled. */
const FRAME = { width: 64, height: 44 }

const SHEET_WEIGHT = 3
const ARROW_WEIGHT = 2.6

/** Part of an ellipse, degrees counter-clockwise from the right, in the frame (y down). */
const ellipse = (
  center: Vector,
  across: number,
  down: number,
  from: number,
  to: number,
): Vector[] =>
  flattenArc({ center: vector(0, 0), radius: 1, start: from, sweep: to - from }, 6, 1).map(
    ({ x, y }) => vector(center.x + across * x, center.y - down * y),
  )

const arrow = (points: readonly Vector[]): DisplayItem[] => {
  const end = points.at(-1)
  const before = points.at(-2)
  if (end === undefined || before === undefined) return []
  const angle = degrees(Math.atan2(end.y - before.y, end.x - before.x))
  const at = (turn: number, reach: number): Vector => {
    const direction = ((angle + turn) * Math.PI) / 180
    return vector(end.x + Math.cos(direction) * reach, end.y + Math.sin(direction) * reach)
  }
  return [
    path('selected', points, ARROW_WEIGHT),
    {
      ...path('selected', [at(0, 6.5), at(115, 5.5), at(-115, 5.5)], 0),
      closed: true,
      filled: true,
    },
  ]
}

/** The sheet from its end: a line. */
const fromEnd = (y: number): DisplayItem =>
  path('metal', [vector(10, y), vector(54, y)], SHEET_WEIGHT)

/** The sheet from above: a slim board lying away from the eye. */
const fromAbove: DisplayItem = {
  ...path(
    'metal',
    [vector(6, 29), vector(16, 19), vector(58, 19), vector(48, 29)],
    SHEET_WEIGHT * 0.7,
  ),
  closed: true,
}

const PICTURES: Readonly<Record<PieceMove, readonly DisplayItem[]>> = {
  load: [fromEnd(32), ...arrow([vector(54, 18), vector(22, 18)])],
  none: [fromEnd(24)],
  roll: [fromEnd(34), ...arrow(ellipse(vector(32, 26), 17, 15, 180, 22))],
  endForEnd: [fromAbove, ...arrow(ellipse(vector(32, 24), 27, 17, 205, 335))],
  both: [
    fromAbove,
    ...arrow(ellipse(vector(32, 24), 27, 15, 205, 335)),
    ...arrow(ellipse(vector(32, 15), 13, 10, 180, 22)),
  ],
}

/**
 * What is done with the whole piece before a hit: rolled over about its long axis, turned end for
 * end, or both. A picture of its own frame, scaled to `width` pixels.
 */
export const moveFigure = (move: PieceMove, width: number): DisplayList => {
  const scale = width / FRAME.width
  const grown = (point: Vector): Vector => vector(point.x * scale, point.y * scale)
  return {
    width,
    height: FRAME.height * scale,
    items: PICTURES[move].map((item) =>
      item.kind === 'path'
        ? { ...item, points: item.points.map(grown), width: item.width * scale }
        : item,
    ),
  }
}
