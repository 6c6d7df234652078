import { useTranslation } from 'react-i18next'
import type { Part } from '#shared/drawing/display-list'
import type { Profile } from '#shared/profile/profile.schema'
import { findLegForGirth, girthDifference } from '#shared/profile/stated-girth'
import { Button } from '@/components/Button'
import { GirthDifference } from '@/features/orders/components/StatedGirth'
import { useUnits } from '@/features/people/useUnits'

interface Props {
  readonly profile: Profile
  /** The girth that the line of the order expects, inches. */
  readonly stated: number
  /** A leg in hand is the one that gives way; otherwise the last one. */
  readonly selected: Part | null
  readonly onProfile: (profile: Profile) => void
}

/** How far the drawing is off the girth that its order expects, and the press that sets a leg to it. */
export function GirthNotice({ profile, stated, selected, onProfile }: Props) {
  const { t } = useTranslation('orders')
  const { size } = useUnits()
  if (girthDifference(profile, stated) === 0) return null
  const leg = selected?.kind === 'leg' ? selected.leg : profile.legs.length
  const length = findLegForGirth(profile, leg, stated)
  return (
    <div className="flex flex-wrap items-center gap-x-2 border-t border-rule px-3 pt-1.5 text-small">
      <GirthDifference profile={profile} stated={stated} />
      {length === null ? (
        <p className="text-chalk">{t('girth.noLeg', { leg })}</p>
      ) : (
        <Button
          variant="quiet"
          className="-ml-2 px-2! font-normal! underline"
          onClick={() => onProfile({ ...profile, legs: profile.legs.with(leg - 1, length) })}
        >
          {t('girth.solve', { leg, length: size(length, 32) })}
        </Button>
      )}
    </div>
  )
}
