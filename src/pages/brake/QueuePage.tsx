import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { Select } from '@/components/Select'
import { brakesQuery } from '@/features/brakes/api/brakes.queries'
import { runsQuery } from '@/features/runs/api/runs.queries'
import { RunRow } from '@/features/runs/components/RunRow'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { BrakeNav } from './BrakeNav'

/** What to bend next: open runs by the day they are needed, for one brake or for all. */
export function QueuePage() {
  return <RunList state="open" />
}

export function DonePage() {
  return <RunList state="done" />
}

function RunList({ state }: { readonly state: 'open' | 'done' }) {
  const { t } = useTranslation('brake')
  const runs = useQuery(runsQuery(state))
  const brakes = useQuery(brakesQuery())
  const [brakeId, setBrakeId] = useState('')
  const shown = runs.data?.items.filter((run) => brakeId === '' || run.brakeId === brakeId)

  return (
    <PlaceFrame title={t('title')} subtitle={t('queue.rule')} nav={<BrakeNav />}>
      {brakes.data && (
        <Select
          label={t('queue.brake')}
          className="mb-2 max-w-80"
          value={brakeId}
          options={[
            { value: '', label: t('queue.allBrakes') },
            ...brakes.data.items.map(({ id, brake }) => ({ value: id, label: brake.name })),
          ]}
          onChange={(event) => setBrakeId(event.target.value)}
        />
      )}
      {runs.error && !runs.data && (
        <ErrorState error={runs.error} onRetry={() => void runs.refetch()} />
      )}
      {runs.isPending && <LoadingState />}
      {shown?.length === 0 && (
        <EmptyState title={t(`queue.empty.${state}`)} hint={t(`queue.emptyHint.${state}`)} />
      )}
      {shown && shown.length > 0 && (
        <ol>
          {shown.map((run, index) => (
            <RunRow key={run.id} run={run} first={state === 'open' && index === 0} />
          ))}
        </ol>
      )}
    </PlaceFrame>
  )
}
