import { describe, expect, it } from 'vitest'
import { countByName } from '@/features/rack/bundle-words'
import { rackPlan } from '@/features/rack/rack-plan'
import { bundleOf, OTHER_ORDER_ID } from './counter-data'

const at = (number: number, rackPlace: string) => bundleOf(number, { rackPlace })
const other = (number: number, rackPlace: string) =>
  bundleOf(number, { rackPlace, orderId: OTHER_ORDER_ID })

describe('the rack as it is drawn', () => {
  it('bays by number, then the floor', () => {
    const plan = rackPlan([at(1, 'R10'), at(2, 'F1')], [other(7, 'R2'), other(8, 'F2')])
    expect(plan.map(({ name, onFloor }) => [name, onFloor])).toEqual([
      ['R2', false],
      ['R10', false],
      ['F1', true],
      ['F2', true],
    ])
  })

  it('tells the bundles of the order from those of others', () => {
    const plan = rackPlan([at(1, 'R3'), at(2, 'R3')], [at(1, 'R3'), at(2, 'R3'), other(7, 'R3')])
    expect(plan).toHaveLength(1)
    expect(plan[0]?.bundles.map(({ number }) => number)).toEqual([1, 2])
    expect(plan[0]?.others).toBe(1)
  })

  it('is drawn from the order alone while the rest is not read', () => {
    expect(rackPlan([at(1, 'R3')], []).map(({ name }) => name)).toEqual(['R3'])
  })
})

it('counts pieces by name, in the order in which they come', () => {
  const pieces = ['Gable', 'Peak', 'Gable'].map((name) => ({ name }))
  expect(countByName(pieces)).toEqual([
    { name: 'Gable', count: 2 },
    { name: 'Peak', count: 1 },
  ])
})
