import { z } from 'zod'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import { stockLimits } from '#shared/profile/stock-limits'
import { valueProblems } from '#shared/profile/value-problems'
import { flatStrip, roundToShear } from '#shared/strip/flat-strip'
import { foldedSection } from '#shared/strip/folded-section'
import { sectionMeasures } from '#shared/strip/section-measures'
import { paintedArea, pieceWeight } from '#shared/strip/weight'
import { limitsInput, pieceLengthInput, profileInput, stockInput } from './kernel-input'
import type { VerbAnswer } from './verb'
import { defineVerb } from './verb'

const stripInput = z.object({
  profile: profileInput,
  // Unfolding needs no density; it is used for the weight where it is given.
  stock: stockInput.partial({ density: true, springbackPer90: true }).extend({
    widestStrip: z.number().positive().optional(),
    ...limitsInput,
  }),
  pieceLength: pieceLengthInput.optional(),
})

type StripInput = z.output<typeof stripInput>

/** The folded piece in its own frame: its border, each leg's ends, its box and its centroid. */
const sectionAnswer = (profile: StripInput['profile'], stock: StripInput['stock']) => {
  const section = foldedSection(profile, stock)
  return {
    outline: section.outline,
    legs: section.legs.map(({ leg, from, to }) => ({ leg, from, to })),
    ...sectionMeasures(section),
  }
}

const answerStrip = ({ profile, stock, pieceLength }: StripInput): VerbAnswer => {
  const { density, thickness } = stock
  const meaningless = valueProblems(profile)
  if (hasErrors(meaningless)) return { exit: 3, output: { problems: meaningless } }
  const strip = flatStrip(profile, stock)
  const problems = profileProblems(profile, stock, stockLimits({ ...stock, sheet: stock }))
  const ofThePiece =
    pieceLength === undefined
      ? {}
      : {
          ...(density === undefined
            ? {}
            : { weight: pieceWeight(strip, { thickness, density }, pieceLength) }),
          paintedArea: paintedArea(strip, profile.colorSide, pieceLength),
        }
  return {
    exit: hasErrors(problems) ? 3 : 0,
    output: {
      ...strip,
      rounded: { stripWidth: roundToShear(strip.stripWidth) },
      ...ofThePiece,
      ...(hasErrors(problems) ? {} : { section: sectionAnswer(profile, stock) }),
      problems,
    },
  }
}

/**
 * `strip`: girth, strip width and creases (inches, degrees), the width rounded for the shear, and
 * the folded `section` with its outline, box and centroid, and with `pieceLength` the painted area (square inches) and, with a density too, the weight (pounds).
 * A profile with problems of severity error exits with 3. Where its values mean something by
 * themselves, the figures are given all the same: they show by how much it fails.
 */
export const stripVerb = defineVerb(stripInput, answerStrip)
