import { useQuery, useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useNavigate } from 'react-router-dom'
import { paths } from '@/app/paths'
import { Band, type BandAnswer } from '@/components/Band'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { codeQuery } from '@/features/pieces/api/pieces.queries'
import { CodeEntry } from '@/features/pieces/components/CodeEntry'
import { useScanWords } from '@/features/pieces/useScanWords'
import { rackQuery } from '@/features/rack/api/rack.queries'
import { BundleTable } from '@/features/rack/components/BundleTable'
import { WorkList } from '@/features/rack/components/WorkList'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

/** What is bent and lies loose, and where every bundle lies. */
export function RackPage() {
  const { t } = useTranslation('rack')
  const rack = useQuery(rackQuery())
  const client = useQueryClient()
  const navigate = useNavigate()
  const words = useScanWords()
  const [answer, setAnswer] = useState<BandAnswer | null>(null)

  async function find(code: string) {
    try {
      const found = await client.fetchQuery(codeQuery(code))
      setAnswer(null)
      if (found.kind === 'bundle') await navigate(paths.rack.bundle(found.code))
      else if (found.kind === 'piece' && found.state === 'bent') {
        await navigate(paths.rack.order(found.orderId), { state: { code: found.code } })
      } else if (found.kind === 'piece') await navigate(paths.piece('rack', found.code))
    } catch (error) {
      setAnswer({ id: `${code} ${Date.now()}`, kind: 'error', mark: code, ...words.ofError(error) })
    }
  }

  return (
    <PlaceFrame
      title={t('title')}
      search={
        <CodeEntry
          label={t('scanLabel')}
          action={t('find')}
          kinds={['piece', 'bundle']}
          takesScans
          onCode={(code) => void find(code)}
          onFault={(fault, typed) =>
            setAnswer({
              id: `${typed} ${Date.now()}`,
              kind: 'error',
              mark: typed.toUpperCase(),
              ...words.ofFault(fault),
            })
          }
        />
      }
    >
      <Band answer={answer} />
      {rack.error && !rack.data && (
        <ErrorState error={rack.error} onRetry={() => void rack.refetch()} />
      )}
      {rack.isPending && <LoadingState />}
      {rack.data && (
        <div className="flex flex-col gap-8">
          <section className="flex flex-col gap-2">
            <h2 className="text-lead font-bold">{t('toBundle')}</h2>
            {rack.data.work.length === 0 ? (
              <EmptyState title={t('emptyWork')} hint={t('emptyWorkHint')} />
            ) : (
              <WorkList work={rack.data.work} />
            )}
          </section>
          <section className="flex flex-col gap-2">
            <h2 className="text-lead font-bold">{t('onRack')}</h2>
            {rack.data.bundles.length === 0 ? (
              <EmptyState title={t('emptyRack')} hint={t('emptyRackHint')} />
            ) : (
              <BundleTable bundles={rack.data.bundles} />
            )}
          </section>
        </div>
      )}
    </PlaceFrame>
  )
}
