import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { distance, vector } from '#shared/geometry/vector'
import { centerLine } from '#shared/strip/center-line'
import { foldedSection } from '#shared/strip/folded-section'
import { foldableArbitrary } from '../../support/arbitrary-end'
import { closedHem, profileOf, STEEL } from '../../support/arbitrary-profile'
import { naiveMarkPoints } from '../../support/naive-ends'

const T = STEEL.thickness
const R = STEEL.insideRadius

describe('the section on the middle of the sheet', () => {
  it('has the marks that complex numbers give, however it lies', () => {
    fc.assert(
      fc.property(
        foldableArbitrary,
        fc.double({ min: -360, max: 360, noNaN: true }),
        ({ profile, sheet }, lay) => {
          const { marks } = centerLine(profile, sheet, lay)
          const wanted = naiveMarkPoints(profile, sheet, lay)
          expect(marks).toHaveLength(wanted.length)
          marks.forEach((mark, index) => {
            const point = wanted[index]
            expect(distance(mark, vector(point?.re ?? NaN, point?.im ?? NaN))).toBeLessThan(1e-9)
          })
        },
      ),
    )
  })

  it('has its bends where the folded section’s middle lines meet, half a thickness on at a hem', () => {
    fc.assert(
      fc.property(foldableArbitrary, ({ profile, sheet }) => {
        const folded = foldedSection(profile, sheet)
        const { marks } = centerLine(profile, sheet)
        // With a hem at A the folded section begins at the outermost face, T/2 before its middle.
        const shift = profile.hemA ? sheet.thickness / 2 : 0
        folded.bends.forEach(({ bend, corner, turn }) => {
          if (Math.abs(turn) > 178) return
          const mark = marks[profile.hemA ? bend + 1 : bend]
          expect(mark && distance(corner, vector(mark.x + shift, mark.y))).toBeLessThan(1e-6)
        })
      }),
    )
  })

  it('runs a leg to its sharp corners', () => {
    const { runs } = centerLine(profileOf([4, 6], [-90]), STEEL)
    expect(runs.map(({ of }) => of)).toEqual([1, 2])
    expect(runs[0]?.to.x).toBeCloseTo(4 - T / 2, 12)
    expect(runs[1]?.to.y).toBeCloseTo(-(6 - T / 2), 12)
    const wide = centerLine(profileOf([4, 6], [-120]), STEEL)
    expect(wide.runs[0]?.to.x).toBeCloseTo(4 - (R + T) + (R + T / 2) * Math.tan(Math.PI / 3), 12)
  })

  it('lays a closed hem’s lip on its leg, one thickness apart, on the side it turns to', () => {
    const hems = { hemA: closedHem(0.5, 1), hemB: closedHem(0.75, -1) }
    const { runs, marks } = centerLine(profileOf([4], [], hems), STEEL)
    const [lipA, leg, lipB] = runs
    expect(leg?.from).toEqual({ x: 0, y: 0 })
    expect(lipA?.to.y).toBeCloseTo(T, 12)
    expect(lipA?.from.x).toBeCloseTo(0.5 - T / 2, 12)
    expect(lipB?.from.y).toBeCloseTo(-T, 12)
    expect((leg?.to.x ?? NaN) - (lipB?.to.x ?? NaN)).toBeCloseTo(0.75 - T / 2, 12)
    // The fold's mark is the middle of its arc.
    expect(marks[1]?.y).toBeCloseTo(T / 2, 12)
  })

  it('turns about its start by its lay', () => {
    const { runs } = centerLine(profileOf([4, 6], [-90]), STEEL, 30)
    expect(runs[0]?.to.y).toBeCloseTo((4 - T / 2) / 2, 12)
  })

  it('knows no profile without legs', () => {
    expect(() => centerLine({ ...profileOf([]), bends: [] }, STEEL)).toThrow(RangeError)
  })
})
