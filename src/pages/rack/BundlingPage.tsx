import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useLocation, useParams } from 'react-router-dom'
import { z } from 'zod'
import { orderNumber } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { rackQuery } from '@/features/rack/api/rack.queries'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { BundlingScreen } from './BundlingScreen'

/** Strapping the loose pieces of one order; a piece scanned on the rack's page comes ticked. */
export function BundlingPage() {
  const { t } = useTranslation('rack')
  const { orderId } = useParams()
  const scanned = z.object({ code: z.string() }).safeParse(useLocation().state)
  const rack = useQuery(rackQuery())
  const back = { to: paths.rack.home(), label: t('back') }
  const found = rack.data?.work.find((each) => each.orderId === orderId)
  const [last, setLast] = useState(found)
  if (found && found !== last) setLast(found)
  // Strapping the last loose pieces empties the work: the screen stays to say what was strapped.
  const work =
    found ?? (last !== undefined && last.orderId === orderId ? { ...last, loose: [] } : undefined)
  const bundles = rack.data?.bundles.filter((bundle) => bundle.orderId === orderId) ?? []

  if (work) {
    return (
      <BundlingScreen
        key={work.orderId}
        work={work}
        bundles={bundles}
        scanned={scanned.success ? scanned.data.code : null}
      />
    )
  }
  const [first] = bundles
  return (
    <PlaceFrame
      title={first ? orderNumber(first.orderNumber) : t('title')}
      subtitle={first?.company}
      back={back}
    >
      {rack.isPending && <LoadingState />}
      {rack.error && !rack.data && (
        <ErrorState error={rack.error} onRetry={() => void rack.refetch()} />
      )}
      {rack.data && (
        <EmptyState
          title={t('nothingLoose')}
          hint={
            bundles.length > 0
              ? bundles
                  .map((bundle) => `B${bundle.number} ${bundle.code} · ${bundle.rackPlace}`)
                  .join(', ')
              : t('nothingLooseHint')
          }
          action={<ButtonLink to={paths.rack.home()}>{t('back')}</ButtonLink>}
        />
      )}
    </PlaceFrame>
  )
}
