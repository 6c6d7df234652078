import type { Bounds } from '#shared/geometry/bounds'
import { holds } from '#shared/geometry/bounds'
import { add, degrees, heading, scale } from '#shared/geometry/vector'
import { overlap } from './axonometry'
import type { Point } from './display-list'
import { TEXT_HEIGHT, textBox, textWidth } from './text-box'

/** Where a piece ends on the picture: the middle of its broken end and of its cut. */
export interface NamedPiece {
  readonly broken: Point
  readonly cut: Point
}

export interface NameRoom {
  /** Convex shapes that a name must not cover. */
  readonly taken: readonly (readonly Point[])[]
  readonly frame: Bounds
  readonly size: number
}

export interface PlacedName {
  readonly name: string
  readonly at: Point
}

/** Turns from the straight way out, and steps along it, that a name may take to stand free. */
const TURNS = [0, 25, -25, 50, -50, 75, -75, 100, -100]
const STEPS = [0, 1, 2, 3, 4, 6, 8]

/** The mean of some points; throws a RangeError when there are none. */
export const meanOf = (points: readonly Point[]): Point => {
  if (points.length === 0) throw new RangeError('No points have no middle.')
  return scale(points.reduce(add, { x: 0, y: 0 }), 1 / points.length)
}

const cornersOf = ({ minX, minY, maxX, maxY }: Bounds): Point[] => [
  { x: minX, y: minY },
  { x: maxX, y: minY },
  { x: maxX, y: maxY },
  { x: minX, y: maxY },
]

const placeName = (
  name: string,
  { broken, cut }: NamedPiece,
  { taken, frame, size }: NameRoom,
): Point | undefined => {
  const straight = degrees(Math.atan2(broken.y - cut.y, broken.x - cut.x))
  for (const step of STEPS) {
    for (const turn of TURNS) {
      const way = heading(straight + turn)
      const halfText =
        (Math.abs(way.x) * textWidth(name, size) + Math.abs(way.y) * size * TEXT_HEIGHT) / 2
      const at = add(broken, scale(way, halfText + size * (0.5 + step * 0.5)))
      const box = textBox(name, size, at)
      if (holds(frame, box) && !taken.some((shape) => overlap(shape, cornersOf(box)))) return at
    }
  }
  return undefined
}

/**
 * Names beyond the broken ends of their pieces, on the way away from the corner; turned and moved
 * until they cover nothing and lie in the frame. One that finds no place is left out: the words
 * beside the picture name the pieces too.
 */
export const placeNames = (
  names: readonly (readonly [string, NamedPiece])[],
  room: NameRoom,
): PlacedName[] => {
  const placed: PlacedName[] = []
  for (const [name, piece] of names) {
    const before = placed.map((one) => cornersOf(textBox(one.name, room.size, one.at)))
    const at =
      name === ''
        ? undefined
        : placeName(name, piece, { ...room, taken: [...room.taken, ...before] })
    if (at) placed.push({ name, at })
  }
  return placed
}
