import { useId } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import type { Profile } from '#shared/profile/profile.schema'
import { useUnits } from '@/features/people/useUnits'
import type { Run, TurnsTo } from '../model/corner-presets'
import type { DraftEnd } from '../model/draft-end'
import { tabOf, USUAL_TAB, withTab } from '../model/end-edits'
import { EndLengthField } from './EndLengthField'
import { LegCut } from './LegCut'

interface Props {
  readonly end: DraftEnd
  readonly side: Side
  readonly profile: Profile
  readonly run: Run
  readonly outer: TurnsTo
  readonly disabled: boolean
  readonly onChange: (end: DraftEnd) => void
}

/** The longest tab the shop folds, inches. */
const LONGEST_TAB = 12

/** What a leg has of its own at this end: a cut other than the end's, a tab. */
export function LegByLeg({ end, side, profile, run, outer, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  const { size } = useUnits()
  const id = useId()
  return (
    <ul className="divide-y divide-rule border-y border-rule">
      {profile.legs.map((length, index) => {
        const leg = index + 1
        const tab = tabOf(end, leg)
        return (
          <li key={leg} aria-labelledby={`${id} ${leg}`} className="flex flex-col gap-2 py-2">
            <div className="flex flex-wrap items-center gap-x-4">
              <p id={`${id} ${leg}`} className="min-w-28 flex-1">
                <span className="font-semibold">{t('drawing:part.leg', { number: leg })}</span>{' '}
                <span className="font-figure text-scribe">{size(length)}</span>
              </p>
              <label className="inline-flex min-h-target items-center gap-2.5">
                <input
                  type="checkbox"
                  className="size-5 accent-dye"
                  disabled={disabled}
                  checked={tab !== undefined}
                  onChange={(event) =>
                    onChange(withTab(end, leg, event.target.checked ? USUAL_TAB : undefined))
                  }
                />
                {t('tab.has')}
                <span className="sr-only">, {t('drawing:part.leg', { number: leg })}</span>
              </label>
            </div>
            {tab && (
              <EndLengthField
                label={t('tab.length', { leg })}
                value={tab.length}
                most={LONGEST_TAB}
                disabled={disabled}
                onChange={(tabLength) => onChange(withTab(end, leg, tabLength))}
              />
            )}
            {end.kind === 'miter' && (
              <LegCut
                end={end}
                leg={leg}
                side={side}
                run={run}
                outer={outer}
                disabled={disabled}
                onChange={onChange}
              />
            )}
          </li>
        )
      })}
    </ul>
  )
}
