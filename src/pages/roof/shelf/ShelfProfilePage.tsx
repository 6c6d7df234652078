import { useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import type { Stock } from '#shared/stock/stock.schema'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { Select } from '@/components/Select'
import { jobsQuery } from '@/features/jobs/api/jobs.queries'
import { LineBends } from '@/features/orders/components/LineBends'
import { LineFacts } from '@/features/orders/components/LineFacts'
import { LineFigure } from '@/features/orders/components/LineFigure'
import { checkLine } from '@/features/orders/form/check-line'
import { useOrderGround } from '@/features/orders/form/useOrderGround'
import { shelfQuery } from '@/features/shelf/api/shelf.queries'
import { useShelfName } from '@/features/shelf/useShelfName'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { STARTER_PITCH } from '#shared/profile/starters'

/** One saved profile: its pair of figures, what it takes in a stock, and the way into a job. */
export function ShelfProfilePage() {
  const { t } = useTranslation('shelf')
  const { profileId } = useParams()
  const shelf = useQuery(shelfQuery())
  const nameOf = useShelfName()
  const [jobId, setJobId] = useState('')
  const item = shelf.data?.items.find(({ id }) => id === profileId)
  return (
    <PlaceFrame
      title={item ? nameOf(item) : t('title')}
      subtitle={item && (item.company?.name ?? t('starter'))}
      back={{ to: paths.roof.shelf(), label: t('back') }}
      primary={
        item && jobId !== '' ? (
          <ButtonLink variant="primary" to={paths.roof.board(jobId, { shelf: item.id })}>
            {t('drawWith')}
          </ButtonLink>
        ) : undefined
      }
    >
      {item ? (
        <div className="flex flex-col gap-6">
          <Figure item={item} name={nameOf(item)} />
          <JobChoice value={jobId} onChange={setJobId} />
        </div>
      ) : shelf.data ? (
        <EmptyState title={t('gone')} hint={t('goneHint')} />
      ) : shelf.error ? (
        <ErrorState error={shelf.error} onRetry={() => void shelf.refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}

function Figure({ item, name }: { readonly item: ShelfProfile; readonly name: string }) {
  const { t } = useTranslation('shelf')
  const { t: about } = useTranslation('starters')
  const { ground, error, retry } = useOrderGround()
  const [stockId, setStockId] = useState<string | null>(null)
  if (error) return <ErrorState error={error} onRetry={retry} />
  if (!ground) return <LoadingState />
  const stock: Stock | undefined =
    ground.stocks.find(({ id }) => id === stockId) ?? ground.stocks[0]
  if (!stock) return <EmptyState title={t('noStock')} />
  const { profile, check, plans } = checkLine(
    { profile: item.profile, stockId: stock.id, length: null, ends: null },
    { ...ground, pitchRise: STARTER_PITCH },
  )
  return (
    <div className="grid gap-x-10 gap-y-3 lg:grid-cols-[22.5rem_minmax(0,34rem)]">
      <LineFigure profile={profile} stock={stock} strip={check?.strip ?? null} name={name} />
      <div className="flex flex-col gap-3">
        {item.starterKey !== null && <p>{about(`${item.starterKey}.about`)}</p>}
        <LineFacts strip={check?.strip ?? null} />
        <LineBends check={check} plans={plans} />
        <StockChoice stocks={ground.stocks} value={stock.id} onChange={setStockId} />
      </div>
    </div>
  )
}

interface StockChoiceProps {
  readonly stocks: readonly Stock[]
  readonly value: string
  readonly onChange: (stockId: string) => void
}

function StockChoice({ stocks, value, onChange }: StockChoiceProps) {
  const { t } = useTranslation('shelf')
  const { t: words } = useTranslation('stocks')
  return (
    <Select
      label={t('shownIn')}
      value={value}
      options={stocks.map(({ id, colorName, thicknessName, sheet }) => ({
        value: id,
        label: words('line', {
          color: colorName,
          thickness: thicknessName,
          metal: words(`metal.${sheet.metal}`),
        }),
      }))}
      onChange={(event) => onChange(event.target.value)}
    />
  )
}

interface JobChoiceProps {
  readonly value: string
  readonly onChange: (jobId: string) => void
}

/** The latest jobs; an older one takes the profile from its own page. */
function JobChoice({ value, onChange }: JobChoiceProps) {
  const { t } = useTranslation('shelf')
  const jobs = useInfiniteQuery(jobsQuery())
  const latest = jobs.data?.pages.flatMap(({ items }) => items)
  if (!latest) {
    return jobs.error ? (
      <ErrorState error={jobs.error} onRetry={() => void jobs.refetch()} />
    ) : (
      <LoadingState />
    )
  }
  if (latest.length === 0) {
    return (
      <EmptyState
        title={t('noJob')}
        action={<ButtonLink to={paths.roof.newJob()}>{t('newJob')}</ButtonLink>}
      />
    )
  }
  return (
    <Select
      label={t('forJob')}
      hint={t('forJobHint')}
      placeholder={t('forJobChoose')}
      className="max-w-lg"
      value={value}
      options={latest.map(({ id, name }) => ({ value: id, label: name }))}
      onChange={(event) => onChange(event.target.value)}
    />
  )
}
