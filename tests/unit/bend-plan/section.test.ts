import { describe, expect, test } from 'vitest'
import { sectionOf } from '#shared/bend-plan/section'
import type { Profile } from '#shared/profile/profile.schema'
import { STEEL_24 } from '../../support/bend-plan-cases'

const profile = (legs: number[], turns: number[], rest: Partial<Profile> = {}): Profile => ({
  version: 1,
  legs,
  bends: turns.map((turn) => ({ turn })),
  hemA: null,
  hemB: null,
  colorSide: 'left',
  ...rest,
})

const T = STEEL_24.thickness
const R = STEEL_24.insideRadius

describe('section of a profile', () => {
  test('one square bend: each leg ends half a thickness short of its outside', () => {
    // (R + T/2) tan 45 - (R + T) tan 45 = -T/2
    const { legs, turns } = sectionOf(profile([4, 6], [-90]), STEEL_24)
    expect(legs[0]).toBeCloseTo(4 - T / 2, 12)
    expect(legs[1]).toBeCloseTo(6 - T / 2, 12)
    expect(turns).toEqual([-90])
  })

  test('a bend over 90 is measured to its outermost tangent', () => {
    const { legs } = sectionOf(profile([3, 3], [120]), STEEL_24)
    const expected = 3 - (R + T) + (R + T / 2) * Math.tan(Math.PI / 3)
    expect(legs[0]).toBeCloseTo(expected, 12)
    expect(legs[1]).toBeCloseTo(expected, 12)
  })

  test('a closed hem takes half a thickness off leg and lip', () => {
    const hemB = { style: 'closed', length: 0.5, turn: -1 } as const
    const section = sectionOf(profile([4], [], { hemB }), STEEL_24)
    expect(section.legs[0]).toBeCloseTo(4 - T / 2, 12)
    expect(section.hemB?.lip).toBeCloseTo(0.5 - T / 2, 12)
    expect(section.hemB).toMatchObject({ gap: 0, turn: -1 })
    expect(section.hemA).toBeNull()
  })

  test('an open hem bends about half its gap', () => {
    const hemA = { style: 'open', length: 0.75, gap: 0.25, turn: 1 } as const
    const section = sectionOf(profile([4], [], { hemA }), STEEL_24)
    // R + T/2 - (R + T): the radius drops out, the gap stays with the hem.
    expect(section.legs[0]).toBeCloseTo(4 - T / 2, 12)
    expect(section.hemA?.lip).toBeCloseTo(0.75 - T / 2, 12)
    expect(section.hemA).toMatchObject({ gap: 0.25, turn: 1 })
  })

  test('a leg that its bends consume is refused by name', () => {
    expect(() => sectionOf(profile([4, 0.05, 4], [90, 90]), STEEL_24)).toThrow(/^Leg 2 .*shorter/)
    const hemA = { style: 'closed', length: 0.01, turn: 1 } as const
    expect(() => sectionOf(profile([4], [], { hemA }), STEEL_24)).toThrow(/hem at edge A/)
  })
})
