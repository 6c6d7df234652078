import { useTranslation } from 'react-i18next'
import type { PieceEvent } from '#shared/pieces/pieces.contract'
import { useFormats } from '@/lib/format/useFormats'
import { PieceStateWord } from './PieceStateWord'

interface Props {
  /** Oldest first, as the API gives them. */
  readonly events: readonly PieceEvent[]
}

/** Everything that happened to a piece, the latest first: what, when, who, where and why. */
export function PieceHistory({ events }: Props) {
  const { t } = useTranslation('pieces')
  const { moment } = useFormats()
  return (
    <ol aria-label={t('history')} className="divide-y divide-rule border-y border-rule">
      {events.toReversed().map(({ id, to, at, by, station, reason, undoes }) => (
        <li key={id} className="flex flex-wrap items-start gap-x-4 gap-y-1 py-3">
          <div className="w-40">
            <PieceStateWord state={to} />
          </div>
          <time dateTime={at} className="w-48 font-figure text-small leading-6">
            {moment(at)}
          </time>
          <p className="min-w-40 flex-1">
            {t('byAt', { name: by, station: t(`station.${station}`) })}
            {undoes !== null && <span className="text-scribe"> · {t('undo')}</span>}
            {reason !== null && <span className="block text-scribe">{t('why', { reason })}</span>}
          </p>
        </li>
      ))}
    </ol>
  )
}
