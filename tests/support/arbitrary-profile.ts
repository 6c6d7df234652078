import fc from 'fast-check'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'

const sixteenths = (least: number, most: number) =>
  fc.integer({ min: least * 16, max: most * 16 }).map((count) => count / 16)

const side = fc.constantFrom<1 | -1>(1, -1)

export const turnArbitrary = fc
  .tuple(fc.oneof(fc.integer({ min: 1, max: 179 }), fc.constantFrom(45, 90, 135, 26.565)), side)
  .map(([turn, way]) => turn * way)

export const hemArbitrary: fc.Arbitrary<Hem> = fc.oneof(
  fc.record({ style: fc.constant('closed' as const), length: sixteenths(0.25, 1), turn: side }),
  fc.record({
    style: fc.constant('open' as const),
    length: sixteenths(0.25, 1),
    gap: sixteenths(0.0625, 0.25),
    turn: side,
  }),
)

/** Profiles of the right shape with sound values; they may cross themselves or eat a leg. */
export const profileArbitrary: fc.Arbitrary<Profile> = fc
  .integer({ min: 0, max: 10 })
  .chain((bendCount) =>
    fc.record({
      version: fc.constant(1 as const),
      legs: fc.array(sixteenths(0.5, 8), { minLength: bendCount + 1, maxLength: bendCount + 1 }),
      bends: fc.array(fc.record({ turn: turnArbitrary }), {
        minLength: bendCount,
        maxLength: bendCount,
      }),
      hemA: fc.option(hemArbitrary),
      hemB: fc.option(hemArbitrary),
      colorSide: fc.constantFrom(
        'left' as const,
        'right' as const,
        'both' as const,
        'none' as const,
      ),
    }),
  )

export const sheetArbitrary: fc.Arbitrary<Sheet> = fc.record({
  metal: fc.constant('steel' as const),
  thickness: fc.constantFrom(0.0179, 0.024, 0.032, 0.05),
  insideRadius: fc.constantFrom(0, 0.03, 0.0625),
  kFactor: fc.constantFrom(0.35, 0.4074, 0.5),
  density: fc.constant(0.2836),
  springbackPer90: fc.constant(2),
})

/** A profile of a few figures, for tests that name their own. */
export const profileOf = (
  legs: number[],
  turns: number[] = [],
  rest: Partial<Profile> = {},
): Profile => ({
  version: 1,
  legs,
  bends: turns.map((turn) => ({ turn })),
  hemA: null,
  hemB: null,
  colorSide: 'left',
  ...rest,
})

export const closedHem = (length: number, turn: 1 | -1): Hem => ({ style: 'closed', length, turn })

export const STEEL: Sheet = {
  metal: 'steel',
  thickness: 0.024,
  insideRadius: 0.03,
  kFactor: 0.4074,
  density: 0.2836,
  springbackPer90: 2,
}
