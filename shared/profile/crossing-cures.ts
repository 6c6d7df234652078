import type { ProfileCure } from '#shared/profile/profile-cure'
import type { ProfileProblem } from '#shared/profile/problem'
import type { Profile } from '#shared/profile/profile.schema'
import type { Degrees, Inches } from '#shared/units/brands'

/** An edit to try, and how much it asks for in inches, or in what counts as much. */
interface Step {
  readonly edit: ProfileCure
  readonly size: number
}

const LENGTHS: readonly Inches[] = [1 / 8, 1 / 4, 1 / 2, 1, 2, 4]
const OPENINGS: readonly Degrees[] = [5, 10, 15, 30, 45]

/** Opening an angle by 5 degrees counts as an eighth of an inch of leg. */
const DEGREES_PER_INCH = 40

/** What turning a fold to the other side counts, and leaving a hem out. Inches. */
const TURNED: Inches = 3
const DROPPED: Inches = 3.5

const legSteps = ({ legs }: Profile, first: number, last: number): Step[] =>
  legs.flatMap((length, index): Step[] => {
    const leg = index + 1
    if (leg < first || leg > last) return []
    // The two that meet get out of each other's way shorter, what lies between them longer.
    const way = leg === first || leg === last ? -1 : 1
    return LENGTHS.map((by) => ({
      edit: { kind: 'setLeg' as const, leg, length: length + way * by },
      size: by,
    })).filter(({ edit }) => edit.length > 0)
  })

/** A bend that follows the roof has its angle from there; turning it would cut it loose. */
const bendSteps = ({ bends }: Profile, first: number, last: number): Step[] =>
  bends.flatMap(({ turn, follows }, index): Step[] => {
    const bend = index + 1
    if (follows || bend < first || bend >= last) return []
    const side = Math.sign(turn)
    return [
      ...OPENINGS.filter((by) => by < Math.abs(turn)).map((by) => ({
        edit: { kind: 'setTurn' as const, bend, turn: turn - side * by },
        size: by / DEGREES_PER_INCH,
      })),
      { edit: { kind: 'setTurn', bend, turn: -turn }, size: TURNED },
    ]
  })

const hemSteps = ({ hemA, hemB }: Profile): Step[] =>
  [['A', hemA] as const, ['B', hemB] as const].flatMap(([edge, hem]): Step[] => {
    if (!hem) return []
    return [
      ...LENGTHS.filter((by) => by < hem.length).map((by) => ({
        edit: { kind: 'setHem' as const, edge, hem: { ...hem, length: hem.length - by } },
        size: by,
      })),
      {
        edit: { kind: 'setHem', edge, hem: { ...hem, turn: hem.turn === 1 ? -1 : 1 } },
        size: TURNED,
      },
      { edit: { kind: 'setHem', edge, hem: null }, size: DROPPED },
    ]
  })

/**
 * Edits that may part two runs of sheet that meet, the smallest first: legs and angles between
 * them, and the hems. Which of them do is for the caller to try.
 */
export const crossingSteps = (
  profile: Profile,
  { leg, otherLeg }: Pick<ProfileProblem, 'leg' | 'otherLeg'>,
): ProfileCure[] => {
  const first = Math.min(leg ?? 1, otherLeg ?? 1)
  const last = Math.max(leg ?? 1, otherLeg ?? 1)
  return [
    ...legSteps(profile, first, last),
    ...bendSteps(profile, first, last),
    ...hemSteps(profile),
  ]
    .toSorted((a, b) => a.size - b.size)
    .map(({ edit }) => edit)
}
