import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { cornerFrames, matchingLay } from '#shared/ends/run-frame'
import { degrees } from '#shared/geometry/vector'
import { cross3, dot3, subtract3, lengthOf3, vector3 } from '#shared/geometry/vector3'
import { cornerArbitrary } from '../../support/arbitrary-end'
import { apart, naiveAxes } from '../../support/naive-ends'
import type { Vector3 } from '#shared/geometry/vector3'

const tripleOf = ({ x, y, z }: Vector3) => [x, y, z] as const

describe('frames of the two pieces in a corner', () => {
  it('are right-handed unit axes with u level and v as near to up as it goes', () => {
    fc.assert(
      fc.property(cornerArbitrary, (corner) => {
        const frames = cornerFrames(corner)
        for (const { t, u, v } of [frames.right, frames.left]) {
          expect(lengthOf3(subtract3(cross3(t, u), v))).toBeLessThan(1e-12)
          for (const [a, b] of [
            [t, u],
            [u, v],
            [v, t],
          ] as const) {
            expect(dot3(a, b)).toBeCloseTo(0, 12)
            expect(lengthOf3(a)).toBeCloseTo(1, 12)
          }
          expect(u.z).toBeCloseTo(0, 12)
          expect(v.z).toBeGreaterThan(0)
        }
      }),
    )
  })

  it('are those that rotations give: level along x, tipped up, turned in plan', () => {
    fc.assert(
      fc.property(cornerArbitrary, (corner) => {
        const frames = cornerFrames(corner)
        for (const side of ['left', 'right'] as const) {
          const { t, u, v } = frames[side]
          naiveAxes(corner, side).forEach((axis, index) => {
            const found = [t, u, v][index]
            expect(found && apart(axis, tripleOf(found))).toBeLessThan(1e-12)
          })
        }
      }),
    )
  })

  it('follow the runs: d1 into the corner, d2 out of it, the plane square to their sum', () => {
    const { into, outOf, normal, right, left } = cornerFrames({
      slopeIn: 0,
      slopeOut: 0,
      plan: 90,
    })
    expect(right.t).toEqual(into)
    expect(left.t).toEqual(outOf)
    expect(lengthOf3(subtract3(into, vector3(1, 0, 0)))).toBeLessThan(1e-12)
    // Positive plan turns left, seen from above.
    expect(lengthOf3(subtract3(outOf, vector3(0, 1, 0)))).toBeLessThan(1e-12)
    expect(lengthOf3(subtract3(normal, vector3(1, 1, 0)))).toBeLessThan(1e-12)
  })

  it.each([90, -90, 120, NaN])('know no run of slope %s', (slope) => {
    expect(() => cornerFrames({ slopeIn: slope, slopeOut: 0, plan: 90 })).toThrow(RangeError)
    expect(() => cornerFrames({ slopeIn: 0, slopeOut: slope, plan: 90 })).toThrow(RangeError)
  })
})

describe('the matching lay', () => {
  it('is the same round a level corner', () => {
    expect(matchingLay({ slopeIn: 0, slopeOut: 0, plan: 75 }, 'right', 20)).toBeCloseTo(20, 12)
  })

  it('is the roof pitch at a high side for a gable piece that lies flat on the roof', () => {
    const pitch = degrees(Math.atan(3 / 12))
    const corner = { slopeIn: pitch, slopeOut: 0, plan: -90 }
    expect(matchingLay(corner, 'right', 0)).toBeCloseTo(pitch, 12)
    expect(matchingLay(corner, 'left', pitch)).toBeCloseTo(0, 12)
  })

  it('stays within one turn', () => {
    fc.assert(
      fc.property(
        cornerArbitrary,
        fc.constantFrom('left' as const, 'right' as const),
        fc.double({ min: -360, max: 360, noNaN: true }),
        (corner, side, lay) => {
          const found = matchingLay(corner, side, lay)
          expect(found).toBeGreaterThan(-180)
          expect(found).toBeLessThanOrEqual(180)
        },
      ),
    )
  })
})
