import { describe, expect, it } from 'vitest'
import {
  bendAllowance,
  bendDeduction,
  K_HALF_HARD,
  K_SOFT,
  outsideSetback,
} from '#shared/strip/bend-allowance'
import { flatParts } from '#shared/strip/flat-parts'
import { pieceWeight } from '#shared/strip/weight'
import { profileOf } from '../../support/arbitrary-profile'

/** The empirical 0.0078 T per degree of the aviation handbooks, as a K factor. */
const K_EMPIRICAL = 0.0078 / (Math.PI / 180)

const within = (found: number, published: number, tolerance: number) => {
  expect(Math.abs(found - published)).toBeLessThanOrEqual(tolerance)
}

describe("Machinery's Handbook, 31st ed., p. 1421", () => {
  it('0.64 T and 0.55 T at 90 degrees are K 0.4074 and 0.350', () => {
    within(K_HALF_HARD, 0.4074, 0.00005)
    within(K_SOFT, 0.35, 0.0005)
  })

  const soft = { thickness: 0.125, kFactor: K_HALF_HARD }

  it('180 degrees, T 1/8, R 3/8, soft steel: 1.338 in.', () => {
    within(bendAllowance({ ...soft, insideRadius: 0.375, turn: 180 }), 1.338, 0.001)
  })

  it('60 degrees, T 1/8, R 5/8: 0.707 in. (the printed value is cut, not rounded)', () => {
    within(bendAllowance({ ...soft, insideRadius: 0.625, turn: 60 }), 0.707, 0.001)
  })

  it('3.5 in. of straights and both bends: 5.545 in.', () => {
    const bends =
      bendAllowance({ ...soft, insideRadius: 0.375, turn: 180 }) +
      bendAllowance({ ...soft, insideRadius: 0.625, turn: 60 })
    within(3.5 + bends, 5.545, 0.0015)
  })
})

describe('Sheet Metal Work Book, 6th ed. (2012), 90 degree bends', () => {
  const bend = { turn: 90, thickness: 0.05, insideRadius: 0.032, kFactor: K_EMPIRICAL }

  it('allowance 0.085 in. and deduction 0.079 in.', () => {
    within(bendAllowance(bend), 0.085, 0.0005)
    within(bendDeduction(bend), 0.079, 0.0005)
  })
})

describe('S. Benson, press brake column in The FABRICATOR', () => {
  it('160 degrees, T and R 0.25 in.: allowance 1.010 in.', () => {
    const bend = { turn: 160, thickness: 0.25, insideRadius: 0.25, kFactor: K_EMPIRICAL }
    within(bendAllowance(bend), 1.01, 0.0005)
  })
})

describe('FAA-H-8083-31, vol. 1, ch. 4, U channel', () => {
  it('setback 0.2 in. and flats of 0.8, 1.6 and 0.8 in.', () => {
    const sheet = { thickness: 0.04, insideRadius: 0.16, kFactor: K_EMPIRICAL }
    within(outsideSetback({ ...sheet, turn: 90 }), 0.2, 1e-12)
    const flats = flatParts(profileOf([1, 2, 1], [90, 90]), sheet).runs
    expect(flats.map(({ straight }) => straight.toFixed(9))).toEqual(
      [0.8, 1.6, 0.8].map((flat) => flat.toFixed(9)),
    )
  })
})

describe('Tabellenbuch Metall after DIN 6935 (millimeters)', () => {
  it('opening angle 60, r 6, s 5, k 0.7: compensation 5.77 mm', () => {
    const bend = { turn: 120, thickness: 5, insideRadius: 6, kFactor: 0.7 / 2 }
    within(bendDeduction(bend), 5.77, 0.005)
  })

  // From memory, not verified; the formula of the standard gives the same after rounding.
  it.each([
    [1, 1.9],
    [1.6, 2.1],
    [2.5, 2.4],
    [4, 3.0],
  ])('90 degrees, s 1, r %s: compensation %s mm', (insideRadius, published) => {
    const k = 0.65 + 0.5 * Math.log10(insideRadius)
    within(bendDeduction({ turn: 90, thickness: 1, insideRadius, kFactor: k / 2 }), published, 0.05)
  })
})

describe('German bending worksheet, 90 degree parts (millimeters)', () => {
  it('s 3.18, r 7, v = 0.43 r + 1.48 s: 7.71 mm', () => {
    // 1.48 s is what is left of 2 s after the neutral axis: 2 - (π/2) K.
    const kFactor = (2 - 1.48) / (Math.PI / 2)
    within(bendDeduction({ turn: 90, thickness: 3.18, insideRadius: 7, kFactor }), 7.71, 0.01)
  })
})

describe('Groover, Fundamentals of Modern Manufacturing (from memory, arithmetic redone)', () => {
  it('60 degrees, t 3.2, R 4.75 mm, K 0.33: allowance 6.08 mm', () => {
    const bend = { turn: 60, thickness: 3.2, insideRadius: 4.75, kFactor: 0.33 }
    within(bendAllowance(bend), 6.08, 0.005)
  })
})

describe('closed hem', () => {
  it("takes 0.43 T off the sum: the shop's old rule (from memory)", () => {
    within(bendDeduction({ turn: 180, thickness: 1, insideRadius: 0, kFactor: 0.5 }), 0.43, 0.001)
  })
})

describe('mill weight chart for aluminum', () => {
  it('0.063 x 48 x 144 in. at 0.101 lb/in3 weighs 43.98 lb', () => {
    const weight = pieceWeight({ stripWidth: 48 }, { thickness: 0.063, density: 0.101 }, 144)
    within(weight, 43.98, 0.005)
  })
})
