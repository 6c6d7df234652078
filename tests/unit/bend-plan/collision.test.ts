import fc from 'fast-check'
import { describe, expect, test, vi } from 'vitest'
import { canDrawOut } from '#shared/bend-plan/collision/draw-out'
import { openTools, toolClearance } from '#shared/bend-plan/collision/open-tools'
import {
  cutStart,
  movedOutline,
  sheetOutline,
  toolOutline,
} from '#shared/bend-plan/collision/outline'
import type { Outline, OutlineSide } from '#shared/bend-plan/collision/outline'
import { meetsSliding } from '#shared/bend-plan/collision/slide'
import { meetsStill } from '#shared/bend-plan/collision/still'
import { meetsSwinging } from '#shared/bend-plan/collision/swing'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { rotate, vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import { CASES } from '../../support/bend-plan-cases'

vi.setConfig({ testTimeout: 60_000 })

const square = (x: number, y: number, size: number): Outline =>
  toolOutline([vector(x, y), vector(x + size, y), vector(x + size, y + size), vector(x, y + size)])

const sheet = (...points: [number, number][]): Outline =>
  sheetOutline(points.map(([x, y]) => vector(x, y)))

const toSide = ({ x, y }: Vector, { a, b }: OutlineSide): number => {
  const along = { x: b.x - a.x, y: b.y - a.y }
  const square = along.x ** 2 + along.y ** 2
  const t = Math.max(0, Math.min(1, ((x - a.x) * along.x + (y - a.y) * along.y) / square))
  return Math.hypot(x - a.x - t * along.x, y - a.y - t * along.y)
}

const doCross = (p: OutlineSide, q: OutlineSide): boolean => {
  const leftOf = ({ a, b }: OutlineSide, { x, y }: Vector) =>
    (b.x - a.x) * (y - a.y) - (b.y - a.y) * (x - a.x) > 0
  return leftOf(p, q.a) !== leftOf(p, q.b) && leftOf(q, p.a) !== leftOf(q, p.b)
}

/** Least distance between the sides of two outlines. */
const gapBetween = (one: Outline, other: Outline): number =>
  Math.min(
    ...one.sides.flatMap((p) =>
      other.sides.map((q) =>
        doCross(p, q)
          ? 0
          : Math.min(toSide(p.a, q), toSide(p.b, q), toSide(q.a, p), toSide(q.b, p)),
      ),
    ),
  )

const STEPS = 1500

/** Least distance on the way, seen at many places of it. */
const sampled = (other: Outline, at: (part: number) => Outline): number =>
  Math.min(...Array.from({ length: STEPS + 1 }, (_, i) => gapBetween(at(i / STEPS), other)))

const coordinate = fc.integer({ min: -40, max: 40 }).map((n) => n / 8)
const point: fc.Arbitrary<Vector> = fc.record({ x: coordinate, y: coordinate })
const run = fc
  .uniqueArray(point, { minLength: 2, maxLength: 4, selector: ({ x, y }) => `${x} ${y}` })
  .map(sheetOutline)

describe('outlines at rest', () => {
  test('meet at the clearance and not beyond it', () => {
    const line = sheet([0, 1.5], [4, 1.5])
    expect(meetsStill(line, square(0, 0, 1), 0.5)).toBe(true)
    expect(meetsStill(line, square(0, 0, 1), 0.499)).toBe(false)
  })

  test('a tool is solid: sheet inside it meets it', () => {
    expect(meetsStill(sheet([4, 4], [5, 5]), square(0, 0, 10), 0.1)).toBe(true)
    expect(meetsStill(square(0, 0, 10), sheet([4, 4], [5, 5]), 0.1)).toBe(true)
  })

  test('sides that cross are no distance apart', () => {
    expect(meetsStill(sheet([-1, 0], [1, 0]), sheet([0, -1], [0, 1]), 0)).toBe(true)
  })
})

describe('swings', () => {
  test('a flange meets what stands in its arc, and not before', () => {
    const flange = sheet([1, 0], [2, 0])
    const post = square(-0.1, 1.4, 0.2)
    expect(meetsSwinging(flange, post, (84 * Math.PI) / 180, 0.01)).toBe(false)
    expect(meetsSwinging(flange, post, (89 * Math.PI) / 180, 0.01)).toBe(true)
    // Beyond its reach.
    expect(meetsSwinging(flange, square(-0.1, 2.1, 0.2), Math.PI, 0.01)).toBe(false)
  })

  test('a contact that opens again on the way is found', () => {
    const thin = sheet([0, 1], [0.001, 1])
    expect(meetsSwinging(sheet([0.5, 0], [1.02, 0]), thin, Math.PI, 0.001)).toBe(true)
  })

  test('agree with a fine sampling of the way', () => {
    let met = 0
    fc.assert(
      fc.property(run, run, fc.integer({ min: 5, max: 170 }), (moving, still, swing) => {
        const least = sampled(still, (part) =>
          sheetOutline(moving.points.map((each) => rotate(each, swing * part))),
        )
        const clearance = 0.05
        // No point is further than 7.1 in. out, so between two samples none moves further than this.
        const between = (7.1 * swing * Math.PI) / 180 / STEPS
        const meets = meetsSwinging(moving, still, (swing * Math.PI) / 180, clearance)
        if (least < clearance - 1e-6) expect(meets).toBe(true)
        if (least > clearance + between) expect(meets).toBe(false)
        if (meets) met++
      }),
      { ...CASES, numRuns: 150 },
    )
    expect(met).toBeGreaterThan(30)
    expect(met).toBeLessThan(140)
  })
})

describe('slides', () => {
  test('agree with a fine sampling of the way', () => {
    let met = 0
    fc.assert(
      fc.property(run, run, coordinate, coordinate, (moving, still, dx, dy) => {
        const least = sampled(still, (part) => movedOutline(moving, dx * part, dy * part))
        const clearance = 0.05
        const between = Math.hypot(dx, dy) / STEPS
        const meets = meetsSliding(moving, still, dx, dy, clearance)
        if (least < clearance - 1e-6) expect(meets).toBe(true)
        if (least > clearance + between) expect(meets).toBe(false)
        if (meets) met++
      }),
      { ...CASES, numRuns: 150 },
    )
    expect(met).toBeGreaterThan(30)
    expect(met).toBeLessThan(140)
  })
})

describe('nose zone', () => {
  test('is cut off along the run, across corners', () => {
    const points = [vector(0, 0), vector(1, 0), vector(1, 2)]
    expect(cutStart(points, 0.25)).toEqual([vector(0.25, 0), vector(1, 0), vector(1, 2)])
    expect(cutStart(points, 1.5)).toEqual([vector(1, 0.5), vector(1, 2)])
    expect(cutStart(points, 3)).toBeUndefined()
  })
})

describe('drawing a piece out of the brake', () => {
  const brake = DEMO_BRAKE.upOnly
  const clearance = toolClearance(0.024, brake)
  const tools = openTools(brake.up, clearance)
  const draw = (rear: Outline, front?: Outline, opening = brake.opening) =>
    canDrawOut(rear, front, tools, opening, clearance)

  test('flat sheet always comes out', () => {
    expect(draw(sheet([0, 0], [-6, 0]))).toBe(true)
    expect(draw(sheet([0, 0], [-6, 0]), sheet([0.375, 0], [3, 0]))).toBe(true)
  })

  test('the clamp opens by height and depth of the rear together', () => {
    const up = sheet([0, 0], [-14, 0], [-14, 3])
    expect(draw(up)).toBe(true)
    expect(draw(up, undefined, 2.9)).toBe(false)
    const both = sheet([0, 0], [-14, 0], [-14, 3], [-16, 3], [-16, -2.1])
    expect(draw(both)).toBe(false)
  })

  test('a front folded back over the clamp tool is trapped', () => {
    const hooked = sheet([0, 0.4], [0, 3], [-7, 3], [-7, 2.5])
    expect(draw(sheet([0, 0], [-6, 0]), hooked)).toBe(false)
  })
})
