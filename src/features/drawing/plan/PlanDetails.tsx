import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { brakesQuery } from '@/features/brakes/api/brakes.queries'
import { planQuery } from '@/features/plans/api/plans.queries'
import { BrakeAnswers } from './BrakeAnswers'

interface Props {
  readonly profile: Profile
  readonly stock: Stock
  readonly pieceLength: number
}

/** How every brake bends an ordered piece, hit by hit, or why not; asked for when it is opened. */
export function PlanDetails({ profile, stock, pieceLength }: Props) {
  const { t } = useTranslation('why')
  const [open, setOpen] = useState(false)
  return (
    <details onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="min-h-target cursor-pointer py-2 text-dye underline">
        {t('brakesTitle')}
      </summary>
      {open && <Answers profile={profile} stock={stock} pieceLength={pieceLength} />}
    </details>
  )
}

function Answers({ profile, stock, pieceLength }: Props) {
  const plans = useQuery(planQuery({ profile, stockId: stock.id, pieceLength }))
  const brakes = useQuery(brakesQuery())
  const failed = plans.error ?? brakes.error
  if (failed) {
    return (
      <ErrorState
        error={failed}
        onRetry={() => {
          void plans.refetch()
          void brakes.refetch()
        }}
      />
    )
  }
  if (!plans.data || !brakes.data) return <LoadingState />
  return (
    <BrakeAnswers
      plans={plans.data.brakes}
      brakes={brakes.data.items}
      profile={profile}
      stock={stock}
      pieceLength={pieceLength}
      confirmed
    />
  )
}
