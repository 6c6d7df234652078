import { rotate, vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Degrees, Inches } from '#shared/units/brands'
import { chainOf } from './fold-frame'
import { directionOf, frontSide, rearSide } from './orientation'
import { isPaintedUp } from './painted-side'
import type { Plan } from './plan.schema'
import type { PlanRequest } from './plan-request'
import { workpieceOf } from './workpiece'
import type { PieceHem, Side, Workpiece } from './workpiece'

/**
 * The section of the workpiece at one step, as the bender sees it from the end: inches, the bend line
 * at the origin, x to the front, y up, clamped sheet on y = 0 behind the bend line. Centre line.
 *
 * The fold frame of the planner always swings the front up and mirrors a down fold to get there; here
 * the mirror is undone, so a down fold's front truly swings down.
 */
export interface StepPicture {
  /** From the bend line to the back. */
  readonly clamped: readonly Vector[]
  /** From the bend line to the front, before and after the hit. */
  readonly frontBefore: readonly Vector[]
  readonly frontAfter: readonly Vector[]
  /** The front on its way, in order; of a hem how its first hit leaves it, before it is flattened. */
  readonly swings: readonly (readonly Vector[])[]
  /** Degrees that the apron swings in the picture: those of the bend, of a hem its first hit. */
  readonly swung: Degrees
  readonly edgeAtFront: Side
  readonly edgeAtBack: Side
  /** Whether the painted side of the clamped sheet faces up; null with both sides or none painted. */
  readonly paintedUp: boolean | null
}

/** For the planner a closed hem is flat sheet once made; a picture shows its lip all the same. */
const withHemsDrawn = (piece: Workpiece): Workpiece => ({
  ...piece,
  bends: piece.bends.map((bend) =>
    bend.hem === null ? bend : { ...bend, hem: { ...bend.hem, open: true } },
  ),
})

/** Where the front is shown on its way, in parts of the swing. */
const ON_THE_WAY = [1 / 3, 2 / 3]

/** A finished hem: over the fold and back along the sheet. */
const foldedLip = ({ lip, gap }: PieceHem, thickness: Inches): readonly Vector[] => {
  const height = gap + thickness
  return [vector(0, 0), vector(0, height), vector(0 - lip, height)]
}

const upsideDown = (points: readonly Vector[]): readonly Vector[] =>
  points.map(({ x, y }) => vector(x, y === 0 ? 0 : 0 - y))

/** One picture for each step of the plan, in their order. Throws RangeError on a step of an unknown bend. */
export const stepPictures = (plan: Plan, request: PlanRequest): readonly StepPicture[] => {
  const piece = withHemsDrawn(workpieceOf(request.section, request.sheet.thickness))
  let made = 0
  return plan.steps.map((step) => {
    const bend = piece.bends.find((each) => each.fold === step.bend)
    if (bend === undefined) throw new RangeError(`The section has no bend ${step.bend}.`)
    const rear = chainOf(piece, bend, rearSide(step), made, 'rear').points
    const front = chainOf(piece, bend, frontSide(step), made, 'front').points
    const after =
      bend.hem === null
        ? front.map((point) => rotate(point, Math.abs(bend.turn)))
        : foldedLip(bend.hem, piece.thickness)
    const swung = bend.hem === null ? Math.abs(bend.turn) : request.brake.hemAngle
    const swings = bend.hem === null ? ON_THE_WAY.map((part) => part * swung) : [swung]
    made |= 1 << bend.index
    const seen =
      directionOf(bend, step) === 'up' ? (points: readonly Vector[]) => points : upsideDown
    return {
      clamped: seen(rear),
      frontBefore: seen(front),
      frontAfter: seen(after),
      swings: swings.map((angle) => seen(front.map((point) => rotate(point, angle)))),
      swung,
      edgeAtFront: frontSide(step),
      edgeAtBack: rearSide(step),
      paintedUp: isPaintedUp(request.paintedSide, step.leftUp),
    }
  })
}
