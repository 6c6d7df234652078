import fc from 'fast-check'
import type { Brake, ToolSet } from '#shared/bend-plan/brake.schema'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import type { Section } from '#shared/bend-plan/plan.schema'
import type { PlanRequest } from '#shared/bend-plan/planner'
import type { SectionHem } from '#shared/bend-plan/section'
import type { CalibratedSheet } from '#shared/stock/sheet-on'
import type { Sheet } from '#shared/stock/stock.schema'

/** 24 ga steel of the known outcomes: T 0.024, springback 2 per 90, density 0.284. */
export const STEEL_24: Sheet = {
  metal: 'steel',
  thickness: 0.024,
  insideRadius: 0.03,
  kFactor: 0.4074,
  density: 0.284,
  springbackPer90: 2,
}

/** The same on a brake on which nobody measured it. */
export const STOCK_24: CalibratedSheet = { sheet: STEEL_24, calibrations: [] }

export const hem = (turn: 1 | -1, lip = 0.5, gap = 0): SectionHem => ({ lip, gap, turn })

export const section = (
  legs: number[],
  turns: number[],
  hems: { A?: SectionHem; B?: SectionHem } = {},
): Section => ({ legs, turns, hemA: hems.A ?? null, hemB: hems.B ?? null })

export const request = (
  of: Section,
  brake: Brake,
  rest: Partial<Omit<PlanRequest, 'section' | 'brake'>> = {},
): PlanRequest => ({
  section: of,
  brake,
  sheet: STEEL_24,
  pieceLength: 120,
  paintedSide: 'left',
  ...rest,
})

/** The demo brakes as the known outcomes use them: hems in any order. */
export const anyHemOrder = (brake: Brake): Brake => ({ ...brake, hemsFirst: false })

/** Hems on the other side, turns negated. */
export const mirrored = ({ legs, turns, hemA, hemB }: Section): Section => {
  const flip = (of: SectionHem | null): SectionHem | null =>
    of && { ...of, turn: of.turn === 1 ? -1 : 1 }
  return { legs, turns: turns.map((turn) => 0 - turn), hemA: flip(hemA), hemB: flip(hemB) }
}

/** The same piece walked from B: the order reversed and the turns negated. */
export const reversed = (of: Section): Section => {
  const { legs, turns, hemA, hemB } = mirrored(of)
  return { legs: legs.toReversed(), turns: turns.toReversed(), hemA: hemB, hemB: hemA }
}

const eighths = (from: number, to: number) =>
  fc.integer({ min: from * 8, max: to * 8 }).map((n) => n / 8)

const turnArbitrary = fc
  .tuple(fc.constantFrom(30, 45, 53.1, 72, 90, 90, 90, 120, 135), fc.boolean())
  .map(([turn, left]) => (left ? turn : 0 - turn))

const hemArbitrary: fc.Arbitrary<SectionHem | null> = fc.option(
  fc.record({
    lip: fc.constantFrom(0.375, 0.5, 0.625),
    gap: fc.constantFrom(0, 0, 0.06, 0.125),
    turn: fc.constantFrom<1 | -1>(1, -1),
  }),
  { freq: 2 },
)

/** Sections of at most `most` bends, hems counted. */
export const sectionArbitrary = (most: number): fc.Arbitrary<Section> =>
  fc
    .tuple(hemArbitrary, hemArbitrary, fc.integer({ min: 0, max: most }))
    .chain(([hemA, hemB, wanted]) => {
      const hems = (hemA === null ? 0 : 1) + (hemB === null ? 0 : 1)
      const turns = Math.max(0, Math.min(wanted, most - hems))
      return fc.record({
        legs: fc.array(eighths(0.25, 8), { minLength: turns + 1, maxLength: turns + 1 }),
        turns: fc.array(turnArbitrary, { minLength: turns, maxLength: turns }),
        hemA: fc.constant(hemA),
        hemB: fc.constant(hemB),
      })
    })

export const brakeArbitrary: fc.Arbitrary<Brake> = fc
  .tuple(fc.constantFrom(...Object.values(DEMO_BRAKE)), fc.boolean())
  .map(([brake, hemsFirst]) => ({ ...brake, hemsFirst }))

export const requestArbitrary = (most: number): fc.Arbitrary<PlanRequest> =>
  fc.record({
    section: sectionArbitrary(most),
    brake: brakeArbitrary,
    sheet: fc.constant(STEEL_24),
    pieceLength: fc.constantFrom(48, 60, 61, 120, 126),
    paintedSide: fc.constantFrom<PlanRequest['paintedSide']>('left', 'right', 'both', 'none'),
  })

const wildTurn = fc
  .tuple(fc.constantFrom(15, 30, 45, 60, 72, 90, 108, 120, 135), fc.boolean())
  .map(([turn, left]) => (left ? turn : 0 - turn))

const wildHem: fc.Arbitrary<SectionHem | null> = fc.oneof(
  { weight: 3, arbitrary: fc.constant(null) },
  {
    weight: 2,
    arbitrary: fc.record({
      lip: fc.constantFrom(0.375, 0.5, 0.625, 0.75, 1),
      gap: fc.constantFrom(0, 0, 0, 0.06, 0.125, 0.25),
      turn: fc.constantFrom<1 | -1>(1, -1),
    }),
  },
)

/**
 * Sections of all sorts: legs of 3/8 to 12 in. on a grid of eighths, most of them short, turns to
 * either side, hems on two of five edges; `least` to `most` bends, hems counted.
 */
export const wildSection = (most: number, least = 0): fc.Arbitrary<Section> =>
  fc.tuple(wildHem, wildHem, fc.integer({ min: least, max: most })).chain(([hemA, hemB, bends]) => {
    const hems = most < 2 ? { hemA: null, hemB: null } : { hemA, hemB }
    const turns = Math.max(0, bends - (hems.hemA ? 1 : 0) - (hems.hemB ? 1 : 0))
    const leg = fc.oneof(fc.integer({ min: 3, max: 96 }), fc.integer({ min: 3, max: 24 }))
    return fc.record({
      legs: fc.array(
        leg.map((n) => n / 8),
        { minLength: turns + 1, maxLength: turns + 1 },
      ),
      turns: fc.array(wildTurn, { minLength: turns, maxLength: turns }),
      hemA: fc.constant(hems.hemA),
      hemB: fc.constant(hems.hemB),
    })
  })

const stretched = ({ inner, outer, apron }: ToolSet, x: number, y: number): ToolSet => {
  const stretch = (polygon: ToolSet['inner']): ToolSet['inner'] =>
    polygon.map(([px, py]) => [px * x, py * y])
  return { inner: stretch(inner), outer: stretch(outer), apron: stretch(apron) }
}

/** The demo brakes with other limits and stretched tools. */
export const wildBrake: fc.Arbitrary<Brake> = fc
  .record({
    brake: brakeArbitrary,
    maxFold: fc.constantFrom(110, 135, 140, 160),
    hemAngle: fc.constantFrom(120, 135, 150),
    hemMax: fc.constantFrom(0.625, 1),
    minFlange: fc.constantFrom(0.25, 0.375, 0.5, 0.75),
    minClamp: fc.constantFrom(0.375, 0.5, 1),
    throat: fc.constantFrom(6, 20, 40),
    opening: fc.constantFrom(0.5, 1.5, 5),
    gauge: fc.constantFrom(null, { min: 0.4, max: 40 }, { min: 1, max: 12 }),
    noseZone: fc.constantFrom(0, 0.375, 0.75),
    safety: fc.constantFrom(0, 0.02, 0.0625),
    bigFront: fc.constantFrom(4, 8),
    checkRemoval: fc.constantFrom(true, true, true, false),
    x: fc.constantFrom(0.5, 1, 1.25),
    y: fc.constantFrom(0.5, 1, 1.25),
  })
  .map(({ brake, x, y, ...limits }) => ({
    ...brake,
    ...limits,
    up: stretched(brake.up, x, y),
    // Half of the two-way brakes get other tools for folding down.
    down: brake.down && (x === 1 ? brake.down : stretched(brake.down, x, 1)),
    capacity: undefined,
  }))

export const wildRequest = (
  most: number,
  least = 0,
  brake: fc.Arbitrary<Brake> = brakeArbitrary.map((each) => ({ ...each, capacity: undefined })),
): fc.Arbitrary<PlanRequest> =>
  fc.record({
    section: wildSection(most, least),
    brake,
    sheet: fc.constantFrom(STEEL_24, STEEL_24, {
      ...STEEL_24,
      thickness: 0.04,
      springbackPer90: 3,
    }),
    pieceLength: fc.constantFrom(48, 60, 61, 120, 126),
    paintedSide: fc.constantFrom<PlanRequest['paintedSide']>('left', 'right', 'both', 'none'),
  })

/**
 * The seeds of the large properties: one that is always the same, and one of this run, which stands in
 * the name of the test. To run a failure again, put its seed in BEND_PLAN_SEED.
 */
export const SEEDS = [
  { name: 'fixed', seed: 20_261_201 },
  {
    name: 'this run',
    seed: Number(process.env.BEND_PLAN_SEED ?? Math.floor(Math.random() * 2 ** 31)),
  },
] as const

/** Every property draws the same cases on every run. */
export const CASES = { seed: 20_260_801 }
