import type Complex from 'complex.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Vector } from '#shared/geometry/vector'
import { flatParts } from '#shared/strip/flat-parts'
import { foldedSection } from '#shared/strip/folded-section'
import {
  closedHem,
  profileArbitrary,
  profileOf,
  sheetArbitrary,
  STEEL,
} from '../../support/arbitrary-profile'
import type { ComplexSection } from '../../support/complex-section'
import { complexSection } from '../../support/complex-section'

const EXACT = 1e-9

const makeable = fc
  .tuple(profileArbitrary, sheetArbitrary)
  .filter(([profile, sheet]) => flatParts(profile, sheet).runs.every((run) => run.straight > 0))

const away = (point: Vector, wanted: Complex | undefined): number =>
  wanted === undefined ? NaN : Math.hypot(point.x - wanted.re, point.y - wanted.im)

/** All named points of the section beside those of the second computation. */
const pairsOf = (
  { legs, bends, hems, edges }: ReturnType<typeof foldedSection>,
  { straights, rounds }: ComplexSection,
): [Vector, Complex | undefined][] => {
  const straight = (of: number | 'lipA' | 'lipB') => straights.find((one) => one.of === of)
  const round = (of: number | 'hemA' | 'hemB') => rounds.find((one) => one.of === of)
  return [
    ...legs.flatMap(
      ({ leg, from, to, outsideFrom, outsideTo }): [Vector, Complex | undefined][] => [
        [from, straight(leg)?.from],
        [to, straight(leg)?.to],
        [outsideFrom, straight(leg)?.outsideFrom],
        [outsideTo, straight(leg)?.outsideTo],
      ],
    ),
    ...bends.flatMap(({ bend, center, mid, corner }): [Vector, Complex | undefined][] => [
      [center, round(bend)?.center],
      [mid, round(bend)?.mid],
      [corner, round(bend)?.corner],
    ]),
    ...(['A', 'B'] as const).flatMap((edge): [Vector, Complex | undefined][] => {
      const hem = hems[edge]
      if (hem === null) return []
      return [
        [hem.center, round(`hem${edge}`)?.center],
        [hem.lipFrom, straight(`lip${edge}`)?.from],
        [hem.lipTo, straight(`lip${edge}`)?.to],
      ]
    }),
    [edges.A, straights[0]?.from],
    [edges.B, straights.at(-1)?.to],
  ]
}

/** How far a point is from the face `left` inches to the left of the middle line. */
const offFace = (point: Vector, left: number, { straights, rounds }: ComplexSection): number => {
  const lines = straights.map(({ from, to, along }) => {
    // In the straight's own frame: x along it, y to its left.
    const own = from.sub(point.x, point.y).mul(-1).mul(along.conjugate())
    const beyond = Math.max(0 - own.re, own.re - to.sub(from).abs(), 0)
    return Math.hypot(beyond, own.im - left)
  })
  const arcs = rounds.map(({ center, radius, side }) =>
    Math.abs(center.sub(point.x, point.y).abs() - (radius - side * left)),
  )
  return Math.min(...lines, ...arcs)
}

describe('the folded section beside a second computation with complex numbers', () => {
  it('has the same legs, bends, hems and edges to a billionth of an inch', () => {
    fc.assert(
      fc.property(makeable, ([profile, sheet]) => {
        const pairs = pairsOf(foldedSection(profile, sheet), complexSection(profile, sheet))
        expect(pairs.length).toBeGreaterThanOrEqual(4 * profile.legs.length + 2)
        for (const [found, wanted] of pairs) expect(away(found, wanted)).toBeLessThan(EXACT)
      }),
      { numRuns: 500 },
    )
  })

  it('heads the same way on every leg', () => {
    fc.assert(
      fc.property(makeable, ([profile, sheet]) => {
        const { straights } = complexSection(profile, sheet)
        for (const { leg, heading } of foldedSection(profile, sheet).legs) {
          const along = straights.find((one) => one.of === leg)?.along
          const toward = {
            x: Math.cos((heading * Math.PI) / 180),
            y: Math.sin((heading * Math.PI) / 180),
          }
          expect(away(toward, along)).toBeLessThan(EXACT)
        }
      }),
    )
  })

  it('has every point of its two faces on the offset straights and arcs', () => {
    fc.assert(
      fc.property(makeable, ([profile, sheet]) => {
        const second = complexSection(profile, sheet)
        const { leftFace, rightFace } = foldedSection(profile, sheet)
        for (const point of leftFace) {
          expect(offFace(point, sheet.thickness / 2, second)).toBeLessThan(EXACT)
        }
        for (const point of rightFace) {
          expect(offFace(point, sheet.thickness / -2, second)).toBeLessThan(EXACT)
        }
      }),
    )
  })

  it('has both faces at both ends of every straight part', () => {
    fc.assert(
      fc.property(makeable, ([profile, sheet]) => {
        const { leftFace, rightFace } = foldedSection(profile, sheet)
        for (const { from, to, along } of complexSection(profile, sheet).straights) {
          for (const end of [from, to]) {
            const aside = along.mul(0, sheet.thickness / 2)
            const near = (face: readonly Vector[], corner: Complex) =>
              Math.min(...face.map((point) => away(point, corner)))
            expect(near(leftFace, end.add(aside))).toBeLessThan(EXACT)
            expect(near(rightFace, end.sub(aside))).toBeLessThan(EXACT)
          }
        }
      }),
    )
  })
})

describe('the second computation', () => {
  it('is right about a channel with a hem, worked by hand', () => {
    const channel = profileOf([2, 5], [90], { hemB: closedHem(0.5, 1) })
    const { straights, rounds } = complexSection(channel, STEEL)
    const T = STEEL.thickness
    // Leg 2 stands with its outside face at x = 2; its middle line is T / 2 short of that.
    expect(straights[1]?.to.re).toBeCloseTo(2 - T / 2, 12)
    // It ends T short of its outside dimension, which begins on the outside face of leg 1.
    expect(straights[1]?.to.im).toBeCloseTo(5 - T / 2 - T, 12)
    // The lip lies on the left, towards edge A's side, one sheet away.
    expect(straights[2]?.from.re).toBeCloseTo(2 - T / 2 - T, 12)
    expect(rounds[1]?.mid.im).toBeCloseTo(5 - T, 12)
  })
})
