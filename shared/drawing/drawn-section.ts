import { radians, vector } from '#shared/geometry/vector'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { FlatFold, FlatParts } from '#shared/strip/flat-parts'
import type { WalkedPart } from '#shared/strip/section-walk'
import { walkSection } from '#shared/strip/section-walk'
import type { Pen } from './pen'
import { halfWeight } from './pen'

/** How far the tip of a sharp fold may be drawn short of its true place, in pixels. */
const TIP_LOSS = 3

/** Share of a straight part that the drawn roundings at its two ends may take. */
const ROUNDING_SHARE = 0.9

const isHem = (fold: FlatFold): boolean => typeof fold.fold !== 'number'

/** What the rounding takes from a straight part for each unit of radius. */
const reachOf = (fold: FlatFold): number =>
  isHem(fold) ? 1 : Math.tan(radians(Math.abs(fold.turn)) / 2)

/** True where the color lies inside the fold, so that the fold must leave room for it. */
const hasColorInside = (fold: FlatFold, profile: Profile): boolean =>
  profile.colorSide === 'both' || profile.colorSide === (fold.turn > 0 ? 'left' : 'right')

const bendRadius = (fold: FlatFold, pen: Pen, trueRadius: number): number => {
  const wanted = halfWeight(pen) + 1
  const loss = 1 / Math.cos(radians(Math.abs(fold.turn)) / 2) - 1
  return Math.min(wanted, trueRadius + TIP_LOSS / Math.max(loss, 1e-6))
}

const hemRadiusDrawn = (fold: FlatFold, profile: Profile, pen: Pen): number => {
  const band = hasColorInside(fold, profile) ? pen.paint : pen.bare
  const air = fold.insideRadius > 0 ? pen.metal * 1.2 + 2 : 1.2
  return (pen.metal + 2 * band + air) / 2
}

/**
 * The middle line of the sheet as it is drawn at `scale` pixels an inch, in inches in the frame of
 * `foldedSection`. `parts` are the profile's own, of `flatParts`. Drawing conventions: legs and
 * corners are where they truly are; bends are rounded as far as the pen's weight needs, never less
 * than they are; a hem is opened as far as its lip can be told from its leg, and only the lip moves
 * for that.
 *
 * Draws drafts too: a leg that its bends use up is drawn without length.
 */
export const drawnSection = (
  profile: Profile,
  parts: FlatParts,
  sheet: Pick<Sheet, 'thickness'>,
  scale: number,
  pen: Pen,
): WalkedPart[] => {
  const radii = parts.folds.map((fold) => fold.insideRadius + sheet.thickness / 2)
  const extra = parts.folds.map((fold, index) => {
    const radius = radii[index] ?? 0
    const wanted = isHem(fold)
      ? hemRadiusDrawn(fold, profile, pen)
      : bendRadius(fold, pen, radius * scale)
    return Math.max(0, wanted / scale - radius)
  })
  const fitted = fitRoundings(parts, extra)
  const taken = (index: number) => {
    const fold = parts.folds[index]
    return fold === undefined ? 0 : (fitted[index] ?? 0) * reachOf(fold)
  }
  const leg1 = parts.runs.findIndex((run) => run.of === 1)
  const begin = (parts.folds[leg1 - 1]?.setback ?? 0) + taken(leg1 - 1)
  return walkSection(
    parts.runs.map((run, index) => ({
      of: run.of,
      straight: Math.max(0, run.straight) - taken(index - 1) - taken(index),
    })),
    parts.folds.map(({ fold, turn }, index) => ({
      fold,
      turn,
      radius: (radii[index] ?? 0) + (fitted[index] ?? 0),
    })),
    vector(begin, 0),
  )
}

/** Roundings cut back so that no straight part becomes negative. */
const fitRoundings = ({ runs, folds }: FlatParts, extra: readonly number[]): number[] => {
  const demand = folds.map((fold, index) => (extra[index] ?? 0) * reachOf(fold))
  const shares = runs.map((run, index) => {
    const wanted = (demand[index - 1] ?? 0) + (demand[index] ?? 0)
    const room = Math.max(0, run.straight) * ROUNDING_SHARE
    return wanted > room ? room / wanted : 1
  })
  return extra.map((value, index) => value * Math.min(shares[index] ?? 1, shares[index + 1] ?? 1))
}
