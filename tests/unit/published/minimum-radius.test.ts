import { describe, expect, it } from 'vitest'
import type { AluminumAlloy, SteelStrength } from '#shared/metal/minimum-radius'
import {
  aluminumMinimumRadius,
  outerFiberStrain,
  radiusLimits,
  radiusOfTBend,
  steelMinimumRadius,
} from '#shared/metal/minimum-radius'
import { ALUMINUM_ROWS, STEEL_ROWS } from '#shared/metal/minimum-radius-table'
import { profileProblems } from '#shared/profile/problems'
import { profileOf, STEEL } from '../../support/arbitrary-profile'
import { expectPrinted, publishedRows } from '../../support/published-values'

const rows = publishedRows('min-bend-radius.csv').map((row) => ({
  material: row.text('material'),
  thickness: row.text('thickness'),
  least: row.number('min_inside_radius'),
  unit: row.text('unit'),
}))

const inchesOf = (fraction: string): number => {
  const [above, below] = fraction.replace(' in', '').split('/').map(Number)
  return (above ?? NaN) / (below ?? NaN)
}

const isAlloy = (name: string): name is AluminumAlloy => name in ALUMINUM_ROWS

const STRENGTHS: Record<string, SteelStrength> = {
  'steel Rm <= 390 N/mm2': 'Rm 390',
  'steel Rm 390-490 N/mm2': 'Rm 490',
}

describe('smallest inside radius of aluminum, 90 degrees cold, Aluminum Association (2005)', () => {
  const aluminum = rows.filter(({ unit }) => unit === 'x thickness')

  it.each(aluminum)(
    '$material of $thickness: $least thicknesses',
    ({ material, thickness, least }) => {
      if (!isAlloy(material)) expect.fail(`${material} is not in our table`)
      const inches = inchesOf(thickness)
      expect(aluminumMinimumRadius(material, inches)).toBeCloseTo(least * inches, 12)
    },
  )

  it('is carried whole', () => {
    const filled = Object.values(ALUMINUM_ROWS)
      .flat()
      .filter((value) => value !== null)
    expect(aluminum).toHaveLength(filled.length)
  })

  it('lies between the columns where the sheet does', () => {
    // 5052-H34: nothing at 1/64, one thickness at 1/32.
    expect(aluminumMinimumRadius('5052-H34', 3 / 128)).toBeCloseTo(0.5 * (3 / 128), 12)
  })

  it('is not known outside the columns', () => {
    expect(aluminumMinimumRadius('3003-H14', 0.0126)).toBeNull()
    expect(aluminumMinimumRadius('3003-H14', 0.126)).toBeNull()
    expect(aluminumMinimumRadius('3105-H25', 0.08)).toBeNull()
  })
})

describe('smallest inside radius of steel, DIN 6935 (1975-10), millimeters', () => {
  const steel = rows
    .filter(({ unit }) => unit === 'mm')
    .map((row) => {
      const [over, upTo] = row.thickness.replace(' mm', '').split('-').map(Number)
      return { ...row, over: over ?? NaN, upTo: upTo ?? NaN }
    })

  it.each(steel)('$material, $thickness: $least mm', ({ material, over, upTo, least }) => {
    const strength = STRENGTHS[material]
    if (strength === undefined) expect.fail(`${material} is not in our table`)
    for (const thickness of [over + 0.01, (over + upTo) / 2, upTo]) {
      expectPrinted((steelMinimumRadius(strength, thickness / 25.4) ?? NaN) * 25.4, `${least}`)
    }
  })

  it('is carried whole and not known over 6 mm', () => {
    expect(steel).toHaveLength(2 * STEEL_ROWS.length)
    expect(steelMinimumRadius('Rm 390', 6.01 / 25.4)).toBeNull()
  })
})

describe('paint, ASTM D4145: nT is a fold of inside diameter n T (derived)', () => {
  it.each([
    [0, 1],
    [1, 1 / 2],
    [2, 1 / 3],
    [3, 1 / 4],
  ])('%sT stretches the outer face by %s', (rating, strain) => {
    const radius = radiusOfTBend(rating, 0.024)
    expect(2 * radius).toBeCloseTo(rating * 0.024, 12)
    expect(outerFiberStrain(radius, 0.024)).toBeCloseTo(strain, 12)
  })

  it.each([-1, NaN, Infinity])('a rating of %s is refused', (rating) => {
    expect(() => radiusOfTBend(rating, 0.024)).toThrow(/paintTBend/)
  })
})

describe('radiusLimits', () => {
  it('name what sets them, the largest first', () => {
    expect(
      radiusLimits({ metal: 'aluminum', alloy: '3105-H25', thickness: 0.032, paintTBend: 2 }),
    ).toEqual({
      limits: [
        { reason: 'paint', least: 0.032 },
        { reason: 'metal', least: 0.016 },
      ],
      metalUnknown: null,
    })
    const steel = radiusLimits({
      metal: 'steel',
      alloy: 'Rm 390',
      thickness: 0.0276,
      paintTBend: 0,
    })
    expect(steel.limits.map(({ reason }) => reason)).toEqual(['metal', 'paint'])
    expect(steel.limits[0]?.least).toBeCloseTo(1 / 25.4, 12)
  })

  it('fall back on T / 2 of the shop guide ("metal-stamping-die news 400"), as the warning does', () => {
    const { limits } = radiusLimits({ metal: 'steel', thickness: STEEL.thickness })
    expect(limits).toEqual([{ reason: 'shopGuide', least: STEEL.thickness / 2 }])
    const sharp = { ...STEEL, insideRadius: STEEL.thickness / 2 - 0.001 }
    expect(profileProblems(profileOf([2, 2], [90]), sharp)).toMatchObject([
      { code: 'radiusTight', limit: limits[0]?.least },
    ])
  })

  it.each([
    [{ metal: 'copper', alloy: '3003-O', thickness: 0.02 }, 'alloyOfOtherMetal'],
    [{ metal: 'aluminum', alloy: 'Rm 390', thickness: 0.02 }, 'alloyOfOtherMetal'],
    [{ metal: 'aluminum', alloy: '3003-O', thickness: 0.01 }, 'thicknessOutsideTable'],
    [{ metal: 'steel', alloy: 'Rm 490', thickness: 0.3 }, 'thicknessOutsideTable'],
  ] as const)('%o say that the table was of no use: %s', (given, metalUnknown) => {
    const found = radiusLimits(given)
    expect(found.metalUnknown).toBe(metalUnknown)
    expect(found.limits).toEqual([{ reason: 'shopGuide', least: given.thickness / 2 }])
  })

  it.each([0, -1, NaN])('refuse a thickness of %s', (thickness) => {
    expect(() => radiusLimits({ metal: 'zinc', thickness })).toThrow(/thickness/)
  })
})
