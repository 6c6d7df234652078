import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planBends } from '#shared/bend-plan/planner'
import type { PlanRequest } from '#shared/bend-plan/planner'
import { request } from '../support/bend-plan-cases'
import { percentiles } from './bench-row'
import type { BenchRow } from './bench-row'
import { FAMILY_NAMES, sectionsOf } from './plan-families'
import type { FamilyName } from './plan-families'

const SIZES = [
  { bends: 4, count: 30 },
  { bends: 8, count: 30 },
  { bends: 12, count: 30 },
  { bends: 16, count: 10 },
  { bends: 20, count: 4 },
]

const BRAKES = [DEMO_BRAKE.upOnly, DEMO_BRAKE.upAndDown]

interface Measured {
  readonly wall: number
  /** Of all threads of the process: the collector and the compiler too. */
  readonly processor: number
  /** Folds looked at. */
  readonly folds: number
  readonly bends: boolean
  readonly proven: boolean
}

const processorTime = (): number => {
  const { user, system } = process.cpuUsage()
  return (user + system) / 1000
}

const measure = (asked: PlanRequest): Measured => {
  let folds = 0
  const isOver = () => {
    folds += 1
    return false
  }
  const [processor, start] = [processorTime(), performance.now()]
  const plan = planBends({ ...asked, limits: { isOver } })
  return {
    wall: performance.now() - start,
    processor: processorTime() - processor,
    folds,
    bends: plan.feasible,
    proven: plan.proven,
  }
}

const rowOf = (name: string, measured: readonly Measured[]): BenchRow => {
  const processor = percentiles(measured.map((each) => each.processor))
  const folds = percentiles(measured.map((each) => each.folds))
  const proven = measured.filter((each) => each.proven).length
  return {
    name,
    unit: 'ms',
    ...percentiles(measured.map(({ wall }) => wall)),
    note: [
      `${measured.length} sections`,
      `processor p95 ${processor.p95.toFixed(1)}`,
      `folds looked at p50 ${folds.p50}, p95 ${folds.p95}`,
      `${Math.round((100 * proven) / measured.length)}% proven`,
    ].join(', '),
  }
}

const rowsOf = (name: FamilyName, bends: number, count: number): BenchRow[] => {
  const requests = sectionsOf(name, bends, count).flatMap((each) =>
    BRAKES.map((brake) => request(each, brake)),
  )
  // Once before the clock is read, so that the compiler has seen the code.
  requests.forEach(measure)
  const measured = requests.map(measure)
  return [true, false].flatMap((isBendable) => {
    const some = measured.filter((each) => each.bends === isBendable)
    const title = `${bends} bends, ${name}: ${isBendable ? 'bends' : 'does not bend'}`
    return some.length === 0 ? [] : [rowOf(title, some)]
  })
}

/** How long a plan takes by family and number of bends, on the two demo brakes of a shop. */
export const benchPlan = (): BenchRow[] =>
  SIZES.flatMap(({ bends, count }) => FAMILY_NAMES.flatMap((name) => rowsOf(name, bends, count)))
