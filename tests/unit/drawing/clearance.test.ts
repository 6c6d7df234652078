import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  isBoxClear,
  isLineClear,
  metalOf,
  reachOfMetal,
  runToMetal,
} from '#shared/drawing/clearance'
import { distanceBetween, distanceToBox, segment } from '#shared/geometry/segment'
import { add, heading, scale } from '#shared/geometry/vector'

const CASES = { seed: 20_260_801, numRuns: 400 }

const point = fc.record({
  x: fc.double({ min: -40, max: 440, noNaN: true }),
  y: fc.double({ min: -40, max: 340, noNaN: true }),
})

/** Long lines, short ones, and points: a leg that its bends use up has no length. */
const line = fc.oneof(
  fc.tuple(point, point),
  fc
    .tuple(
      point,
      fc.double({ min: -9, max: 9, noNaN: true }),
      fc.double({ min: -9, max: 9, noNaN: true }),
    )
    .map(([from, x, y]) => [from, { x: from.x + x, y: from.y + y }] as const),
  point.map((at) => [at, at] as const),
)

const metal = fc.record({
  lines: fc.array(
    line.map(([from, to]) => segment(from, to)),
    { minLength: 1, maxLength: 30 },
  ),
  half: fc.double({ min: 0.5, max: 6, noNaN: true }),
})

const gap = fc.double({ min: 0.5, max: 5, noNaN: true })

/** Closer to the border of what is allowed than this, rounding decides. */
const isClose = (distance: number, limit: number): boolean => Math.abs(distance - limit) < 1e-6

describe('what keeps clear of lines', () => {
  it('is a box as far from all of them as it must be, however they are sorted', () => {
    const box = fc.tuple(
      point,
      fc.double({ min: 1, max: 90, noNaN: true }),
      fc.double({ min: 1, max: 24, noNaN: true }),
    )
    fc.assert(
      fc.property(metal, box, gap, ({ lines, half }, [{ x, y }, width, height], room) => {
        const bounds = { minX: x, minY: y, maxX: x + width, maxY: y + height }
        const nearest = Math.min(...lines.map((one) => distanceToBox(one, bounds)))
        fc.pre(!isClose(nearest, half + room))
        const isClear = isBoxClear(metalOf(lines, half), x, y, x + width, y + height, room)
        expect(isClear).toBe(nearest >= half + room)
      }),
      CASES,
    )
  })

  it('is a line as far from all of them as it must be', () => {
    fc.assert(
      fc.property(metal, line, gap, ({ lines, half }, [from, to], room) => {
        const asked = segment(from, to)
        const nearest = Math.min(...lines.map((one) => distanceBetween(one, asked)))
        fc.pre(!isClose(nearest, half + room))
        const isClear = isLineClear(metalOf(lines, half), from.x, from.y, to.x, to.y, room)
        expect(isClear).toBe(nearest >= half + room)
      }),
      CASES,
    )
  })

  it('is a ray as far as it runs, and no further', () => {
    fc.assert(
      fc.property(
        metal,
        point,
        fc.integer({ min: 0, max: 359 }),
        gap,
        ({ lines, half }, from, turn, room) => {
          const along = heading(turn)
          const limit = half + room
          const run = runToMetal(metalOf(lines, half), from.x, from.y, along.x, along.y, room)
          const nearestUpTo = (length: number) =>
            Math.min(
              ...lines.map((one) =>
                distanceBetween(one, segment(from, add(from, scale(along, length)))),
              ),
            )
          if (run === Infinity) expect(nearestUpTo(2000)).toBeGreaterThan(limit - 1e-6)
          else {
            if (run > 1e-3) expect(nearestUpTo(run - 1e-3)).toBeGreaterThanOrEqual(limit - 1e-6)
            expect(nearestUpTo(run + 1e-3)).toBeLessThanOrEqual(limit + 1e-6)
          }
        },
      ),
      CASES,
    )
  })

  it('is everything where there are none', () => {
    const none = metalOf([], 3)
    expect(isBoxClear(none, 0, 0, 10, 10, 2)).toBe(true)
    expect(isLineClear(none, 0, 0, 10, 10, 2)).toBe(true)
    expect(runToMetal(none, 0, 0, 1, 0, 2)).toBe(Infinity)
    expect(reachOfMetal(none, 0, 0, 1, 0)).toBe(0)
  })
})

it('metal reaches as far along a direction as its furthest point', () => {
  const lines = [segment({ x: 0, y: 0 }, { x: 30, y: 40 })]
  expect(reachOfMetal(metalOf(lines, 1), 0, 0, 0.6, 0.8)).toBeCloseTo(50, 9)
  expect(reachOfMetal(metalOf(lines, 1), 0, 0, -0.6, -0.8)).toBe(0)
})
