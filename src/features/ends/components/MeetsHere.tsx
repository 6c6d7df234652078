import { useMemo, useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { LegClosing } from '#shared/ends/closing-edges'
import type { EndOfPiece } from '#shared/ends/folded-end'
import { printAngle } from '#shared/units/angle'
import { Icon } from '@/components/Icon'
import { Select } from '@/components/Select'
import { useUnits } from '@/features/people/useUnits'
import {
  closingWith,
  layThatCloses,
  neighborsOf,
  type EndedLine,
  type Neighbor,
} from '../model/neighbors'
import { useEndWords } from '../useEndWords'

interface Props {
  readonly own: EndOfPiece
  readonly ownKey: string
  readonly lines: readonly EndedLine[]
  readonly disabled: boolean
}

/** Which end meets this one in its corner, and on which legs the two close. */
export function MeetsHere({ own, ownKey, lines, disabled }: Props) {
  const { t } = useTranslation('ends')
  const words = useEndWords()
  const neighbors = useMemo(() => neighborsOf(own.side, lines), [own.side, lines])
  const [chosen, setChosen] = useState<string | null>(null)
  // Until one is chosen: the first that lies in the same corner.
  const met =
    neighbors.find(({ id }) => id === chosen) ??
    (chosen === null ? neighbors.find((each) => closingWith(own, each).ok) : undefined)

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
        onChange={(event) => setChosen(event.target.value)}
      />
      {met && <Closing own={own} neighbor={met} name={met.line.mark} />}
    </div>
  )
}

interface ClosingProps {
  readonly own: EndOfPiece
  readonly neighbor: Neighbor
  readonly name: string
}

function Closing({ own, neighbor, name }: ClosingProps) {
  const { t } = useTranslation('ends')
  const closed = closingWith(own, neighbor)
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
        <>
          <Legs title={t('meets.thisPiece')} closings={closed.a} />
          <Legs title={t('meets.otherPiece', { name })} closings={closed.b} />
        </>
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
      <h6 className="text-small text-scribe">{title}</h6>
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
