import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { heightOf, widthOf } from '#shared/geometry/bounds'
import { areaOf, centroidOf } from '#shared/geometry/polyline'
import { distance, radians } from '#shared/geometry/vector'
import { mirrorProfile } from '#shared/profile/flips'
import { flatParts } from '#shared/strip/flat-parts'
import { flatStrip } from '#shared/strip/flat-strip'
import { foldedSection } from '#shared/strip/folded-section'
import {
  closedHem,
  profileArbitrary,
  profileOf,
  sheetArbitrary,
  STEEL,
} from '../../support/arbitrary-profile'

const CASES = { seed: 20_260_801, numRuns: 150 }

const T = STEEL.thickness

const makeable = fc
  .tuple(profileArbitrary, sheetArbitrary)
  .filter(([profile, sheet]) => flatParts(profile, sheet).runs.every((run) => run.straight > 0))

describe('outside dimensions, measured on the folded piece', () => {
  it.each([
    ['a right angle', [4, 3], [90], 4, 3],
    ['a channel', [2, 5, 2], [90, 90], 2, 5],
    ['a channel folded the other way', [2, 5, 2], [-90, -90], 2, 5],
    ['a Z', [1, 1.5, 1], [90, -90], 2 - T, 1.5],
  ])('%s', (_, legs, turns, width, height) => {
    const { bounds } = foldedSection(profileOf(legs, turns), STEEL)
    expect(widthOf(bounds)).toBeCloseTo(width, 9)
    expect(heightOf(bounds)).toBeCloseTo(height, 9)
  })

  it('runs to the outermost tangent of a fold over 90 degrees', () => {
    const { bounds } = foldedSection(profileOf([4, 2], [135]), STEEL)
    expect(bounds.minX).toBeCloseTo(0, 9)
    // The outermost point of the arc is a corner of its chords to within half a thousandth.
    expect(bounds.maxX).toBeGreaterThan(4 - 0.0005)
    expect(bounds.maxX).toBeLessThanOrEqual(4 + 1e-9)
  })

  it('reaches to the outside of a closed hem, two sheets thick', () => {
    const { bounds, hems } = foldedSection(profileOf([4], [], { hemB: closedHem(0.5, 1) }), STEEL)
    expect(bounds.maxX).toBeCloseTo(4, 3)
    expect(heightOf(bounds)).toBeCloseTo(2 * T, 9)
    expect(hems.B?.lipTo.x).toBeCloseTo(4 - 0.5, 9)
    expect(hems.B?.lipTo.y).toBeCloseTo(T, 9)
    expect(hems.A).toBeNull()
  })

  it('opens an open hem by its gap, and begins leg 1 at the outside of hem A', () => {
    const hemA = { style: 'open', length: 0.75, gap: 0.25, turn: -1 } as const
    const { bounds, edges } = foldedSection(profileOf([4], [], { hemA }), STEEL)
    expect(bounds.minX).toBeCloseTo(0, 3)
    expect(bounds.maxX).toBeCloseTo(4, 9)
    expect(heightOf(bounds)).toBeCloseTo(0.25 + 2 * T, 9)
    expect(edges.A.y).toBeCloseTo(-0.25 - T, 9)
  })
})

describe('the outline', () => {
  it('encloses the metal of its straight parts and bends', () => {
    const { outline } = foldedSection(profileOf([4, 3], [90]), STEEL)
    const { insideRadius: R } = STEEL
    const straight = (4 - R - T + 3 - R - T) * T
    const bend = (Math.PI / 4) * ((R + T) ** 2 - R ** 2)
    expect(Math.abs(areaOf(outline))).toBeCloseTo(straight + bend, 4)
  })

  it('has its centroid on the mirror line of an even angle', () => {
    const { outline } = foldedSection(profileOf([4, 4], [90]), STEEL)
    const centroid = centroidOf(outline)
    // The mirror line runs through the outside corner (4, -T/2) at 135 degrees.
    expect(centroid.x - 4).toBeCloseTo(0 - (centroid.y + T / 2), 9)
  })

  it('mirrors with the profile', () => {
    fc.assert(
      fc.property(makeable, ([profile, sheet]) => {
        const { leftFace } = foldedSection(profile, sheet)
        const { rightFace } = foldedSection(mirrorProfile(profile), sheet)
        expect(rightFace).toHaveLength(leftFace.length)
        rightFace.forEach((point, index) => {
          expect(point.x).toBeCloseTo(leftFace[index]?.x ?? NaN, 7)
          expect(point.y).toBeCloseTo(0 - (leftFace[index]?.y ?? NaN), 7)
        })
      }),
      CASES,
    )
  })
})

describe('unfolding', () => {
  it('gives the strip width back: straight parts and arcs of the neutral axis', () => {
    fc.assert(
      fc.property(makeable, ([profile, sheet]) => {
        const { legs, bends, hems } = foldedSection(profile, sheet)
        const half = sheet.thickness / 2
        const straight = legs.reduce((sum, leg) => sum + distance(leg.from, leg.to), 0)
        const round = bends.reduce((sum, { turn, center, mid }) => {
          const inside = distance(center, mid) - half
          return sum + radians(Math.abs(turn)) * (inside + sheet.kFactor * sheet.thickness)
        }, 0)
        const lips = (['A', 'B'] as const).reduce((sum, edge) => {
          const hem = edge === 'A' ? profile.hemA : profile.hemB
          const folded = hems[edge]
          if (hem === null || folded === null) return sum
          const inside = hem.style === 'open' ? hem.gap / 2 : 0
          const neutral = (hem.style === 'open' ? sheet.kFactor : 0.5) * sheet.thickness
          return sum + distance(folded.lipFrom, folded.lipTo) + Math.PI * (inside + neutral)
        }, 0)
        expect(straight + round + lips).toBeCloseTo(flatStrip(profile, sheet).stripWidth, 6)
      }),
      CASES,
    )
  })

  it('refuses a leg shorter than its bends use up', () => {
    expect(() => foldedSection(profileOf([4, 0.05, 4], [90, 90]), STEEL)).toThrow(RangeError)
  })
})
