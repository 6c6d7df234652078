import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { includedFromRoof } from '#shared/profile/follows'
import type { RoofCorner } from '#shared/roof-line/roof-slopes'
import {
  angleBetweenPlanes,
  backingAngle,
  bendOverPlanes,
  hipLengthFactor,
  hipPitch,
  hipPlanAngle,
  rakeFactor,
  rakeLength,
  squareCorner,
} from '#shared/roof-line/roof-slopes'
import { pitchAngle } from '#shared/units/angle'
import { expectPrinted, publishedRows } from '../../support/published-values'

const rafters = publishedRows('rafters.csv').map((row) => ({
  rise: row.number('rise_per_12'),
  row,
}))

describe('framing square tables', () => {
  it.each(rafters)('$rise in 12: degrees, common and hip lengths, hip factor', ({ rise, row }) => {
    const slope = pitchAngle(rise)
    expectPrinted(slope, row.text('pitch_deg'))
    expectPrinted(rakeFactor(slope) * 12, row.text('common_in_per_ft_run'))
    const factor = hipLengthFactor(squareCorner(slope))
    expectPrinted(factor * 12, row.text('hip_valley_in_per_ft_common_run'))
    // Some tables print 1.4362 for 3 in 12 and 1.4529 for 4 in 12: misprints, not carried.
    expectPrinted(factor, row.text('hip_valley_factor'))
  })

  it.each(rafters)(
    '$rise in 12: hip pitch and angle between the planes (derived)',
    ({ rise, row }) => {
      const corner = squareCorner(pitchAngle(rise))
      expectPrinted(hipPitch(corner), row.text('hip_pitch_deg'))
      expectPrinted(angleBetweenPlanes(corner), row.text('hip_dihedral_deg'))
      expectPrinted(bendOverPlanes(corner), row.text('valley_flat_bend_deg'))
    },
  )

  it.each([
    [13, '17.69'],
    [16, '20.00'],
  ])('%s in 12, US Army course figure 2-14: common %s in. per foot', (rise, printed) => {
    expectPrinted(rakeFactor(pitchAngle(rise)) * 12, printed)
  })
})

describe('worked roofs', () => {
  it('Griffith, Carpentry: span 25 ft, quarter pitch, 167.75 in. = 13.98 ft', () => {
    // The book multiplies by 13.42, which is cut to two places: up to half a hundredth a foot.
    const rafter = rakeLength(12.5 * 12, pitchAngle(6))
    expect(Math.abs(rafter - 167.75)).toBeLessThanOrEqual(12.5 * 0.005)
    expectPrinted(12.5 * 13.42, '167.75')
    expectPrinted(rafter / 12, '13.98')
  })

  it('Navy Builder manual: hip of 8 in 12 over 15 ft of common run, 23.45 ft; its run 21.21, rise 10', () => {
    const corner = squareCorner(pitchAngle(8))
    const hip = hipLengthFactor(corner) * 15
    expectPrinted(hip, '23.45')
    const pitch = (hipPitch(corner) * Math.PI) / 180
    expectPrinted(hip * Math.cos(pitch), '21.21')
    expectPrinted(hip * Math.sin(pitch), '10')
  })

  it('Bartok: octagon, 8 in 12, plan angle 67.5, hip pitch 31.62973 degrees', () => {
    const octagon = { ...squareCorner(pitchAngle(8)), planTurn: 45 }
    expect(hipPlanAngle(octagon)).toBeCloseTo(67.5, 9)
    expectPrinted(hipPitch(octagon), '31.62973')
  })

  it('Bartok: valley of 10 in 12 and 13 in 12, pitch 33.44556 degrees', () => {
    const valley = { slope: pitchAngle(10), otherSlope: pitchAngle(13), planTurn: 90 }
    expectPrinted(hipPitch(valley), '33.44556')
  })
})

describe('angle between two planes (derived)', () => {
  it.each([
    [4, '25.84'],
    [6, '36.87'],
    [8, '46.19'],
    [12, '60.00'],
  ])('%s in 12 both, square corner: a flat piece is bent %s degrees', (rise, printed) => {
    const corner = squareCorner(pitchAngle(rise))
    expectPrinted(bendOverPlanes(corner), printed)
    expect(bendOverPlanes(corner)).toBeCloseTo(2 * backingAngle(corner), 9)
  })
})

const slope = fc.double({ min: 1, max: 80, noNaN: true })
const cornerArbitrary: fc.Arbitrary<RoofCorner> = fc.record({
  slope,
  otherSlope: slope,
  planTurn: fc.double({ min: 10, max: 170, noNaN: true }),
})
const otherSide = ({ slope, otherSlope, planTurn }: RoofCorner): RoofCorner => ({
  slope: otherSlope,
  otherSlope: slope,
  planTurn,
})

describe('a corner of any slopes and plan angle', () => {
  it('has one pitch, one bend and backing angles that add up to the bend', () => {
    fc.assert(
      fc.property(cornerArbitrary, (corner) => {
        const other = otherSide(corner)
        expect(hipPitch(other)).toBeCloseTo(hipPitch(corner), 8)
        expect(bendOverPlanes(other)).toBeCloseTo(bendOverPlanes(corner), 8)
        expect(backingAngle(corner) + backingAngle(other)).toBeCloseTo(bendOverPlanes(corner), 8)
        expect(hipPlanAngle(corner) + hipPlanAngle(other)).toBeCloseTo(180 - corner.planTurn, 8)
        expect(bendOverPlanes({ ...corner, planTurn: 0 - corner.planTurn })).toBe(
          bendOverPlanes(corner),
        )
      }),
    )
  })

  it('has a hip that rises as both its planes do', () => {
    fc.assert(
      fc.property(cornerArbitrary, (corner) => {
        const tan = (angle: number) => Math.tan((angle * Math.PI) / 180)
        const sin = (angle: number) => Math.sin((angle * Math.PI) / 180)
        // A plane rises by its slope for what the hip goes away from its eave.
        const rise = tan(corner.slope) * sin(hipPlanAngle(corner))
        const otherRise = tan(corner.otherSlope) * sin(hipPlanAngle(otherSide(corner)))
        expect(rise).toBeCloseTo(tan(hipPitch(corner)), 8)
        expect(otherRise).toBeCloseTo(rise, 8)
        const perRun = Math.hypot(1, tan(hipPitch(corner))) / sin(hipPlanAngle(corner))
        expect(hipLengthFactor(corner) / perRun).toBeCloseTo(1, 8)
      }),
    )
  })

  it('bends as the ridge and transition rules of a profile do, where it turns by 180 or not at all', () => {
    fc.assert(
      fc.property(slope, slope, (a, b) => {
        const corner = { slope: a, otherSlope: b, planTurn: 180 }
        const ridge = includedFromRoof({ rule: 'ridge', pitch: a, second: b }, null)
        expect(180 - bendOverPlanes(corner)).toBeCloseTo(180 - a - b, 8)
        expect(ridge).toBeCloseTo(180 - a - b, 8)
        const transition = includedFromRoof({ rule: 'transition', pitch: a, second: b }, null)
        expect(angleBetweenPlanes({ ...corner, planTurn: 0 })).toBeCloseTo(transition ?? NaN, 8)
      }),
    )
  })
})

describe('what is no roof', () => {
  it.each([
    [{ ...squareCorner(90) }, /slope/],
    [{ ...squareCorner(30), otherSlope: -1 }, /otherSlope/],
    [{ ...squareCorner(30), slope: NaN }, /slope/],
    [{ ...squareCorner(30), planTurn: 181 }, /planTurn/],
    [{ ...squareCorner(30), planTurn: 0 }, /one plane/],
    [{ ...squareCorner(0) }, /one plane/],
  ])('%o is refused and named', (corner, named) => {
    expect(() => hipPitch(corner)).toThrow(named)
  })

  it('a ridge has no length for a common run', () => {
    expect(() => hipLengthFactor({ ...squareCorner(30), planTurn: 180 })).toThrow(/planTurn/)
    expect(hipPitch({ ...squareCorner(30), planTurn: 180 })).toBeCloseTo(0, 9)
  })

  it('a rake up a wall has no length', () => {
    expect(() => rakeLength(120, 90)).toThrow(/slope/)
  })
})
