import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  add3,
  cross3,
  distance3,
  dot3,
  lengthOf3,
  scale3,
  subtract3,
  unit3,
  vector3,
} from '#shared/geometry/vector3'

const part = fc.double({ min: -100, max: 100, noNaN: true })
const vectorArbitrary = fc.tuple(part, part, part).map(([x, y, z]) => vector3(x, y, z))

const X = vector3(1, 0, 0)
const Y = vector3(0, 1, 0)
const Z = vector3(0, 0, 1)

describe('vectors of space', () => {
  it('are right-handed: x × y = z', () => {
    expect(cross3(X, Y)).toEqual(Z)
    expect(cross3(Y, Z)).toEqual(X)
    expect(cross3(Z, X)).toEqual(Y)
  })

  it('have a product that is square to both', () => {
    fc.assert(
      fc.property(vectorArbitrary, vectorArbitrary, (a, b) => {
        expect(dot3(cross3(a, b), a)).toBeCloseTo(0, 6)
        expect(dot3(cross3(a, b), b)).toBeCloseTo(0, 6)
      }),
    )
  })

  it('measure the way from one to the other', () => {
    fc.assert(
      fc.property(vectorArbitrary, vectorArbitrary, (a, b) => {
        expect(distance3(a, b)).toBeCloseTo(lengthOf3(subtract3(a, b)), 9)
        expect(distance3(add3(subtract3(a, b), b), a)).toBeLessThan(1e-9)
      }),
    )
  })

  it('point the same way at unit length, unless they have none', () => {
    const unit = unit3(vector3(3, 0, -4))
    expect(distance3(unit, vector3(0.6, 0, -0.8))).toBeLessThan(1e-15)
    expect(distance3(scale3(unit, 5), vector3(3, 0, -4))).toBeLessThan(1e-12)
    expect(() => unit3(vector3(0, 0, 0))).toThrow(RangeError)
    expect(() => unit3(vector3(NaN, 0, 0))).toThrow(RangeError)
  })
})
