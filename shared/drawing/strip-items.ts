import type { Bounds } from '#shared/geometry/bounds'
import { clipToBox, segment } from '#shared/geometry/segment'
import type { DisplayItem, Part, PathShape, Point, Role, TextShape } from './display-list'

export const path = (
  role: Role,
  points: readonly Point[],
  width: number,
  part?: Part,
): PathShape =>
  part
    ? { kind: 'path', role, points, width, closed: false, filled: false, part }
    : { kind: 'path', role, points, width, closed: false, filled: false }

/** An open path of dashes. */
export const dashed = (
  role: Role,
  points: readonly Point[],
  width: number,
  dash: readonly number[],
  part?: Part,
): PathShape =>
  part
    ? { kind: 'path', role, points, width, closed: false, filled: false, dash, part }
    : { kind: 'path', role, points, width, closed: false, filled: false, dash }

/** A closed path that is filled and not stroked. */
export const filledPath = (role: Role, points: readonly Point[], part?: Part): PathShape =>
  part
    ? { kind: 'path', role, points, width: 0, closed: true, filled: true, part }
    : { kind: 'path', role, points, width: 0, closed: true, filled: true }

export const text = (
  role: Role,
  content: string,
  at: Point,
  size: number,
  part?: Part,
  bold = false,
  rotation = 0,
): TextShape =>
  part
    ? { kind: 'text', role, at, text: content, size, rotation, bold, part }
    : { kind: 'text', role, at, text: content, size, rotation, bold }

/** An edge's letter in its circle. */
export const letter = (edge: 'A' | 'B', at: Point, size: number): DisplayItem[] => {
  const part: Part = { kind: 'edge', edge }
  return [
    {
      kind: 'circle',
      role: 'edge',
      part,
      center: at,
      radius: size * 0.68,
      width: 1,
      filled: false,
    },
    text('edge', edge, at, size, part, true),
  ]
}

/** Slanting lines across a box. */
export const hatch = (box: Bounds, step: number, part: Part): DisplayItem[] => {
  const tall = box.maxY - box.minY
  const items: DisplayItem[] = []
  for (let x = box.minX - tall + step / 2; x < box.maxX; x += step) {
    const line = clipToBox(segment({ x, y: box.maxY }, { x: x + tall, y: box.minY }), box)
    if (line) items.push(path('hemHatch', [line.from, line.to], 1, part))
  }
  return items
}
