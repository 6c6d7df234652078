import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import type { Section } from '#shared/bend-plan/plan.schema'
import { planBends } from '#shared/bend-plan/planner'
import { request, section } from '../support/bend-plan-cases'
import { sample } from './bench-row'
import type { BenchRow } from './bench-row'

/** A fixed sequence of numbers from 0 to 1, so that every run plans the same sections. */
const numbers = (seed: number) => () => {
  seed = (seed * 1_103_515_245 + 12_345) % 2 ** 31
  return seed / 2 ** 31
}

/** Panels: legs of 1 to 3 in., turns in pairs to either side. */
const panels = (bends: number, count: number): Section[] => {
  const next = numbers(bends)
  return Array.from({ length: count }, () =>
    section(
      Array.from({ length: bends + 1 }, () => 1 + Math.floor(next() * 16) / 8),
      Array.from({ length: bends }, (_, i) => {
        const side = Math.floor(i / 2) % 2 === 0 ? 1 : -1
        return side * (45 + Math.floor(next() * 4) * 15)
      }),
    ),
  )
}

const brakes = [DEMO_BRAKE.upOnly, DEMO_BRAKE.upAndDown]

/** How long a plan takes by the number of bends, on the two demo brakes of a shop. */
export const benchPlan = (): BenchRow[] =>
  [
    { bends: 4, times: 400 },
    { bends: 8, times: 200 },
    { bends: 12, times: 60 },
    { bends: 16, times: 20 },
  ].map(({ bends, times }) => {
    const requests = panels(bends, times).map((each, i) =>
      request(each, brakes[i % brakes.length] ?? DEMO_BRAKE.upOnly),
    )
    let bendable = 0
    const took = sample((index) => {
      const asked = requests[index]
      if (asked !== undefined && planBends(asked).feasible) bendable += 1
    }, times)
    const share = Math.round((100 * bendable) / (times + Math.min(times, 200)))
    return { name: `Plan of ${bends} bends`, unit: 'ms', ...took, note: `${share}% bend` }
  })
