import type { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import type { Section } from '#shared/bend-plan/plan.schema'
import { hem, section } from './bend-plan-cases'

export type Outcome = readonly [handling: number, wideFront: number, faceGauge: number] | 'no'

export interface KnownPlan {
  readonly name: string
  readonly section: Section
  readonly outcome: Readonly<Record<keyof typeof DEMO_BRAKE, Outcome>>
}

const right = hem(-1)
const left = hem(1)

/**
 * Outcomes reached by an independent trial of the full model: 24 ga steel, 120 in., closed hems of
 * 1/2 in., hems in any order, color on the left, legs as planning lengths.
 */
export const KNOWN_PLANS: readonly KnownPlan[] = [
  {
    name: 'ridge, kicked',
    section: section([0.75, 6, 6, 0.75], [-45, -53.1, -45]),
    outcome: { upOnly: [6, 0, 2], upAndDown: [4, 0, 2], site: [6, 0, 0] },
  },
  {
    name: 'gable',
    section: section([4, 4, 0.75], [-90, 45], { B: right }),
    outcome: { upOnly: [4, 2, 0], upAndDown: [0, 1, 0], site: [4, 2, 0] },
  },
  {
    name: 'box eave',
    section: section([5, 6, 1.25], [-72, -90], { B: left }),
    outcome: { upOnly: [10, 1, 0], upAndDown: [0, 1, 0], site: [10, 1, 0] },
  },
  {
    name: 'W valley',
    section: section([10, 1.125, 1.125, 10], [63.4, -90, 63.4], { A: left, B: left }),
    outcome: { upOnly: [30, 2, 1], upAndDown: [12, 1, 0], site: 'no' },
  },
  {
    name: 'Z closure',
    section: section([1, 1.5, 1], [90, -90]),
    outcome: { upOnly: [4, 2, 0], upAndDown: [0, 1, 0], site: [4, 2, 0] },
  },
  {
    name: 'corner with pockets',
    section: section([0.75, 1.25, 4, 4, 1.25, 0.75], [-90, -90, -90, -90, -90]),
    outcome: { upOnly: 'no', upAndDown: 'no', site: 'no' },
  },
  {
    name: 'box gutter',
    section: section([0.75, 4.5, 5, 5.5], [90, 90, 90], { A: left }),
    outcome: { upOnly: [8, 1, 0], upAndDown: [8, 1, 0], site: [8, 1, 0] },
  },
  {
    name: 'coping',
    section: section([0.75, 4, 12, 3.5, 0.75], [45, -90, -90, 45], { A: right, B: right }),
    outcome: { upOnly: [28, 1, 3], upAndDown: [12, 1, 4], site: 'no' },
  },
  {
    name: 'square spiral',
    section: section([0.6, 1, 1.4, 1.8, 2.2, 2.6], [90, 90, 90, 90, 90]),
    outcome: { upOnly: 'no', upAndDown: 'no', site: [0, 1, 0] },
  },
  {
    name: 'closed tube',
    section: section([0.75, 2, 2, 2, 2], [90, 90, 90, 90]),
    outcome: { upOnly: 'no', upAndDown: 'no', site: 'no' },
  },
]
