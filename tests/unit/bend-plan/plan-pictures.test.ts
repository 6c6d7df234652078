import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { stepPictures } from '#shared/bend-plan/plan-pictures'
import { planBends } from '#shared/bend-plan/planner'
import { distance } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import { CASES, hem, request, requestArbitrary, section } from '../../support/bend-plan-cases'

const rounded = (points: readonly Vector[] | undefined) =>
  points?.map(({ x, y }) => [Math.round(x * 1e6) / 1e6 + 0, Math.round(y * 1e6) / 1e6 + 0])

const lengthOfAll = (points: readonly Vector[]) =>
  points.reduce((sum, point, i) => sum + distance(points[i - 1] ?? point, point), 0)

describe('pictures of the steps', () => {
  test('a bend up: the front swings from flat to its angle', () => {
    const asked = request(section([3, 2], [90]), DEMO_BRAKE.upOnly)
    const [picture, ...more] = stepPictures(planBends(asked), asked)
    expect(more).toEqual([])
    expect(rounded(picture?.clamped)).toEqual([
      [0, 0],
      [-3, 0],
    ])
    expect(rounded(picture?.frontBefore)).toEqual([
      [0, 0],
      [2, 0],
    ])
    expect(rounded(picture?.frontAfter)).toEqual([
      [0, 0],
      [0, 2],
    ])
    expect(picture).toMatchObject({ edgeAtFront: 'B', edgeAtBack: 'A', paintedUp: true })
  })

  test('on its way the front is shown at the thirds of its swing', () => {
    const asked = request(section([3, 2], [-90]), DEMO_BRAKE.upAndDown)
    const [picture] = stepPictures(planBends(asked), asked)
    const tips = picture?.swings.map((front) => front.at(-1))
    expect(rounded(tips?.flatMap((tip) => tip ?? []))).toEqual([
      [1.732051, -1],
      [1, -1.732051],
    ])
    expect(picture?.swung).toBe(90)
  })

  test('of a hem the first hit is shown, to the hem angle', () => {
    const asked = request(section([4], [], { B: hem(1) }), DEMO_BRAKE.site)
    const [picture] = stepPictures(planBends(asked), asked)
    expect(picture?.swings).toHaveLength(1)
    const [, tip] = picture?.swings[0] ?? []
    expect((Math.atan2(tip?.y ?? NaN, tip?.x ?? NaN) * 180) / Math.PI).toBeCloseTo(145, 9)
    expect(picture?.swung).toBe(145)
  })

  test('a bend down truly swings down, paint up', () => {
    const asked = request(section([3, 2], [-90]), DEMO_BRAKE.upAndDown)
    const [picture] = stepPictures(planBends(asked), asked)
    expect(rounded(picture?.frontAfter)).toEqual([
      [0, 0],
      [0, -2],
    ])
    expect(picture?.paintedUp).toBe(true)
  })

  test('a closed hem is drawn with its lip on the clamped sheet, and stays drawn', () => {
    const asked = request(section([4, 3], [90], { B: hem(1) }), DEMO_BRAKE.upAndDown)
    const plan = planBends(asked)
    const pictures = stepPictures(plan, asked)
    expect(plan.steps.map(({ bend }) => bend)).toEqual(['hemB', 1])
    expect(rounded(pictures[0]?.frontAfter)).toEqual([
      [0, 0],
      [0, 0.024],
      [-0.5, 0.024],
    ])
    const last = pictures[1]
    expect(rounded(last?.edgeAtFront === 'B' ? last.frontBefore : last?.clamped)).toHaveLength(4)
  })

  test('a hit moves the front and stretches nothing', () => {
    fc.assert(
      fc.property(requestArbitrary(6), (asked) => {
        const plan = planBends(asked)
        const pictures = stepPictures(plan, asked)
        expect(pictures).toHaveLength(plan.steps.length)
        pictures.forEach(({ frontBefore, frontAfter, paintedUp }, i) => {
          const step = plan.steps[i]
          if (step?.hits === 1) {
            expect(lengthOfAll(frontAfter)).toBeCloseTo(lengthOfAll(frontBefore), 9)
          }
          const shown = {
            left: step?.leftUp,
            right: step?.leftUp === false,
            both: null,
            none: null,
          }
          expect(paintedUp).toBe(shown[asked.paintedSide])
        })
      }),
      { ...CASES, numRuns: 100 },
    )
  })
})
