import { describe, expect, it } from 'vitest'
import { heightOf } from '#shared/geometry/bounds'
import { profileCorners } from '#shared/profile/corners'
import { foldedSection } from '#shared/strip/folded-section'
import { profileOf, STEEL } from '../../support/arbitrary-profile'

const toEighth = (length: number): number => Math.round(length * 8) / 8

/** Rules of the trade: common practice, no source. */
describe('a kick of 1/2 in. turned by 45 degrees (common practice, no source)', () => {
  const face = profileOf([4, 0.5], [45])

  it('stands off the face 3/8 in. to the nearest 1/8, drawn', () => {
    const edge = profileCorners(face).at(-1)
    expect(edge?.y).toBeCloseTo(0.5 * Math.SQRT1_2, 12)
    expect(toEighth(edge?.y ?? NaN)).toBe(3 / 8)
  })

  it('and folded of 24 ga sheet, from face to outermost point', () => {
    const { bounds } = foldedSection(face, STEEL)
    expect(toEighth(heightOf(bounds))).toBe(3 / 8)
  })

  it('so that marking 1/2 in. leaves a gap of 1/8 in.', () => {
    const edge = profileCorners(face).at(-1)
    expect(0.5 - toEighth(edge?.y ?? NaN)).toBe(1 / 8)
  })
})
