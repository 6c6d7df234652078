import { z } from 'zod'
import { planProfile, planSection } from '#shared/bend-plan/plan-profile'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import { colorSideSchema } from '#shared/profile/profile.schema'
import { stockLimits } from '#shared/profile/stock-limits'
import {
  brakeInput,
  limitsInput,
  pieceLengthInput,
  profileInput,
  sectionInput,
  stockInput,
} from './kernel-input'
import type { VerbAnswer } from './verb'
import { defineVerb } from './verb'

/** The planner bends along the centre line, so K plays no part; no springback unless given. */
const planStock = stockInput.extend({
  springbackPer90: stockInput.shape.springbackPer90.default(0),
})

const common = { brake: brakeInput, pieceLength: pieceLengthInput }

const ofProfile = z.object({
  ...common,
  profile: profileInput,
  stock: planStock.extend(limitsInput),
})

const ofSection = z.object({
  ...common,
  section: sectionInput,
  // Its corners are sharp, so that the inside radius plays no part either.
  stock: planStock.extend({ insideRadius: planStock.shape.insideRadius.default(0) }),
  colorSide: colorSideSchema.default('left'),
})

const planOfProfile = defineVerb(
  ofProfile,
  ({ profile, stock, brake, pieceLength }): VerbAnswer => {
    const problems = profileProblems(profile, stock, stockLimits({ ...stock, sheet: stock }))
    if (hasErrors(problems)) {
      return { exit: 3, output: { feasible: false, proven: true, steps: [], problems } }
    }
    const plan = planProfile(profile, stock, brake, pieceLength)
    return { exit: plan.feasible ? 0 : 3, output: { ...plan, problems } }
  },
)

const planOfSection = defineVerb(
  ofSection,
  ({ section, stock, brake, pieceLength, colorSide }): VerbAnswer => {
    const plan = planSection({ section, sheet: stock, brake, pieceLength, paintedSide: colorSide })
    return { exit: plan.feasible ? 0 : 3, output: plan }
  },
)

const eitherInput = z
  .looseObject({})
  .refine((input) => input.profile === undefined || input.section === undefined, {
    error: 'Give a profile or a section, not both.',
  })

/**
 * `plan`: the bend plan of a profile on a brake, or of a `section` as it stands (centre-line legs
 * to sharp corners, turns, hems; `colorSide` left unless given). Exits with 3 where no order bends
 * it, or where the profile has problems of severity error, which are then listed.
 */
export const planVerb = defineVerb(eitherInput, (input) =>
  input.section === undefined ? planOfProfile(input) : planOfSection(input),
)
