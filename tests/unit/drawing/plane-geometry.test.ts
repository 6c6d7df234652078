import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { clipPolygon } from '#shared/drawing/clip-polygon'
import { flattenArc } from '#shared/geometry/arc'
import { boundsOf } from '#shared/geometry/bounds'
import { offsetCorners, roundCorners } from '#shared/geometry/corner-path'
import { areaOf, pathLength, pointAlong } from '#shared/geometry/polyline'
import { clipToBox, distanceBetween, distanceToBox, segment } from '#shared/geometry/segment'
import { distance } from '#shared/geometry/vector'

const BOX = { minX: 0, minY: 0, maxX: 10, maxY: 6 }

const point = fc.record({
  x: fc.integer({ min: -20, max: 30 }),
  y: fc.integer({ min: -20, max: 30 }),
})

const CASES = { seed: 20_260_801 }

describe('a segment and a box', () => {
  it('are as far apart as the nearest of many points between them', () => {
    fc.assert(
      fc.property(point, point, (from, to) => {
        const steps = Array.from({ length: 801 }, (_, index) => index / 800)
        const sampled = Math.min(
          ...steps.map((t) => {
            const x = from.x + (to.x - from.x) * t
            const y = from.y + (to.y - from.y) * t
            return Math.hypot(Math.max(-x, 0, x - 10), Math.max(-y, 0, y - 6))
          }),
        )
        const exact = distanceToBox(segment(from, to), BOX)
        expect(exact).toBeLessThanOrEqual(sampled + 1e-9)
        expect(exact).toBeGreaterThan(sampled - 0.1)
      }),
      CASES,
    )
  })

  it('keep the part inside, and nothing of a segment that passes by', () => {
    expect(clipToBox(segment({ x: -5, y: 3 }, { x: 15, y: 3 }), BOX)).toEqual(
      segment({ x: 0, y: 3 }, { x: 10, y: 3 }),
    )
    expect(clipToBox(segment({ x: -5, y: 8 }, { x: 15, y: 8 }), BOX)).toBeUndefined()
  })
})

describe('two segments', () => {
  it('are 0 apart when they cross and otherwise as far as their nearest ends', () => {
    const level = segment({ x: 0, y: 0 }, { x: 10, y: 0 })
    expect(distanceBetween(level, segment({ x: 5, y: -3 }, { x: 5, y: 3 }))).toBe(0)
    expect(distanceBetween(level, segment({ x: 5, y: 2 }, { x: 5, y: 3 }))).toBe(2)
    expect(distanceBetween(level, segment({ x: 13, y: 4 }, { x: 13, y: 9 }))).toBe(5)
  })
})

describe('chains', () => {
  it('cut by a box keep only what lies in it', () => {
    const square = [
      { x: -5, y: -5 },
      { x: 5, y: -5 },
      { x: 5, y: 5 },
      { x: -5, y: 5 },
    ]
    const cut = clipPolygon(square, BOX)
    expect(areaOf(cut)).toBeCloseTo(25, 9)
    expect(boundsOf(cut)).toEqual({ minX: 0, minY: 0, maxX: 5, maxY: 5 })
    expect(clipPolygon(square, { minX: 20, minY: 0, maxX: 30, maxY: 9 })).toEqual([])
  })

  it('move aside with their corners and are rounded within half a segment', () => {
    const corner = [
      { x: 0, y: 0 },
      { x: 10, y: 0 },
      { x: 10, y: 10 },
    ]
    expect(offsetCorners(corner, 1)).toEqual([
      { x: 0, y: 1 },
      { x: 9, y: 1 },
      { x: 9, y: 10 },
    ])
    const rounded = roundCorners(corner, 2)
    expect(pathLength(rounded)).toBeGreaterThan(20 - 4 + Math.PI - 0.01)
    expect(pathLength(rounded)).toBeLessThan(20 - 4 + Math.PI)
    for (const { x, y } of rounded.slice(1, -1)) {
      expect(distance({ x, y }, { x: 8, y: 2 })).toBeCloseTo(2, 9)
    }
  })

  it('have a point a part of the way along', () => {
    const corner = [
      { x: 0, y: 0 },
      { x: 10, y: 0 },
      { x: 10, y: 10 },
    ]
    expect(pointAlong(corner, 0.25)).toEqual({ x: 5, y: 0 })
    expect(pointAlong(corner, 0.75)).toEqual({ x: 10, y: 5 })
    expect(pointAlong(corner, 1)).toEqual({ x: 10, y: 10 })
  })
})

describe('an arc', () => {
  it('becomes chords within the step and the height asked for', () => {
    const arc = { center: { x: 0, y: 0 }, radius: 2, start: 0, sweep: 90 }
    expect(flattenArc(arc, 5, 1)).toHaveLength(19)
    const fine = flattenArc(arc, 90, 0.001)
    const [a, b] = fine
    if (a === undefined || b === undefined) throw new Error('No chord.')
    const middle = { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 }
    expect(2 - Math.hypot(middle.x, middle.y)).toBeLessThanOrEqual(0.001)
  })
})
