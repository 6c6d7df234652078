import { distance } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import type { Inches } from '#shared/units/brands'
import { cutStart, sheetOutline } from '../collision/outline'
import type { FoldSetup } from '../fold-setup'
import type { SideShape } from '../side-shapes'

/** Which chain of a fold. */
export type Place = 'front' | 'rear'

/** Length of a run of points. */
export const runLength = (points: readonly Vector[]): Inches =>
  points.reduce((sum, point, i) => sum + distance(points[i - 1] ?? point, point), 0)

/** The chain without its last inches, at the end away from the bend line. Throws RangeError where none is left. */
export const cutSide = ({ chain }: SideShape, cut: Inches, noseZone: Inches): SideShape => {
  const points = cutStart(chain.points.toReversed(), cut)?.toReversed()
  if (points === undefined) throw new RangeError(`A chain has no ${cut} in. to cut off.`)
  const pastNose = cutStart(points, noseZone)
  return {
    chain: {
      points,
      firstRun: Math.min(chain.firstRun, runLength(points)),
      developed: chain.developed - cut,
    },
    outline: sheetOutline(points),
    pastNose: pastNose && sheetOutline(pastNose),
  }
}

/** The same fold with the outer end of one chain cut off. Throws RangeError where nothing is left of it. */
export const cutSetup = (setup: FoldSetup, place: Place, cut: Inches): FoldSetup => {
  const { piece, brake, clearance, made, bend, orientation, direction, swing } = setup
  const side = cutSide(setup[place], cut, brake.noseZone)
  return {
    piece,
    brake,
    clearance,
    made,
    bend,
    orientation,
    direction,
    swing,
    get tools() {
      return setup.tools
    },
    front: place === 'front' ? side : setup.front,
    rear: place === 'rear' ? side : setup.rear,
  }
}
