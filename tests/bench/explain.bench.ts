import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { planProfile } from '#shared/bend-plan/plan-profile'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import type { Profile } from '#shared/profile/profile.schema'
import { profileOf, STEEL } from '../support/arbitrary-profile'
import { sample } from './bench-row'
import type { BenchRow } from './bench-row'

/** A fixed sequence of numbers from 0 to 1, so that every run explains the same profiles. */
const numbers = (seed: number) => () => {
  seed = (seed * 1_103_515_245 + 12_345) % 2 ** 31
  return seed / 2 ** 31
}

const brakes = [DEMO_BRAKE.upOnly, DEMO_BRAKE.upAndDown]

const PIECE = 120

interface Case {
  readonly profile: Profile
  readonly brake: (typeof brakes)[number]
}

/** Panels without errors that no order of single full folds bends. */
const blockedPanels = (bends: number, count: number): Case[] => {
  const next = numbers(bends)
  const found: Case[] = []
  while (found.length < count) {
    const profile = profileOf(
      Array.from({ length: bends + 1 }, () => 0.75 + Math.floor(next() * 16) / 8),
      Array.from({ length: bends }, (_, i) => {
        const side = Math.floor(i / 2) % 2 === 0 ? 1 : -1
        return side * (45 + Math.floor(next() * 5) * 15)
      }),
    )
    const brake = brakes[found.length % brakes.length] ?? DEMO_BRAKE.upOnly
    if (hasErrors(profileProblems(profile, STEEL))) continue
    if (planProfile(profile, STEEL, brake, PIECE, { explain: false }).feasible) continue
    found.push({ profile, brake })
  }
  return found
}

/** How long it takes to say why a panel cannot be bent, and what would cure it. */
export const benchExplain = (): BenchRow[] =>
  [
    { bends: 4, times: 100 },
    { bends: 8, times: 100 },
    { bends: 12, times: 30 },
  ].map(({ bends, times }) => {
    const cases = blockedPanels(bends, times)
    let cured = 0
    const took = sample((index) => {
      const asked = cases[index]
      if (asked === undefined) return
      const { cures } = planProfile(asked.profile, STEEL, asked.brake, PIECE)
      if (cures.length > 0) cured += 1
    }, times)
    const share = Math.round((100 * cured) / (times + Math.min(times, 200)))
    return {
      name: `Reasons and cures, ${bends} bends`,
      unit: 'ms',
      ...took,
      note: `${share}% cured`,
    }
  })
