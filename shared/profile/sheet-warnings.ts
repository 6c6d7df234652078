import { isLess } from '#shared/geometry/tolerance'
import type { ProfileProblem } from '#shared/profile/problem'
import { profileProblem } from '#shared/profile/problem'
import type { ProfileLimits } from '#shared/profile/problems'
import type { ColorSide, Profile } from '#shared/profile/profile.schema'
import type { FoldingSheet } from '#shared/strip/flat-parts'
import { hemRadius } from '#shared/strip/flat-parts'
import type { Degrees, Inches } from '#shared/units/brands'

const EDGES = ['A', 'B'] as const

const hemAt = (profile: Profile, edge: 'A' | 'B') => (edge === 'A' ? profile.hemA : profile.hemB)

/** The least gap of an open hem is the sheet itself. */
const gapWarnings = (profile: Profile, thickness: Inches): ProfileProblem[] =>
  EDGES.flatMap((hem) => {
    const lip = hemAt(profile, hem)
    return lip?.style === 'open' && isLess(lip.gap, thickness)
      ? [
          profileProblem({
            code: 'gapTight',
            severity: 'warning',
            cure: 'closeHem',
            hem,
            found: lip.gap,
            limit: thickness,
          }),
        ]
      : []
  })

/** All bends have the sheet's radius; what the alloy is known to bear outranks the rule of thumb. */
const metalWarnings = (
  { insideRadius, thickness }: FoldingSheet,
  metalRadius: Inches | undefined,
): ProfileProblem[] => {
  const limit = metalRadius ?? thickness / 2
  if (!isLess(insideRadius, limit)) return []
  const values = { severity: 'warning', found: insideRadius, limit } as const
  return [
    metalRadius === undefined
      ? profileProblem({ code: 'radiusTight', cure: 'softerRadius', ...values })
      : profileProblem({ code: 'radiusBelowMetal', cure: 'softerMetal', ...values }),
  ]
}

/** A fold stretches the face on its outside: the right one where it turns left. */
const stretchesPaint = (colorSide: ColorSide, turn: Degrees): boolean =>
  colorSide === 'both' || colorSide === (turn > 0 ? 'right' : 'left')

/** A paint's rating is that of a fold with the paint outside; inside it is pressed together. */
const paintWarnings = (
  { bends, hemA, hemB, colorSide }: Profile,
  { insideRadius }: FoldingSheet,
  limit: Inches,
): ProfileProblem[] => {
  const ofBends = isLess(insideRadius, limit)
    ? bends.flatMap(({ turn }, index) =>
        stretchesPaint(colorSide, turn)
          ? [
              profileProblem({
                code: 'radiusBelowPaint',
                severity: 'warning',
                cure: 'softerPaint',
                bend: index + 1,
                found: insideRadius,
                limit,
              }),
            ]
          : [],
      )
    : []
  const ofHem = (hem: 'A' | 'B', lip: Profile['hemA']) =>
    lip && stretchesPaint(colorSide, lip.turn) && isLess(hemRadius(lip), limit)
      ? [
          profileProblem({
            code: 'hemBelowPaint',
            severity: 'warning',
            cure: 'openHem',
            hem,
            found: hemRadius(lip),
            limit,
          }),
        ]
      : []
  return [...ofBends, ...ofHem('A', hemA), ...ofHem('B', hemB)]
}

/**
 * What can be made but deserves a look: radii below what metal or paint bears, gaps below the
 * sheet. A closed hem is a fold of no radius (0T). The metal's limit comes from its alloy's table
 * or, where that is not known, from shop guides: T/2 ("metal-stamping-die news 400"), and for the
 * gap of an open hem T ("Open hem sheet metal").
 */
export const sheetWarnings = (
  profile: Profile,
  sheet: FoldingSheet,
  { metalRadius, paintRadius }: ProfileLimits,
): ProfileProblem[] => [
  ...(profile.bends.length > 0 ? metalWarnings(sheet, metalRadius) : []),
  ...(paintRadius === undefined ? [] : paintWarnings(profile, sheet, paintRadius)),
  ...gapWarnings(profile, sheet.thickness),
]
