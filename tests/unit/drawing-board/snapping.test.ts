import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { snapCorner, type SnapRules } from '@/features/drawing/model/snapping'
import { distance, vector } from '#shared/geometry/vector'

const rules: SnapRules = { step: 0.125, angleStep: 15, pitch: null, otherLegs: [], reach: 0.2 }
const edge = { corner: vector(0, 0), legHeading: null }

describe('snapping a corner', () => {
  test('a point near a round length and angle goes to both', () => {
    const { point, guides } = snapCorner(vector(4.04, 0.1), [edge], rules)
    expect(point.x).toBeCloseTo(4, 12)
    expect(point.y).toBeCloseTo(0, 12)
    expect(guides.map(({ kind }) => kind).sort()).toEqual(['angle', 'length'])
  })

  test('between two neighbors it takes the round length of both where they meet', () => {
    const beyond = { corner: vector(6, 0), legHeading: null }
    const { point } = snapCorner(vector(2.99, 4.03), [edge, beyond], rules)
    expect(distance(point, edge.corner) * 8).toBeCloseTo(
      Math.round(distance(point, edge.corner) * 8),
      9,
    )
    expect(distance(point, beyond.corner) * 8).toBeCloseTo(
      Math.round(distance(point, beyond.corner) * 8),
      9,
    )
  })

  test("the roof's pitch attracts as the 15 degree steps do", () => {
    const pitch = 18.43494882
    const { guides } = snapCorner(vector(3 * 0.949, 3 * 0.317), [edge], {
      ...rules,
      pitch,
      reach: 0.03,
    })
    expect(guides).toContainEqual(expect.objectContaining({ kind: 'angle', fromPitch: true }))
  })

  test('a leg as long as another says so', () => {
    const { guides } = snapCorner(vector(3.3, 0), [edge], { ...rules, otherLegs: [3.3] })
    expect(guides).toContainEqual(
      expect.objectContaining({ kind: 'length', length: 3.3, equalLeg: true }),
    )
  })

  test('never moves a point beyond its reach', () => {
    const coordinate = fc.double({ min: -20, max: 20, noNaN: true })
    fc.assert(
      fc.property(coordinate, coordinate, coordinate, coordinate, (x, y, nx, ny) => {
        const pointer = vector(x, y)
        const neighbors = [edge, { corner: vector(nx, ny), legHeading: 30 }]
        const { point } = snapCorner(pointer, neighbors, { ...rules, pitch: 26.565 })
        expect(distance(point, pointer)).toBeLessThanOrEqual(rules.reach + 1e-9)
      }),
      { seed: 11 },
    )
  })

  test('every guide it names holds at the point it gives', () => {
    const coordinate = fc.double({ min: -12, max: 12, noNaN: true })
    fc.assert(
      fc.property(coordinate, coordinate, (x, y) => {
        const { point, guides } = snapCorner(vector(x, y), [edge], rules)
        for (const guide of guides) {
          if (guide.kind === 'length')
            expect(distance(point, guide.from)).toBeCloseTo(guide.length, 6)
          else {
            const along =
              (Math.atan2(point.y - guide.from.y, point.x - guide.from.x) * 180) / Math.PI
            const off = ((((along - guide.heading) % 180) + 270) % 180) - 90
            expect(Math.abs(off) * distance(point, guide.from)).toBeLessThan(1e-4)
          }
        }
      }),
      { seed: 12 },
    )
  })
})
