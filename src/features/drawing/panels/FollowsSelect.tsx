import type { Dispatch } from 'react'
import { useTranslation } from 'react-i18next'
import { includedFromRoof, resolveFollows } from '#shared/profile/follows'
import { followsSchema, type Follows, type Profile } from '#shared/profile/profile.schema'
import { pitchAngle, printAngle } from '#shared/units/angle'
import { Select } from '@/components/Select'
import type { Board, BoardEvent } from '../model/board'
import { editProfile } from '../model/board-document'

interface Props {
  readonly board: Board
  readonly dispatch: Dispatch<BoardEvent>
  readonly profile: Profile
  readonly bend: number
  readonly pitchRise: number | null
}

/** A transition needs a second slope, which this form does not ask for. */
const RULES = followsSchema.shape.rule.options.filter((rule) => rule !== 'transition')

/** Ties a bend to the roof: its angle then comes from the job's pitch, and changes with it. */
export function FollowsSelect({ board, dispatch, profile, bend, pitchRise }: Props) {
  const { t } = useTranslation('drawing')
  const slope = pitchRise === null ? null : pitchAngle(pitchRise)
  const follows = profile.bends[bend - 1]?.follows ?? null

  const optionOf = (rule: Follows['rule']) => {
    const angle = includedFromRoof({ rule, pitch: 'job' }, slope)
    return {
      value: rule,
      label: angle === null ? t(`follows.${rule}`) : `${t(`follows.${rule}`)} ${printAngle(angle)}`,
      disabled: angle === null,
    }
  }

  function choose(value: string) {
    const rule = RULES.find((known) => known === value)
    const tie = rule === undefined ? null : ({ rule, pitch: 'job' } as const)
    const tied = editProfile(board.history.present, { kind: 'setFollows', bend, follows: tie })
    if (tied.profile === null) return
    dispatch({
      type: 'change',
      document: { ...tied, profile: resolveFollows(tied.profile, pitchRise) },
    })
  }

  return (
    <Select
      label={t('follows.label')}
      value={follows?.rule ?? ''}
      options={[{ value: '', label: t('follows.none') }, ...RULES.map(optionOf)]}
      onChange={(event) => choose(event.target.value)}
    />
  )
}
