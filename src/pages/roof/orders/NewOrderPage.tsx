import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useNavigate, useParams } from 'react-router-dom'
import { z } from 'zod'
import type { Job } from '#shared/jobs/jobs.contract'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { ButtonLink } from '@/components/ButtonLink'
import { Dialog } from '@/components/Dialog'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { jobQuery } from '@/features/jobs/api/jobs.queries'
import { DraftTroubles } from '@/features/orders/components/DraftTroubles'
import { OrderForm } from '@/features/orders/components/OrderForm'
import { isBlank } from '@/features/orders/draft/order-draft'
import { useOrderDraft } from '@/features/orders/draft/useOrderDraft'
import type { LineGround } from '@/features/orders/form/check-line'
import { useOrderForm } from '@/features/orders/form/useOrderForm'
import { useSubmitWords } from '@/features/orders/form/useSubmitWords'
import { useOrderGround } from '@/features/orders/form/useOrderGround'
import { newKey } from '@/lib/api/idempotency'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

const FORM = 'order'

const paramsSchema = z.object({ jobId: z.uuid() })

export function NewOrderPage() {
  const params = paramsSchema.safeParse(useParams())
  return params.success ? <OrderOfJob jobId={params.data.jobId} /> : <NotFoundPage />
}

function OrderOfJob({ jobId }: { readonly jobId: string }) {
  const { t } = useTranslation('orders')
  const job = useQuery(jobQuery(jobId))
  const { ground, error, retry } = useOrderGround()
  const failed = job.data ? error : (job.error ?? error)
  if (job.data && ground) {
    return <NewOrder job={job.data} ground={{ ...ground, pitchRise: job.data.pitchRise }} />
  }
  return (
    <PlaceFrame title={t('new')} back={{ to: paths.roof.job(jobId), label: t('backToJob') }}>
      {failed ? (
        <ErrorState
          error={failed}
          onRetry={() => {
            void job.refetch()
            retry()
          }}
        />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}

function NewOrder({ job, ground }: { readonly job: Job; readonly ground: LineGround }) {
  const { t } = useTranslation('orders')
  const navigate = useNavigate()
  const handle = useOrderDraft(job.id)
  const state = useOrderForm(handle, ground)
  const [dropping, setDropping] = useState(false)
  const { draft } = handle
  const submitWords = useSubmitWords(state, draft.sending)
  const frame = {
    title: t('new'),
    subtitle: job.name,
    back: { to: paths.roof.job(job.id), label: t('backToJob') },
  }
  const drop = () => {
    handle.clear()
    void navigate(paths.roof.job(job.id), { replace: true })
  }

  if (isBlank(draft)) {
    return (
      <PlaceFrame
        {...frame}
        primary={
          <>
            <ButtonLink to={paths.roof.shelf(job.id)}>{t('fromShelf')}</ButtonLink>
            <ButtonLink variant="primary" to={paths.roof.board(job.id)}>
              {t('draw')}
            </ButtonLink>
          </>
        }
      >
        <DraftTroubles {...handle} />
        <EmptyState title={t('noLines')} hint={t('noLinesHint')} />
      </PlaceFrame>
    )
  }
  return (
    <PlaceFrame
      {...frame}
      primary={
        <Button variant="primary" type="submit" form={FORM} pending={draft.sending}>
          {submitWords(t('submit'))}
        </Button>
      }
    >
      <OrderForm
        id={FORM}
        handle={handle}
        state={state}
        ground={ground}
        boardPath={(line) => paths.roof.board(job.id, { line })}
        arrivedAt={{ to: paths.roof.orders(), label: t('delivery.toOrders') }}
        more={
          <>
            <ButtonLink to={paths.roof.board(job.id)}>{t('drawMore')}</ButtonLink>
            <ButtonLink to={paths.roof.shelf(job.id)}>{t('fromShelf')}</ButtonLink>
            <Button variant="quiet" onClick={() => setDropping(true)}>
              {t('drop.open')}
            </Button>
          </>
        }
        onDrop={drop}
        onSendAnother={() => handle.replace({ ...draft, key: newKey(), sending: true })}
      />
      <Dialog
        open={dropping}
        title={t('drop.title')}
        confirm={t('drop.confirm')}
        confirmVariant="danger"
        cancel={t('drop.cancel')}
        onConfirm={drop}
        onCancel={() => setDropping(false)}
      >
        <p>{t('drop.meaning', { count: draft.lines.length })}</p>
      </Dialog>
    </PlaceFrame>
  )
}
