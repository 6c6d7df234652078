import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Brake, ToolSet } from '#shared/bend-plan/brake.schema'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { packCost } from '#shared/bend-plan/packed-cost'
import { planSchema } from '#shared/bend-plan/plan.schema'
import type { Plan } from '#shared/bend-plan/plan.schema'
import { planBends } from '#shared/bend-plan/planner'
import { replayPlan } from '#shared/bend-plan/replay'
import {
  SEEDS,
  mirrored,
  request,
  requestArbitrary,
  reversed,
  sectionArbitrary,
  wildRequest,
} from '../../support/bend-plan-cases'

const OTHER_SIDE = { left: 'right', right: 'left', both: 'both', none: 'none' } as const

/** One number that compares as the cost does; a section that does not bend costs more than any. */
const price = ({ cost }: Plan): number => (cost === null ? Infinity : packCost(cost))

type Asked = Parameters<typeof planBends>[0]

/** Mostly anything, and pieces short enough in the leg to have room on a brake. */
const asking = (most: number) => fc.oneof(wildRequest(most), requestArbitrary(most))

describe.each(SEEDS)('what every plan must hold ($name seed $seed)', ({ seed }) => {
  const check = (most: number, of: Parameters<typeof fc.property<[Asked]>>[1], numRuns = 150) => {
    fc.assert(fc.property(asking(most), of), { seed, numRuns })
  }

  test('a plan of any section, read back from its own text, may be made, and says what it must', () => {
    let bends = 0
    check(
      8,
      (asked) => {
        const text = JSON.stringify(planBends(asked))
        const copy: Asked = structuredClone(asked)
        expect(JSON.stringify(planBends(copy))).toBe(text)
        const plan = planSchema.parse(JSON.parse(text))
        expect(plan.proven).toBe(true)
        expect(plan.reasons.length > 0).toBe(!plan.feasible)
        expect(plan.cost === null).toBe(!plan.feasible)
        if (!plan.feasible) {
          expect(plan.steps).toEqual([])
          return
        }
        bends++
        expect(replayPlan(plan, asked)).toEqual({ problems: [], cost: plan.cost })
        expect(plan.lowerBound).toEqual(plan.cost)
        expect(plan.seconds).toBe(
          plan.steps.reduce((sum, step) => sum + (step.seconds ?? NaN), 0) || null,
        )
      },
      1000,
    )
    expect(bends).toBeGreaterThan(150)
  })

  test('the mirror image, and the walk from the other edge, cost the same', () => {
    check(
      7,
      (asked) => {
        const { cost } = planBends(asked)
        for (const seen of [mirrored(asked.section), reversed(asked.section)]) {
          const other = { ...asked, section: seen, paintedSide: OTHER_SIDE[asked.paintedSide] }
          expect(planBends(other).cost).toEqual(cost)
        }
      },
      500,
    )
  })

  test.each<[string, (brake: Brake) => Brake]>([
    ['folds down as well', (brake) => ({ ...brake, down: brake.up })],
    ['folds further', (brake) => ({ ...brake, maxFold: brake.maxFold + 20 })],
    ['takes a shorter flange', (brake) => ({ ...brake, minFlange: brake.minFlange / 2 })],
    ['clamps less', (brake) => ({ ...brake, minClamp: brake.minClamp / 2 })],
    ['has a deeper throat', (brake) => ({ ...brake, throat: brake.throat * 2 })],
    ['takes all hems', (brake) => ({ ...brake, hemMin: 0.1, hemMax: 3 })],
    ['asks no order of the hems', (brake) => ({ ...brake, hemsFirst: false })],
    ['holds a wider front', (brake) => ({ ...brake, bigFront: brake.bigFront * 2 })],
    [
      'gauges nearer and further',
      (brake) => ({ ...brake, gauge: brake.gauge && { min: 0, max: brake.gauge.max * 2 } }),
    ],
  ])('a brake that %s never costs more', (_, better) => {
    check(6, (asked) => {
      const able = planBends({ ...asked, brake: better(asked.brake) })
      expect(price(able)).toBeLessThanOrEqual(price(planBends(asked)))
    })
  })

  test('scaling everything scales nothing', () => {
    const factor = 4
    const polygon = (of: ToolSet['inner']): ToolSet['inner'] =>
      of.map(([x, y]) => [x * factor, y * factor])
    // Without a gauge: the height of its stop is a fixed length. The weight stays as it is.
    fc.assert(
      fc.property(sectionArbitrary(7), (section) => {
        const small = request(section, DEMO_BRAKE.site)
        const { brake, sheet } = small
        const hemA = section.hemA && { ...section.hemA, lip: section.hemA.lip * factor, gap: 0 }
        const hemB = section.hemB && { ...section.hemB, lip: section.hemB.lip * factor, gap: 0 }
        const flat = {
          ...section,
          hemA: section.hemA && { ...section.hemA, gap: 0 },
          hemB: section.hemB && { ...section.hemB, gap: 0 },
        }
        const large = request(
          { ...section, legs: section.legs.map((leg) => leg * factor), hemA, hemB },
          {
            ...brake,
            hemMin: brake.hemMin * factor,
            hemMax: brake.hemMax * factor,
            minFlange: brake.minFlange * factor,
            minClamp: brake.minClamp * factor,
            throat: brake.throat * factor,
            opening: brake.opening * factor,
            safety: brake.safety * factor,
            noseZone: brake.noseZone * factor,
            bigFront: brake.bigFront * factor,
            checkRemoval: false,
            up: {
              inner: polygon(brake.up.inner),
              outer: polygon(brake.up.outer),
              apron: polygon(brake.up.apron),
            },
            capacity: undefined,
          },
          {
            sheet: {
              ...sheet,
              thickness: sheet.thickness * factor,
              insideRadius: sheet.insideRadius * factor,
              density: sheet.density / factor / factor,
            },
          },
        )
        const plan = planBends({
          ...small,
          section: flat,
          brake: { ...brake, checkRemoval: false },
        })
        expect(planBends(large).cost).toEqual(plan.cost)
      }),
      { seed, numRuns: 150 },
    )
  })

  test('cutting off the outermost leg never takes more handling, limits and big front off', () => {
    check(6, (asked) => {
      const brake: Brake = {
        ...asked.brake,
        minFlange: 0,
        minClamp: 0,
        throat: 1000,
        gauge: null,
        bigFront: 1000,
        hemsFirst: false,
      }
      const { legs, turns } = asked.section
      const whole = { legs, turns, hemA: null, hemB: null }
      fc.pre(legs.length > 1)
      const cut = { ...whole, legs: legs.slice(0, -1), turns: turns.slice(0, -1) }
      // A lighter piece may need a smaller crew: weigh nothing.
      const sheet = { ...asked.sheet, density: 1e-9 }
      const handling = (section: typeof whole) =>
        planBends({ ...asked, section, brake, sheet }).cost?.handling ?? Infinity
      expect(handling(cut)).toBeLessThanOrEqual(handling(whole))
    })
  })
})
