import { useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { Bundle } from '#shared/bundles/bundles.contract'
import { rackQuery } from '../api/rack.queries'
import { rackPlan } from '../rack-plan'
import { RackPlanPlace } from './RackPlanPlace'

interface Props {
  /** The bundles to find: those of the order that lie here. */
  readonly bundles: readonly Bundle[]
  /** Codes of those that are ticked already. */
  readonly found: readonly string[]
}

/** The places in use as one looks at them from the counter door; those to go to stand out. */
export function RackPlan({ bundles, found }: Props) {
  const { t } = useTranslation('rack-plan')
  const rack = useQuery(rackQuery())
  const places = useMemo(
    () => rackPlan(bundles, rack.data?.bundles ?? []),
    [bundles, rack.data?.bundles],
  )
  const longest = Math.max(...bundles.map((bundle) => bundle.longest))
  return (
    <section aria-labelledby="rack-plan">
      <h2 id="rack-plan" className="mb-3 text-small text-scribe">
        {t('title')}
      </h2>
      <ul className="flex flex-wrap items-end gap-3">
        {places.map((place) => (
          <RackPlanPlace key={place.name} place={place} found={found} longest={longest} />
        ))}
      </ul>
    </section>
  )
}
