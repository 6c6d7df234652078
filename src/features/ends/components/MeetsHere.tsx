import { useTranslation } from 'react-i18next'
import type { ClosedEnds } from '#shared/ends/close-ends'
import type { LegClosing } from '#shared/ends/closing-edges'
import type { EndOfPiece } from '#shared/ends/folded-end'
import { printAngle } from '#shared/units/angle'
import { Icon } from '@/components/Icon'
import { Select } from '@/components/Select'
import { useUnits } from '@/features/people/useUnits'
import { layThatCloses, type Neighbor } from '../model/neighbors'
import { useEndWords } from '../useEndWords'
import type { Met } from '../useNeighbor'

interface Props {
  readonly own: EndOfPiece
  readonly ownKey: string
  readonly meeting: Met
  readonly disabled: boolean
}

/** Which end meets this one in its corner, and on which legs the two close. */
export function MeetsHere({ own, ownKey, meeting, disabled }: Props) {
  const { t } = useTranslation('ends')
  const words = useEndWords()
  const { neighbors, met, closed, choose } = meeting

  const nameOf = ({ line, side, hand }: Neighbor): string =>
    t('meets.option', {
      line: line.key === ownKey ? t('meets.own') : `${line.mark} ${line.name}`,
      side: words.side(side),
      hand: hand === null ? '' : ` (${words.hand(hand)})`,
    })

  if (neighbors.length === 0) {
    return <p className="text-small text-scribe">{t(`meets.nobody.${own.side}`)}</p>
  }
  return (
    <div className="flex flex-col gap-3">
      <Select
        label={t('meets.label')}
        placeholder={t('meets.choose')}
        value={met?.id ?? ''}
        disabled={disabled}
        options={neighbors.map((neighbor) => ({ value: neighbor.id, label: nameOf(neighbor) }))}
        onChange={(event) => choose(event.target.value)}
      />
      {met && closed && <Closing own={own} neighbor={met} closed={closed} />}
    </div>
  )
}

interface ClosingProps {
  readonly own: EndOfPiece
  readonly neighbor: Neighbor
  readonly closed: ClosedEnds
}

function Closing({ own, neighbor, closed }: ClosingProps) {
  const { t } = useTranslation('ends')
  const name = neighbor.line.mark
  if (!closed.ok) {
    return (
      <p role="status" className="font-semibold text-chalk">
        {t(`meets.refused.${closed.code}`)}
      </p>
    )
  }
  const lay = closed.closes ? null : layThatCloses(own, neighbor)
  return (
    <div role="status" className="flex flex-col gap-2">
      <p className={`flex gap-2 font-semibold ${closed.closes ? 'text-oxide' : 'text-chalk'}`}>
        <Icon name={closed.closes ? 'done' : 'warn'} className="mt-0.5 size-5" />
        {closed.closes ? t('meets.closes') : t('meets.open')}
      </p>
      {!closed.closes && (
        <div className="grid gap-x-6 gap-y-2 sm:grid-cols-2">
          <Legs title={t('meets.thisPiece')} closings={closed.a} />
          <Legs title={t('meets.otherPiece', { name })} closings={closed.b} />
        </div>
      )}
      {lay !== null && <p>{t('meets.layCloses', { name, lay: printAngle(lay) })}</p>}
    </div>
  )
}

interface LegsProps {
  readonly title: string
  readonly closings: readonly LegClosing[]
}

function Legs({ title, closings }: LegsProps) {
  const { t } = useTranslation('ends')
  const { size } = useUnits()
  return (
    <div>
      <p className="text-small text-scribe">{title}</p>
      <ul>
        {closings.map(({ leg, nearest, closesOn, gap }) => (
          <li key={leg} className={closesOn === null ? 'text-chalk' : ''}>
            {closesOn === null
              ? t('meets.gap', { leg, gap: size(gap), nearest })
              : t('meets.closesOn', { leg, on: closesOn })}
          </li>
        ))}
      </ul>
    </div>
  )
}
