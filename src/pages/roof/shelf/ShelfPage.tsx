import { useQuery } from '@tanstack/react-query'
import { useId, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useSearchParams } from 'react-router-dom'
import { z } from 'zod'
import { seesOnlyOwnCompany } from '#shared/access/permissions'
import type { Job } from '#shared/jobs/jobs.contract'
import { STARTERS } from '#shared/profile/starters'
import { STARTER_KINDS } from '#shared/profile/starters/starter'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import type { Stock } from '#shared/stock/stock.schema'
import { paths } from '@/app/paths'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { SearchField } from '@/components/SearchField'
import { jobQuery } from '@/features/jobs/api/jobs.queries'
import { usePerson } from '@/features/people/person-context'
import { shelfQuery } from '@/features/shelf/api/shelf.queries'
import { ShelfWall } from '@/features/shelf/components/ShelfWall'
import { nameMatches } from '@/features/shelf/search-shelf'
import { useShelfWords } from '@/features/shelf/useShelfName'
import { stocksQuery } from '@/features/stocks/api/stocks.queries'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { RoofNav } from '../RoofNav'

const idSchema = z.uuid().nullable().catch(null)

/** The wall of figures. With `?job=` what is picked goes to that job's board, else it is shown. */
export function ShelfPage() {
  const { t } = useTranslation('shelf')
  const [query] = useSearchParams()
  const jobId = idSchema.parse(query.get('job'))
  const orderId = idSchema.parse(query.get('order'))
  const job = useQuery({ ...jobQuery(jobId ?? ''), enabled: jobId !== null })
  const shelf = useQuery(shelfQuery())
  const stocks = useQuery(stocksQuery())
  const asked = [shelf, stocks, ...(jobId === null ? [] : [job])]
  const failed = asked.find(({ data, error }) => !data && error)
  const stock = stocks.data?.items[0]

  const content = () => {
    if (failed?.error) {
      return <ErrorState error={failed.error} onRetry={() => void failed.refetch()} />
    }
    if (!shelf.data || !stocks.data || (jobId !== null && !job.data)) return <LoadingState />
    if (!stock) return <EmptyState title={t('noStock')} />
    const order = orderId === null ? {} : { order: orderId }
    // A starter is made to the roof before it is drawn with; what a company saved fits already.
    const pathOf = ({ id, starterKey }: ShelfProfile) =>
      jobId === null
        ? paths.roof.shelfProfile(id)
        : starterKey === null
          ? paths.roof.board(jobId, { shelf: id, ...order })
          : paths.roof.shelfProfile(id, { job: jobId, ...order })
    return <Wall items={shelf.data.items} stock={stock} job={job.data ?? null} pathOf={pathOf} />
  }

  return jobId === null ? (
    <PlaceFrame title={t('title')} nav={<RoofNav />}>
      {content()}
    </PlaceFrame>
  ) : (
    <PlaceFrame
      title={t('take')}
      subtitle={job.data?.name}
      back={{
        to: orderId === null ? paths.roof.job(jobId) : paths.roof.amendOrder(orderId),
        label: t('backToJob'),
      }}
    >
      {content()}
    </PlaceFrame>
  )
}

interface WallProps {
  readonly items: readonly ShelfProfile[]
  readonly stock: Stock
  readonly job: Job | null
  readonly pathOf: (item: ShelfProfile) => string
}

function Wall({ items, stock, job, pathOf }: WallProps) {
  const { t } = useTranslation('shelf')
  const { t: kindName } = useTranslation('starters')
  const startersId = useId()
  const wordsOf = useShelfWords()
  const severalCompanies = !seesOnlyOwnCompany(usePerson().role) && job === null
  const [search, setSearch] = useState('')
  const found = items.filter((item) => nameMatches(wordsOf(item), search))
  const own = found.filter(
    ({ company }) => company !== null && (job === null || company.id === job.company.id),
  )
  const starters = found.filter(({ company }) => company === null)
  const companies = [...new Set(own.map(({ company }) => company?.name ?? ''))].sort()
  const wall = { stock, pitchRise: job?.pitchRise ?? null, pathOf }
  return (
    <div className="flex flex-col gap-6">
      <div className="max-w-3xl">
        <SearchField label={t('search')} value={search} onChange={setSearch} />
      </div>
      {found.length === 0 && search !== '' && (
        <EmptyState title={t('noneFound', { search })} hint={t('noneFoundHint')} />
      )}
      {severalCompanies
        ? companies.map((company) => (
            <ShelfWall
              key={company}
              title={company}
              items={own.filter((item) => item.company?.name === company)}
              {...wall}
            />
          ))
        : own.length > 0 && <ShelfWall title={t('own')} items={own} {...wall} />}
      {own.length === 0 && search === '' && !severalCompanies && (
        <p className="max-w-prose text-scribe">{t('ownEmpty')}</p>
      )}
      {starters.length > 0 && (
        <section aria-labelledby={startersId} className="flex flex-col gap-4">
          <h2 id={startersId} className="font-bold">
            {t('starters')}
          </h2>
          {STARTER_KINDS.map((kind) => ({ kind, items: startersOf(starters, kind) }))
            .filter(({ items: some }) => some.length > 0)
            .map(({ kind, items: some }) => (
              <ShelfWall
                key={kind}
                title={kindName(`kind.${kind}`)}
                within
                items={some}
                {...wall}
              />
            ))}
        </section>
      )}
    </div>
  )
}

/** The starters of a kind, in the order in which a roof is closed. */
const startersOf = (items: readonly ShelfProfile[], kind: (typeof STARTER_KINDS)[number]) =>
  STARTERS.filter((starter) => starter.kind === kind).flatMap(({ key }) =>
    items.filter(({ starterKey }) => starterKey === key),
  )
