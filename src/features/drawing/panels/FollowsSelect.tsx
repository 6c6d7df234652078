import type { Dispatch } from 'react'
import { useTranslation } from 'react-i18next'
import { includedFromRoof, resolveFollows } from '#shared/profile/follows'
import { followsSchema, type Follows, type Profile } from '#shared/profile/profile.schema'
import { pitchAngle, printAngle } from '#shared/units/angle'
import type { Degrees } from '#shared/units/brands'
import { Select } from '@/components/Select'
import type { Board, BoardEvent } from '../model/board'
import { editProfile } from '../model/board-document'
import { needsSecond, takesSecond, tieTo } from '../model/second-slope'
import { SecondSlope } from './SecondSlope'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly profile: Profile
  readonly bend: number
  readonly pitchRise: number | null
}

const RULES = followsSchema.shape.rule.options

/** Ties a bend to the roof: its angle then comes from the job's pitch, and changes with it. */
export function FollowsSelect({ board, dispatch, profile, bend, pitchRise }: Props) {
  const { t } = useTranslation('drawing')
  const slope = pitchRise === null ? null : pitchAngle(pitchRise)
  const follows = profile.bends[bend - 1]?.follows ?? null

  const optionOf = (rule: Follows['rule']) => {
    const angle = includedFromRoof(tieTo(rule, follows), slope)
    return {
      value: rule,
      label: angle === null ? t(`follows.${rule}`) : `${t(`follows.${rule}`)} ${printAngle(angle)}`,
      // A slope that is still to be typed is asked for once the rule is chosen.
      disabled: angle === null && !(needsSecond(rule) && slope !== null),
    }
  }

  function tie(next: Follows | null, typing?: string) {
    const tied = editProfile(board.history.present, { kind: 'setFollows', bend, follows: next })
    if (tied.profile === null) return
    dispatch({
      type: 'change',
      document: { ...tied, profile: resolveFollows(tied.profile, pitchRise) },
      ...(typing === undefined ? {} : { typing }),
    })
  }

  function choose(value: string) {
    const rule = RULES.find((known) => known === value)
    tie(rule === undefined ? null : tieTo(rule, follows))
  }

  function giveSecond(given: Follows, second: Degrees | undefined) {
    const { rule, pitch } = given
    tie({ rule, pitch, ...(second === undefined ? {} : { second }) }, `second ${bend}`)
  }

  return (
    <>
      <Select
        label={t('follows.label')}
        value={follows?.rule ?? ''}
        options={[{ value: '', label: t('follows.none') }, ...RULES.map(optionOf)]}
        onChange={(event) => choose(event.target.value)}
      />
      {follows && takesSecond(follows.rule) && (
        <SecondSlope
          key={`${bend} ${follows.rule}`}
          rule={follows.rule}
          value={follows.second}
          jobSlope={slope}
          onChange={(second) => giveSecond(follows, second)}
        />
      )}
    </>
  )
}
