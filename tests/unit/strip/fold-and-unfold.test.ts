import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Vector } from '#shared/geometry/vector'
import { distance, radians } from '#shared/geometry/vector'
import { reverseProfile } from '#shared/profile/flips'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import { bendDeduction } from '#shared/strip/bend-allowance'
import { flatParts } from '#shared/strip/flat-parts'
import { flatStrip } from '#shared/strip/flat-strip'
import type { FoldedSection } from '#shared/strip/folded-section'
import { foldedSection } from '#shared/strip/folded-section'
import { profileArbitrary, sheetArbitrary } from '../../support/arbitrary-profile'

const makeable = fc
  .tuple(profileArbitrary, sheetArbitrary)
  .filter(([profile, sheet]) => flatParts(profile, sheet).runs.every((run) => run.straight > 0))

/** The lengths met on the folded piece from edge A to edge B: straight, zone, straight … */
const unroll = (section: FoldedSection, profile: Profile, sheet: Sheet): number[] => {
  const { legs, bends, hems } = section
  const zone = (inside: number, turn: number, kFactor: number) =>
    radians(Math.abs(turn)) * (inside + kFactor * sheet.thickness)
  const hemZone = (edge: 'A' | 'B'): number => {
    const hem = edge === 'A' ? profile.hemA : profile.hemB
    return hem?.style === 'open' ? zone(hem.gap / 2, 180, sheet.kFactor) : zone(0, 180, 0.5)
  }
  const lengths: number[] = []
  if (hems.A) lengths.push(distance(hems.A.lipFrom, hems.A.lipTo), hemZone('A'))
  legs.forEach(({ from, to }, index) => {
    lengths.push(distance(from, to))
    const bend = bends[index]
    if (!bend) return
    const inside = distance(bend.center, bend.mid) - sheet.thickness / 2
    lengths.push(zone(inside, bend.turn, sheet.kFactor))
  })
  if (hems.B) lengths.push(hemZone('B'), distance(hems.B.lipFrom, hems.B.lipTo))
  return lengths
}

describe('folded and unfolded again', () => {
  it('every bend zone lies where the strip has it, and the strip ends where it ended', () => {
    fc.assert(
      fc.property(makeable, ([profile, sheet]) => {
        const { creases, stripWidth } = flatStrip(profile, sheet)
        const lengths = unroll(foldedSection(profile, sheet), profile, sheet)
        expect(lengths).toHaveLength(2 * creases.length + 1)
        let reached = 0
        lengths.forEach((length, index) => {
          if (index % 2 === 1) expect(creases[(index - 1) / 2]?.from).toBeCloseTo(reached, 8)
          reached += length
          if (index % 2 === 1) expect(creases[(index - 1) / 2]?.to).toBeCloseTo(reached, 8)
        })
        expect(stripWidth).toBeCloseTo(reached, 8)
      }),
    )
  })

  it('the drawing comes back: outside dimensions and turns, measured on the piece', () => {
    fc.assert(
      fc.property(makeable, ([profile, sheet]) => {
        const { legs } = foldedSection(profile, sheet)
        legs.forEach(({ outsideFrom, outsideTo }, index) => {
          expect(distance(outsideFrom, outsideTo)).toBeCloseTo(profile.legs[index] ?? NaN, 8)
        })
        profile.bends.forEach(({ turn }, index) => {
          const [before, after] = [legs[index]?.heading ?? NaN, legs[index + 1]?.heading ?? NaN]
          expect(after - before).toBeCloseTo(turn, 8)
        })
      }),
    )
  })

  it('a profile without errors always folds and unfolds, into figures that are numbers', () => {
    fc.assert(
      fc.property(profileArbitrary, sheetArbitrary, (profile, sheet) => {
        fc.pre(!hasErrors(profileProblems(profile, sheet)))
        const { outline, bounds } = foldedSection(profile, sheet)
        const { stripWidth, girth } = flatStrip(profile, sheet)
        expect(stripWidth).toBeGreaterThan(0)
        expect(
          [girth, bounds.minX, bounds.maxX, bounds.minY, bounds.maxY].every(Number.isFinite),
        ).toBe(true)
        expect(outline.length).toBeGreaterThanOrEqual(4)
      }),
    )
  })
})

describe('walked from edge B', () => {
  it('it is the same piece: named points as far from each other, faces changed over', () => {
    const named = ({ legs, bends, edges }: FoldedSection): Vector[] => [
      edges.A,
      ...legs.flatMap(({ from, to }) => [from, to]),
      ...bends.flatMap(({ center, mid }) => [center, mid]),
      edges.B,
    ]
    const reversedNames = ({ legs, bends, edges }: FoldedSection): Vector[] => [
      edges.B,
      ...legs.toReversed().flatMap(({ from, to }) => [to, from]),
      ...bends.toReversed().flatMap(({ center, mid }) => [center, mid]),
      edges.A,
    ]
    fc.assert(
      fc.property(makeable, ([profile, sheet]) => {
        const there = foldedSection(profile, sheet)
        const back = foldedSection(reverseProfile(profile), sheet)
        const points = named(there)
        const others = reversedNames(back)
        expect(others).toHaveLength(points.length)
        const apart = (of: readonly Vector[], a: number, b: number) => {
          const [one, two] = [of[a], of[b]]
          return one && two ? distance(one, two) : NaN
        }
        points.forEach((_, a) => {
          for (const b of [0, (a * 7 + 3) % points.length, points.length - 1]) {
            expect(apart(others, a, b)).toBeCloseTo(apart(points, a, b), 7)
          }
        })
        expect(back.leftFace).toHaveLength(there.rightFace.length)
        expect(back.rightFace).toHaveLength(there.leftFace.length)
      }),
    )
  })
})

describe('a piece made of two', () => {
  it('cut across a leg: the two strips together are the whole strip', () => {
    fc.assert(
      fc.property(
        profileArbitrary,
        sheetArbitrary,
        fc.nat(),
        fc.integer({ min: 1, max: 15 }),
        (profile, sheet, pick, sixteenths) => {
          const leg = pick % profile.legs.length
          const length = profile.legs[leg] ?? NaN
          const cut = (length * sixteenths) / 16
          const a: Profile = {
            ...profile,
            legs: [...profile.legs.slice(0, leg), cut],
            bends: profile.bends.slice(0, leg),
            hemB: null,
          }
          const b: Profile = {
            ...profile,
            legs: [length - cut, ...profile.legs.slice(leg + 1)],
            bends: profile.bends.slice(leg),
            hemA: null,
          }
          const whole = flatStrip(profile, sheet)
          const [first, second] = [flatStrip(a, sheet), flatStrip(b, sheet)]
          expect(first.stripWidth + second.stripWidth).toBeCloseTo(whole.stripWidth, 9)
          expect(first.girth + second.girth).toBeCloseTo(whole.girth, 9)
        },
      ),
    )
  })

  it('cut at a bend: the whole strip is the two less the deduction of that bend', () => {
    fc.assert(
      fc.property(profileArbitrary, sheetArbitrary, fc.nat(), (profile, sheet, pick) => {
        fc.pre(profile.bends.length > 0)
        const at = pick % profile.bends.length
        const a = {
          ...profile,
          legs: profile.legs.slice(0, at + 1),
          bends: profile.bends.slice(0, at),
          hemB: null,
        }
        const b = {
          ...profile,
          legs: profile.legs.slice(at + 1),
          bends: profile.bends.slice(at + 1),
          hemA: null,
        }
        const deduction = bendDeduction({ ...sheet, turn: profile.bends[at]?.turn ?? NaN })
        const together = flatStrip(a, sheet).stripWidth + flatStrip(b, sheet).stripWidth
        expect(flatStrip(profile, sheet).stripWidth).toBeCloseTo(together - deduction, 9)
      }),
    )
  })
})
