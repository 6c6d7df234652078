import type { Brake } from './brake.schema'
import type { PieceMove } from './plan.schema'
import type { PieceBend, Side } from './workpiece'

/** Which face is up and which edge lies at the back. */
export interface Orientation {
  readonly leftUp: boolean
  readonly aBack: boolean
}

export type Direction = 'up' | 'down'

/** The four orientations; an orientation's place in this list is its number in the search. */
export const ORIENTATIONS = [
  { leftUp: false, aBack: false },
  { leftUp: true, aBack: false },
  { leftUp: false, aBack: true },
  { leftUp: true, aBack: true },
] as const satisfies readonly Orientation[]

export const orientationNumber = (o: Orientation): number => (o.leftUp ? 1 : 0) + (o.aBack ? 2 : 0)

export const getOrientation = (number: number): Orientation => {
  const found = ORIENTATIONS[number]
  if (found === undefined) throw new RangeError(`No orientation ${number}.`)
  return found
}

/** The move of the whole piece between two orientations. */
export const moveBetween = (from: Orientation, to: Orientation): PieceMove => {
  const turned = from.leftUp !== to.leftUp
  const swapped = from.aBack !== to.aBack
  if (turned && swapped) return 'roll'
  if (swapped) return 'endForEnd'
  return turned ? 'both' : 'none'
}

/** A bend to the left folds up when the left side is up. */
export const directionOf = (bend: PieceBend, o: Orientation): Direction =>
  bend.turn > 0 === o.leftUp ? 'up' : 'down'

export const frontSide = (o: Orientation): Side => (o.aBack ? 'B' : 'A')

export const rearSide = (o: Orientation): Side => (o.aBack ? 'A' : 'B')

/** Direction and hem side alone: what never depends on the bends already made. */
export const isOrientationOpen = (bend: PieceBend, o: Orientation, brake: Brake): boolean =>
  (directionOf(bend, o) === 'up' || brake.down !== null) &&
  (bend.hem === null || (bend.fold === 'hemB') === o.aBack)
