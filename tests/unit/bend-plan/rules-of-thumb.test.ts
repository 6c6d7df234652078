import { describe, expect, test } from 'vitest'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planBends } from '#shared/bend-plan/planner'
import type { Fold } from '#shared/strip/strip.schema'
import { anyHemOrder, request } from '../../support/bend-plan-cases'
import { KNOWN_PLANS } from '../../support/known-bend-plans'

// Common practice, no source: hems first, then from the edges inwards, gauged from an edge that is
// not bent yet. The planner has none of these rules; on simple trims they come out where they cost
// nothing.

const brakes = ['upOnly', 'upAndDown', 'site'] as const

const known = (name: string) => {
  const found = KNOWN_PLANS.find((each) => each.name === name)
  if (found === undefined) throw new Error(`No known plan ${name}`)
  return found.section
}

const planOn = (name: string, brake: (typeof brakes)[number]) =>
  planBends(request(known(name), anyHemOrder(DEMO_BRAKE[brake])))

/** Whether each bend, when it is made, is the outermost of those left at one edge. */
const areMadeInwards = (name: string, brake: (typeof brakes)[number]): boolean => {
  const { turns, hemA, hemB } = known(name)
  const left: Fold[] = [
    ...(hemA ? ['hemA' as const] : []),
    ...turns.map((_, i) => i + 1),
    ...(hemB ? ['hemB' as const] : []),
  ]
  return planOn(name, brake).steps.every(({ bend }) => {
    const isOutermost = left[0] === bend || left.at(-1) === bend
    left.splice(left.indexOf(bend), 1)
    return isOutermost
  })
}

describe('rules of thumb', () => {
  test.each(
    brakes.flatMap((brake) => ['gable', 'box eave', 'box gutter'].map((name) => ({ name, brake }))),
  )('hems come first: $name on $brake', ({ name, brake }) => {
    const free = planOn(name, brake)
    const asked = planBends(request(known(name), { ...DEMO_BRAKE[brake], hemsFirst: true }))
    expect(asked.cost).toEqual(free.cost)
    expect(free.steps[0]?.hits).toBe(2)
    expect(free.steps.slice(1).map(({ hits }) => hits)).not.toContain(2)
  })

  test.each(['gable', 'box eave', 'ridge, kicked', 'Z closure', 'box gutter'])(
    'from the edges inwards: %s',
    (name) => {
      expect(brakes.filter((brake) => !areMadeInwards(name, brake))).toEqual([])
    },
  )

  test.each(['gable', 'box eave', 'Z closure', 'box gutter'])(
    'gauged from an edge not bent yet, or a hem: %s',
    (name) => {
      for (const brake of ['upOnly', 'upAndDown'] as const) {
        const rests = planOn(name, brake).steps.map(({ restsOn }) => restsOn)
        expect(rests).not.toContain('formedFace')
      }
    },
  )
})
