import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Profile } from '#shared/profile/profile.schema'
import { findLegForGirth, girthDifference } from '#shared/profile/stated-girth'
import { Button } from '@/components/Button'
import { Select } from '@/components/Select'
import { useUnits } from '@/features/people/useUnits'

/** Said wherever the girth that was expected and the drawn one differ. */
export function GirthDifference({ profile, stated }: GirthProps) {
  const { t } = useTranslation('orders')
  const { size } = useUnits()
  const difference = stated === null ? 0 : girthDifference(profile, stated)
  if (stated === null || difference === 0) return null
  return (
    <p className="font-semibold text-chalk">
      {t(difference > 0 ? 'girth.short' : 'girth.over', {
        stated: size(stated, 32),
        by: size(Math.abs(difference), 32),
      })}
    </p>
  )
}

interface GirthProps {
  readonly profile: Profile
  /** Inches; null where none is stated. */
  readonly stated: number | null
}

interface Props extends GirthProps {
  readonly disabled: boolean
  readonly onProfile: (profile: Profile) => void
}

/** One leg is made longer or shorter until the girth is as expected; the drawing before comes back with a press. */
export function GirthCure({ profile, stated, disabled, onProfile }: Props) {
  const { t } = useTranslation('orders')
  const { size } = useUnits()
  const [leg, setLeg] = useState(profile.legs.length)
  const [before, setBefore] = useState<{ drawn: Profile; after: Profile } | null>(null)
  const chosen = Math.min(leg, profile.legs.length)
  const differs = stated !== null && stated > 0 && girthDifference(profile, stated) !== 0
  const solved = differs ? findLegForGirth(profile, chosen, stated) : null

  function solve(length: number) {
    const after = { ...profile, legs: profile.legs.with(chosen - 1, length) }
    setBefore({ drawn: profile, after })
    onProfile(after)
  }

  if (before?.after === profile) {
    return (
      <p role="status" className="flex flex-wrap items-center gap-3">
        {t('girth.solved', { leg: chosen, length: size(profile.legs[chosen - 1] ?? 0, 32) })}
        <Button disabled={disabled} onClick={() => onProfile(before.drawn)}>
          {t('girth.undo')}
        </Button>
      </p>
    )
  }
  if (!differs) return null
  return (
    <div className="flex flex-wrap items-end gap-3">
      <Select
        label={t('girth.leg')}
        className="w-40"
        value={String(chosen)}
        disabled={disabled}
        options={profile.legs.map((length, index) => ({
          value: String(index + 1),
          label: `${index + 1}: ${size(length, 32)}`,
        }))}
        onChange={(event) => setLeg(Number(event.target.value))}
      />
      {solved === null ? (
        <p className="text-small text-chalk">{t('girth.noLeg', { leg: chosen })}</p>
      ) : (
        <Button disabled={disabled} onClick={() => solve(solved)}>
          {t('girth.solve', { leg: chosen, length: size(solved, 32) })}
        </Button>
      )}
    </div>
  )
}
