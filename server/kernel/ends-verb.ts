import { z } from 'zod'
import type { EndLayout, StripLayout } from '#shared/ends/end-layout'
import { layStrip } from '#shared/ends/lay-strip'
import { roundMarks } from '#shared/ends/round-marks'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import { flatStrip } from '#shared/strip/flat-strip'
import { endInput } from './ends-input'
import { pieceLengthInput, profileInput, stockInput } from './kernel-input'
import { defineVerb } from './verb'

const endsInput = z.object({
  profile: profileInput,
  stock: stockInput.partial({ density: true, springbackPer90: true }),
  pieceLength: pieceLengthInput,
  ends: z.tuple([endInput, endInput]),
})

const endOutput = ({ side, marks, ...rest }: EndLayout, { outline }: StripLayout) => ({
  end: side,
  marks,
  marksRounded: roundMarks(marks),
  outlines: [outline],
  ...rest,
})

/**
 * `ends`: the strip with both ends dressed, inches. `ends` in and out are the left end and the
 * right one of the strip laid left side up, edge A nearest. `at` counts from edge A; `along` of a
 * mark from the blank's square end at its own side, smallest 0, and of a polygon's corner from the
 * blank's left end. `marksRounded` are to be read off a tape. Exits with 3 where the profile or an
 * end cannot be made, the problems listed.
 */
export const endsVerb = defineVerb(endsInput, ({ profile, stock, pieceLength, ends }) => {
  const problems = profileProblems(profile, stock)
  if (hasErrors(problems)) return { exit: 3, output: { problems } }
  const [left, right] = ends
  const laid = layStrip({
    profile,
    sheet: stock,
    pieceLength,
    ends: { left, right, lowEnd: null },
  })
  if (!laid.ok) return { exit: 3, output: { problems: laid.problems } }
  const { layout } = laid
  return {
    exit: 0,
    output: {
      ends: [endOutput(layout.left, layout), endOutput(layout.right, layout)],
      blankLength: layout.blankLength,
      stripWidth: layout.stripWidth,
      outline: layout.outline,
      creases: flatStrip(profile, stock).creases,
      problems,
    },
  }
})
