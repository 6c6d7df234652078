import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { mirrorProfile } from '#shared/profile/flips'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import type { ColorSide, Profile } from '#shared/profile/profile.schema'
import type { LimitingStock } from '#shared/profile/stock-limits'
import { stockLimits } from '#shared/profile/stock-limits'
import type { Metal } from '#shared/stock/stock.schema'
import { closedHem, profileArbitrary, profileOf, STEEL } from '../../support/arbitrary-profile'

/** The radius is 0.03, the thickness 0.024 in. */
const warnings = (profile: Profile, stock: Partial<LimitingStock>) =>
  profileProblems(profile, STEEL, stockLimits({ sheet: STEEL, ...stock })).map(
    ({ code, bend, hem, found, limit }) => ({ code, at: bend ?? hem, found, limit }),
  )

const sheetOf = (metal: Metal, thickness: number) => ({ metal, thickness })

describe('what a stock limits', () => {
  it('is nothing where nothing is known of it', () => {
    expect(stockLimits({ sheet: STEEL })).toEqual({})
    expect(stockLimits({ sheet: STEEL, alloy: null, paintTBend: null })).toEqual({})
  })

  it('is its widest strip, the radius of its alloy, and half its T-bend for the paint', () => {
    // Aluminum Association: 5052-H34, 1/16 in., 1.5 thicknesses.
    expect(
      stockLimits({
        sheet: sheetOf('aluminum', 1 / 16),
        widestStrip: 48,
        painted: true,
        paintTBend: 3,
        alloy: '5052-H34',
      }),
    ).toEqual({ widestStrip: 48, metalRadius: 1.5 / 16, paintRadius: 1.5 / 16 })
  })

  it('finds an alloy however it is written, and only for its own metal', () => {
    const sheet = sheetOf('aluminum', 1 / 16)
    for (const alloy of ['5052-H34', '5052 h34', '5052H34']) {
      expect(stockLimits({ sheet, alloy })).toEqual({ metalRadius: 1.5 / 16 })
    }
    for (const alloy of ['Rm 390', '6063-T5', 'toString', '']) {
      expect(stockLimits({ sheet, alloy })).toEqual({})
    }
    // DIN 6935: 1 mm at up to 1 mm of thickness and 390 N/mm².
    expect(stockLimits({ sheet: STEEL, alloy: 'Rm390' }).metalRadius).toBeCloseTo(1 / 25.4, 12)
  })

  it('leaves the paint out where there is none', () => {
    expect(stockLimits({ sheet: STEEL, painted: false, paintTBend: 2 })).toEqual({})
  })
})

describe('a radius below what the metal bears', () => {
  const bent = profileOf([3, 2], [90])

  it('is a warning with both radii, and the table outranks the rule of thumb', () => {
    expect(warnings(bent, { alloy: 'Rm 390' })).toMatchObject([
      { code: 'radiusBelowMetal', at: null, found: 0.03 },
    ])
    const sharp = { ...STEEL, metal: 'aluminum' as const, insideRadius: 0, thickness: 1 / 32 }
    const codesOf = (alloy: string | null) =>
      profileProblems(bent, sharp, stockLimits({ sheet: sharp, alloy })).map(({ code }) => code)
    expect(codesOf(null)).toEqual(['radiusTight'])
    expect(codesOf('3003-H14')).toEqual([])
    expect(codesOf('3105-H25')).toEqual(['radiusBelowMetal'])
  })

  it('concerns nobody who bends nothing', () => {
    expect(warnings(profileOf([3]), { alloy: 'Rm 390' })).toEqual([])
  })
})

describe('paint', () => {
  const coping = (colorSide: ColorSide) =>
    profileOf([2, 3, 2], [90, -90], {
      hemA: closedHem(0.5, 1),
      hemB: closedHem(0.5, -1),
      colorSide,
    })
  /** 3T asks for 0.036 in. */
  const paint = { paintTBend: 3 }
  const placesOf = (colorSide: ColorSide, stock: Partial<LimitingStock> = paint) =>
    warnings(coping(colorSide), stock).map(({ at }) => at)

  it('is stretched where it lies outside the fold, and only there', () => {
    expect(placesOf('left')).toEqual([2, 'B'])
    expect(placesOf('right')).toEqual([1, 'A'])
    expect(placesOf('both')).toEqual([1, 2, 'A', 'B'])
    expect(placesOf('none')).toEqual([])
  })

  it('is told with the radius it has and the one it bears; a closed hem has none', () => {
    expect(warnings(coping('left'), paint)).toEqual([
      { code: 'radiusBelowPaint', at: 2, found: 0.03, limit: (3 * 0.024) / 2 },
      { code: 'hemBelowPaint', at: 'B', found: 0, limit: (3 * 0.024) / 2 },
    ])
  })

  it('of 2T bears the bends, not a closed hem; one of 0T bears both', () => {
    expect(placesOf('left', { paintTBend: 2 })).toEqual(['B'])
    expect(placesOf('left', { paintTBend: 0 })).toEqual([])
  })

  it('bears an open hem round a gap of its T-bend', () => {
    const open = (gap: number) =>
      profileOf([3], [], { hemB: { style: 'open', length: 0.5, gap, turn: -1 } })
    expect(warnings(open(0.072), paint)).toEqual([])
    expect(warnings(open(0.0625), paint)).toMatchObject([{ code: 'hemBelowPaint', found: 0.03125 }])
  })

  it('is stretched alike in the mirror with the color on the other side, and never refuses', () => {
    fc.assert(
      fc.property(profileArbitrary, (profile) => {
        const before = warnings(profile, paint)
        expect(warnings(mirrorProfile(profile), paint)).toEqual(before)
        const sound = profileProblems(profile, STEEL)
        fc.pre(!hasErrors(sound))
        expect(hasErrors(profileProblems(profile, STEEL, { paintRadius: 1 }))).toBe(false)
      }),
    )
  })
})
