import { isLess, TOLERANCE } from '#shared/geometry/tolerance'
import { isSlope } from '#shared/profile/follows'
import type { ProfileProblem } from '#shared/profile/problem'
import { profileProblem } from '#shared/profile/problem'
import type { Bend, Hem, Profile } from '#shared/profile/profile.schema'
import { MAX_BENDS } from '#shared/profile/profile.schema'

const countProblems = ({ legs, bends }: Profile): ProfileProblem[] => [
  ...(bends.length === legs.length - 1
    ? []
    : [
        profileProblem({
          code: 'bendCountMismatch',
          cure: 'matchBends',
          unit: 'count',
          found: bends.length,
          limit: legs.length - 1,
        }),
      ]),
  ...(bends.length <= MAX_BENDS
    ? []
    : [
        profileProblem({
          code: 'tooManyBends',
          cure: 'splitPiece',
          unit: 'count',
          found: bends.length,
          limit: MAX_BENDS,
        }),
      ]),
]

const legProblems = (length: number, leg: number): ProfileProblem[] => {
  if (!Number.isFinite(length)) {
    return [profileProblem({ code: 'notFinite', cure: 'enterNumber', leg, found: length })]
  }
  return isLess(0, length)
    ? []
    : [
        profileProblem({
          code: 'legNotPositive',
          cure: 'lengthenLeg',
          leg,
          found: length,
          limit: 0,
        }),
      ]
}

const bendProblems = ({ turn, follows }: Bend, bend: number): ProfileProblem[] => {
  const unit = 'degrees' as const
  const pitches = [follows?.pitch, follows?.second].filter((pitch) => typeof pitch === 'number')
  const notFinite = [turn, ...pitches].find((value) => !Number.isFinite(value))
  if (notFinite !== undefined) {
    return [
      profileProblem({ code: 'notFinite', cure: 'enterNumber', bend, found: notFinite, unit }),
    ]
  }
  const turned = Math.abs(turn)
  // An angle within the tolerance of flat or of folded shut is neither a bend nor a hem.
  const outOfRange = turned <= TOLERANCE || turned >= 180 - TOLERANCE
  return [
    ...(outOfRange
      ? [
          profileProblem({
            code: 'turnOutOfRange',
            cure: 'turnWithinRange',
            bend,
            found: turn,
            limit: turned <= TOLERANCE ? 0 : 180,
            unit,
          }),
        ]
      : []),
    ...pitches
      .filter((pitch) => !isSlope(pitch))
      .slice(0, 1)
      .map((pitch) =>
        profileProblem({
          code: 'pitchOutOfRange',
          cure: 'enterPitch',
          bend,
          found: pitch,
          limit: pitch < 0 ? 0 : 90,
          unit,
        }),
      ),
    ...(follows?.rule === 'transition' && follows.second === undefined
      ? [profileProblem({ code: 'followsIncomplete', cure: 'enterSecondPitch', bend, unit })]
      : []),
  ]
}

const hemProblems = (hem: Hem, edge: 'A' | 'B'): ProfileProblem[] => {
  const values = hem.style === 'open' ? [hem.length, hem.gap] : [hem.length]
  const notFinite = values.find((value) => !Number.isFinite(value))
  if (notFinite !== undefined) {
    return [profileProblem({ code: 'notFinite', cure: 'enterNumber', hem: edge, found: notFinite })]
  }
  return [
    ...(isLess(0, hem.length)
      ? []
      : [
          profileProblem({
            code: 'hemNotPositive',
            cure: 'lengthenHem',
            hem: edge,
            found: hem.length,
            limit: 0,
          }),
        ]),
    ...(hem.style === 'closed' || isLess(0, hem.gap)
      ? []
      : [
          profileProblem({
            code: 'gapNotPositive',
            cure: 'enterGap',
            hem: edge,
            found: hem.gap,
            limit: 0,
          }),
        ]),
  ]
}

/** Values that mean nothing by themselves, whatever the sheet: not a number, not positive, no turn. */
export const valueProblems = (profile: Profile): ProfileProblem[] => [
  ...countProblems(profile),
  ...profile.legs.flatMap((leg, index) => legProblems(leg, index + 1)),
  ...profile.bends.flatMap((bend, index) => bendProblems(bend, index + 1)),
  ...(profile.hemA ? hemProblems(profile.hemA, 'A') : []),
  ...(profile.hemB ? hemProblems(profile.hemB, 'B') : []),
]
