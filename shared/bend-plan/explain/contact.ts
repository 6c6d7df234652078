import { rotate, vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Degrees } from '#shared/units/brands'
import { sheetOutline } from '../collision/outline'
import type { Outline } from '../collision/outline'
import { meetsSwinging } from '../collision/swing'
import type { FoldSetup } from '../fold-setup'
import type { PlanCheck } from '../plan.schema'
import type { Contact } from './contact.schema'
import { cutSetup } from './cut-setup'
import { findCaught } from './draw-out-contact'
import { firstContact, swungOutline } from './first-contact'
import { nearestPoints } from './nearest-points'
import type { Overlap } from './overlap'

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
const justClear = (setup: FoldSetup, overlap: Overlap | null): FoldSetup =>
  overlap === null ? setup : cutSetup(setup, overlap.place, overlap.length)

const rearAtTool = (setup: FoldSetup, overlap: Overlap | null): Met => {
  const { rear } = justClear(setup, overlap)
  const inner = nearestPoints(rear.outline, setup.tools.inner)
  const outer = nearestPoints(rear.outline, setup.tools.outer)
  return {
    front: swungFront(setup, 0),
    swung: 0,
    at: inner.distance <= outer.distance ? inner.at : outer.at,
    against: inner.distance <= outer.distance ? 'inner' : 'outer',
  }
}

const frontAtTool = (setup: FoldSetup, overlap: Overlap | null): Met | undefined => {
  const { pastNose } = setup.front
  if (pastNose === undefined) return undefined
  let first: { readonly swung: Degrees; readonly against: (typeof TOOLS)[number] } | undefined
  for (const against of TOOLS) {
    const tool = setup.tools[against]
    const swung = firstContact(
      (swing) => meetsSwinging(pastNose, tool, swing, setup.clearance),
      setup.swing,
    )
    if (swung !== undefined && (first === undefined || swung < first.swung)) {
      first = { swung, against }
    }
  }
  if (first === undefined) return undefined
  const { swung, against } = first
  const shown = (swung === 0 && justClear(setup, overlap).front.pastNose) || pastNose
  const { at } = nearestPoints(swungOutline(shown, swung), setup.tools[against])
  return { front: swungFront(setup, swung), swung, at, against }
}

const pieceAtItself = (setup: FoldSetup, overlap: Overlap | null): Met | undefined => {
  const swung = firstContact(
    (swing) =>
      meetsSwinging(setup.front.outline, setup.rear.outline, swing, setup.piece.thickness, true),
    setup.swing,
  )
  if (swung === undefined) return undefined
  const shown = swung === 0 ? justClear(setup, overlap) : setup
  const front = swungOutline(shown.front.outline, swung)
  const { at } = nearestPoints(front, shown.rear.outline, true)
  return { front: swungFront(setup, swung), swung, at, against: 'piece' }
}

const apronAtRear = (setup: FoldSetup, overlap: Overlap | null): Met | undefined => {
  const { apron } = setup.tools
  const swung = firstContact(
    (swing) => meetsSwinging(apron, setup.rear.outline, swing, setup.clearance),
    setup.swing,
  )
  if (swung === undefined) return undefined
  const { rear } = swung === 0 ? justClear(setup, overlap) : setup
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

const metBy = (check: PlanCheck, setup: FoldSetup, overlap: Overlap | null): Met | undefined => {
  switch (check) {
    case 'rearMeetsTool':
      return rearAtTool(setup, overlap)
    case 'frontMeetsTool':
      return frontAtTool(setup, overlap)
    case 'meetsItself':
      return pieceAtItself(setup, overlap)
    case 'apronMeetsRear':
      return apronAtRear(setup, overlap)
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
export const contactOf = (
  setup: FoldSetup,
  check: PlanCheck,
  overlap: Overlap | null,
): Contact | null => {
  const met = metBy(check, setup, overlap)
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
