import { rotate, vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Degrees, Inches } from '#shared/units/brands'
import { sheetOutline } from '../collision/outline'
import type { Outline } from '../collision/outline'
import { meetsStill } from '../collision/still'
import { meetsSwinging } from '../collision/swing'
import type { FoldSetup } from '../fold-setup'
import type { PlanCheck } from '../plan.schema'
import type { Contact } from './contact.schema'
import { cutSetup, runLength } from './cut-setup'
import type { Place } from './cut-setup'
import { findCaught } from './draw-out-contact'
import { firstContact, swungOutline } from './first-contact'
import { nearestPoints } from './nearest-points'
import { LEAST, bisect } from './overlap'

/** In the fold frame, where every front swings up. */
interface Met {
  readonly front: readonly Vector[]
  readonly swung: Degrees
  readonly at: Vector
  readonly against: Contact['against']
}

const TOOLS = ['inner', 'outer', 'apron'] as const

const swungFront = ({ front }: FoldSetup, swung: Degrees): readonly Vector[] =>
  front.outline.points.map((point) => rotate(point, swung))

/**
 * Sheet that is in the way before anything swings may lie deep inside a tool. Cut off where it just
 * clears, its end is the first place, walking out from the bend line, that meets.
 */
const justClear = (
  setup: FoldSetup,
  place: Place,
  meets: (setup: FoldSetup) => boolean,
): FoldSetup => {
  const most = runLength(setup[place].chain.points) - LEAST
  const isFree = (cut: Inches): boolean => !meets(cutSetup(setup, place, cut))
  return isFree(most) ? cutSetup(setup, place, bisect(0, most, isFree)) : setup
}

const rearAtTool = (setup: FoldSetup): Met => {
  const { inner, outer } = setup.tools
  const { rear } = justClear(setup, 'rear', (cut) =>
    [inner, outer].some((tool) => meetsStill(cut.rear.outline, tool, setup.clearance)),
  )
  const toInner = nearestPoints(rear.outline, inner)
  const toOuter = nearestPoints(rear.outline, outer)
  const isInner = toInner.distance <= toOuter.distance
  return {
    front: swungFront(setup, 0),
    swung: 0,
    at: isInner ? toInner.at : toOuter.at,
    against: isInner ? 'inner' : 'outer',
  }
}

const frontAtTool = (setup: FoldSetup): Met | undefined => {
  const { pastNose } = setup.front
  if (pastNose === undefined) return undefined
  const met = TOOLS.flatMap((against) => {
    const swung = firstContact(
      (swing) => meetsSwinging(pastNose, setup.tools[against], swing, setup.clearance),
      setup.swing,
    )
    return swung === undefined ? [] : [{ against, swung }]
  })
  if (met.length === 0) return undefined
  const swung = Math.min(...met.map((each) => each.swung))
  const first = met.filter((each) => each.swung === swung)
  const clear =
    swung > 0
      ? setup
      : justClear(setup, 'front', ({ front: { pastNose: left } }) =>
          first.some(
            ({ against }) =>
              left !== undefined && meetsStill(left, setup.tools[against], setup.clearance),
          ),
        )
  const shown = swungOutline(clear.front.pastNose ?? pastNose, swung)
  const { against, at } = first
    .map((each) => ({ ...each, ...nearestPoints(shown, setup.tools[each.against]) }))
    .reduce((best, each) => (each.distance < best.distance ? each : best))
  return { front: swungFront(setup, swung), swung, at, against }
}

const pieceAtItself = (setup: FoldSetup): Met | undefined => {
  const { thickness } = setup.piece
  const { rear } = setup
  const swung = firstContact(
    (swing) => meetsSwinging(setup.front.outline, rear.outline, swing, thickness, true),
    setup.swing,
  )
  if (swung === undefined) return undefined
  const { front } =
    swung > 0
      ? setup
      : justClear(setup, 'front', (cut) =>
          meetsStill(cut.front.outline, rear.outline, thickness, true),
        )
  const { at } = nearestPoints(swungOutline(front.outline, swung), rear.outline, true)
  return { front: swungFront(setup, swung), swung, at, against: 'piece' }
}

const apronAtRear = (setup: FoldSetup): Met | undefined => {
  const { apron } = setup.tools
  const swung = firstContact(
    (swing) => meetsSwinging(apron, setup.rear.outline, swing, setup.clearance),
    setup.swing,
  )
  if (swung === undefined) return undefined
  const { rear } =
    swung > 0
      ? setup
      : justClear(setup, 'rear', (cut) => meetsStill(cut.rear.outline, apron, setup.clearance))
  const { at } = nearestPoints(rear.outline, swungOutline(apron, swung))
  return { front: swungFront(setup, swung), swung, at, against: 'apron' }
}

/** A finished hem lies along the sheet behind the fold. */
const afterFold = (setup: FoldSetup): { front: readonly Vector[]; swung: Degrees } => {
  const { bend, piece } = setup
  if (bend.hem === null) {
    const swung = Math.abs(bend.turn)
    return { front: swungFront(setup, swung), swung }
  }
  const height = bend.hem.gap + piece.thickness
  const lip = [vector(0, 0), vector(0, height), vector(0 - bend.hem.lip, height)]
  return { front: lip, swung: 180 }
}

const caughtInside = (setup: FoldSetup, isFolded: boolean): Met | undefined => {
  const { rear, front, bend, tools, brake, clearance } = setup
  const { front: shown, swung } = isFolded
    ? afterFold(setup)
    : { front: swungFront(setup, 0), swung: 0 }
  const turned = (part: Outline): Outline =>
    isFolded ? sheetOutline(part.points.map((point) => rotate(point, swung))) : part
  const moves =
    front.pastNose === undefined || (isFolded && bend.hem !== null)
      ? undefined
      : turned(front.pastNose)
  const caught = findCaught(rear.outline, moves, tools, brake.opening, clearance)
  return caught && { front: shown, swung, ...caught }
}

const metBy = (check: PlanCheck, setup: FoldSetup): Met | undefined => {
  switch (check) {
    case 'rearMeetsTool':
      return rearAtTool(setup)
    case 'frontMeetsTool':
      return frontAtTool(setup)
    case 'meetsItself':
      return pieceAtItself(setup)
    case 'apronMeetsRear':
      return apronAtRear(setup)
    case 'cannotLoad':
      return caughtInside(setup, false)
    case 'trapped':
      return caughtInside(setup, true)
    default:
      return undefined
  }
}

/**
 * The picture of a failed fold at its first contact; null for a check that is not about contact. The
 * distance at contact is the clearance (between sheet and sheet a thickness) from the opened tools,
 * except where the sheet lies in a tool from the start or is caught on its way out.
 */
export const contactOf = (setup: FoldSetup, check: PlanCheck): Contact | null => {
  const met = metBy(check, setup)
  if (met === undefined) return null
  const { direction, orientation, rear } = setup
  const way = direction === 'up' ? 1 : -1
  // A sum with 0 turns -0 into 0.
  const seen = ({ x, y }: Vector): [number, number] => [x + 0, y * way + 0]
  return {
    direction,
    leftUp: orientation.leftUp,
    aBack: orientation.aBack,
    rear: rear.outline.points.map(seen),
    front: met.front.map(seen),
    swung: met.swung,
    at: seen(met.at),
    against: met.against,
  }
}
