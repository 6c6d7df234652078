import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { BendShape } from '#shared/strip/bend-allowance'
import { bendAllowance, outsideSetback } from '#shared/strip/bend-allowance'
import type { Fold } from '#shared/strip/strip.schema'
import type { Degrees, Inches } from '#shared/units/brands'

/** What unfolding needs to know of a sheet. */
export type FoldingSheet = Pick<Sheet, 'thickness' | 'insideRadius' | 'kFactor'>

/** A flat run of the sheet between two bend zones, or between a zone and an edge. */
export interface FlatRun {
  /** Leg number from 1 at edge A, or a hem's lip. */
  readonly of: number | 'lipA' | 'lipB'
  /** The outside dimension it comes from. */
  readonly outside: Inches
  /** What is left of it between the bend zones; negative where the bends eat more than there is. */
  readonly straight: Inches
}

export interface FlatFold extends BendShape {
  readonly fold: Fold
  readonly allowance: Inches
  readonly setback: Inches
}

/** The strip from edge A to edge B: run, fold, run, fold … run. */
export interface FlatParts {
  readonly runs: readonly FlatRun[]
  readonly folds: readonly FlatFold[]
}

/**
 * The inside radius of a hem's fold in inches. A closed hem is folded on itself; an open one
 * goes round its gap.
 */
export const hemRadius = (hem: Hem): Inches => (hem.style === 'closed' ? 0 : hem.gap / 2)

const flatFold = (
  fold: Fold,
  turn: Degrees,
  insideRadius: Inches,
  thickness: Inches,
  kFactor: number,
): FlatFold => {
  const bend = { turn, insideRadius, thickness, kFactor }
  return {
    turn,
    insideRadius,
    thickness,
    kFactor,
    fold,
    allowance: bendAllowance(bend),
    setback: outsideSetback(bend),
  }
}

/**
 * A hem counts as a bend of 180 towards its lip. A closed one has K = 0.5, which gives the shop's
 * old rule by itself: 2 T - π T / 2 = 0.43 T off the sum.
 */
const hemFold = (fold: 'hemA' | 'hemB', hem: Hem, sheet: FoldingSheet): FlatFold =>
  flatFold(
    fold,
    180 * hem.turn,
    hemRadius(hem),
    sheet.thickness,
    hem.style === 'closed' ? 0.5 : sheet.kFactor,
  )

/**
 * Cuts a profile into its flat runs and bend zones, from edge A to edge B. Each outside dimension
 * loses the setback of the fold at either end; a hem's lip has one fold, a leg with a hem has the
 * hem's fold at that end. Sign conventions are the profile's: a positive turn goes left.
 *
 * Nothing is checked here: a profile that cannot be made gives runs with a negative `straight`,
 * which `profileProblems` reports.
 */
export const flatParts = (profile: Profile, sheet: FoldingSheet): FlatParts => {
  const { hemA, hemB, legs, bends } = profile
  const { thickness, insideRadius, kFactor } = sheet
  // Asked for while a finger drags a corner: plain loops, nothing made that is not kept.
  const folds: FlatFold[] = []
  if (hemA) folds.push(hemFold('hemA', hemA, sheet))
  bends.forEach(({ turn }, index) => {
    folds.push(flatFold(index + 1, turn, insideRadius, thickness, kFactor))
  })
  if (hemB) folds.push(hemFold('hemB', hemB, sheet))

  const runs: FlatRun[] = []
  const addRun = (of: FlatRun['of'], outside: Inches) => {
    const before = folds[runs.length - 1]?.setback ?? 0
    const after = folds[runs.length]?.setback ?? 0
    runs.push({ of, outside, straight: outside - before - after })
  }
  if (hemA) addRun('lipA', hemA.length)
  legs.forEach((outside, index) => addRun(index + 1, outside))
  if (hemB) addRun('lipB', hemB.length)
  return { runs, folds }
}
