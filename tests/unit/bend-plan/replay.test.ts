import { describe, expect, test } from 'vitest'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import type { Plan } from '#shared/bend-plan/plan.schema'
import { pieceReason } from '#shared/bend-plan/plan-reasons'
import { planBends } from '#shared/bend-plan/planner'
import { replayPlan } from '#shared/bend-plan/replay'
import { hem, request, section } from '../../support/bend-plan-cases'

const asked = request(section([4, 4, 0.75], [-90, 45], { B: hem(-1) }), DEMO_BRAKE.upOnly)
const plan = planBends(asked)
const codes = (changed: Partial<Plan>) =>
  replayPlan({ ...plan, ...changed }, asked).problems.map(({ code }) => code)

describe('replay', () => {
  test('finds nothing to say about the plan itself', () => {
    expect(replayPlan(plan, asked)).toEqual({ problems: [], cost: plan.cost })
  })

  test('finds a step left out, made twice or of no bend', () => {
    expect(codes({ steps: plan.steps.slice(0, -1) })).toEqual(['unfinished'])
    expect(codes({ steps: [...plan.steps, ...plan.steps.slice(-1)] })).toEqual(['madeBefore'])
    const [first, ...rest] = plan.steps
    if (first === undefined) throw new Error('The plan has steps')
    expect(codes({ steps: [first, ...rest, { ...first, bend: 9 }] })).toEqual(['unknownBend'])
  })

  test('finds a step that fails a test', () => {
    const steps = plan.steps.map((step, i) => (i === 1 ? { ...step, leftUp: !step.leftUp } : step))
    const { problems } = replayPlan({ ...plan, steps }, asked)
    expect(problems).toContainEqual({
      code: 'test',
      step: 1,
      failure: { check: 'direction', found: null, limit: null },
    })
  })

  test('finds a figure that was altered', () => {
    const steps = plan.steps.map((step, i) => (i === 1 ? { ...step, gauge: 7 } : step))
    expect(replayPlan({ ...plan, steps }, asked).problems).toEqual([
      { code: 'figure', step: 1, figure: 'gauge' },
    ])
  })

  test('finds that the piece does not go on the brake', () => {
    const { problems } = replayPlan(plan, { ...asked, pieceLength: 200 })
    expect(problems).toContainEqual({
      code: 'piece',
      reason: pieceReason('length', 200, 126),
    })
  })
})
