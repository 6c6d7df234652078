import fc from 'fast-check'
import type { Brake } from '#shared/bend-plan/brake.schema'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import type { Section } from '#shared/bend-plan/plan.schema'
import type { PlanRequest } from '#shared/bend-plan/planner'
import type { SectionHem } from '#shared/bend-plan/section'
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

/** Every property draws the same cases on every run. */
export const CASES = { seed: 20_260_801 }
