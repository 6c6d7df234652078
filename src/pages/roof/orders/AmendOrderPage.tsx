import { useQuery } from '@tanstack/react-query'
import { useEffect } from 'react'
import { useTranslation } from 'react-i18next'
import { useNavigate, useParams } from 'react-router-dom'
import { z } from 'zod'
import { orderNumber, type Order } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { ButtonLink } from '@/components/ButtonLink'
import { EmptyState } from '@/components/EmptyState'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { jobQuery } from '@/features/jobs/api/jobs.queries'
import { orderQuery } from '@/features/orders/api/orders.queries'
import { OrderConflict } from '@/features/orders/components/OrderConflict'
import { OrderForm } from '@/features/orders/components/OrderForm'
import { useOrderDraft } from '@/features/orders/draft/useOrderDraft'
import type { LineGround } from '@/features/orders/form/check-line'
import { compareOrders, sameContent } from '@/features/orders/form/compare-orders'
import { draftOfOrder } from '@/features/orders/form/order-body'
import { useOrderForm } from '@/features/orders/form/useOrderForm'
import { useSubmitWords } from '@/features/orders/form/useSubmitWords'
import { useOrderGround } from '@/features/orders/form/useOrderGround'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

const FORM = 'order'

const paramsSchema = z.object({ orderId: z.uuid() })

export function AmendOrderPage() {
  const params = paramsSchema.safeParse(useParams())
  return params.success ? <OrderToAmend orderId={params.data.orderId} /> : <NotFoundPage />
}

function OrderToAmend({ orderId }: { readonly orderId: string }) {
  const { t } = useTranslation('orders')
  const order = useQuery(orderQuery(orderId))
  const jobId = order.data?.job.id
  const job = useQuery({ ...jobQuery(jobId ?? ''), enabled: jobId !== undefined })
  const { ground, error, retry } = useOrderGround()
  const failed = [order, job].find((query) => !query.data && query.error)?.error ?? error
  if (order.data && job.data && ground) {
    return <Amendment order={order.data} ground={{ ...ground, pitchRise: job.data.pitchRise }} />
  }
  return (
    <PlaceFrame title={t('amend.title')} back={{ to: paths.roof.order(orderId), label: t('back') }}>
      {failed ? (
        <ErrorState
          error={failed}
          onRetry={() => {
            if (!order.data) void order.refetch()
            else if (!job.data) void job.refetch()
            retry()
          }}
        />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}

function Amendment({ order, ground }: { readonly order: Order; readonly ground: LineGround }) {
  const { t } = useTranslation('orders')
  const navigate = useNavigate()
  const handle = useOrderDraft(order.job.id, order.id)
  const state = useOrderForm(handle, ground, order.neededBy)
  const { draft, setFields } = handle
  const submitWords = useSubmitWords(state, draft.sending)
  const { amends } = draft
  const outdated = amends !== null && amends.version !== order.version
  const same = outdated && sameContent(compareOrders(draft, order))
  const orderPath = paths.roof.order(order.id)
  const frame = {
    title: t('amend.titleOf', { number: orderNumber(order.number) }),
    subtitle: order.job.name,
    back: { to: orderPath, label: t('amend.back') },
  }
  const drop = () => {
    handle.clear()
    void navigate(orderPath, { replace: true })
  }

  // Another version that says the same is no conflict: the shop asked, or nothing was changed here.
  useEffect(() => {
    if (same && amends) setFields({ amends: { ...amends, version: order.version } })
  }, [same, amends, order.version, setFields])

  if (amends === null) {
    return (
      <PlaceFrame
        {...frame}
        primary={
          <Button variant="primary" onClick={() => handle.replace(draftOfOrder(order, draft.key))}>
            {t('amend.begin')}
          </Button>
        }
      >
        <EmptyState title={t('amend.none')} hint={t('amend.noneHint')} />
      </PlaceFrame>
    )
  }
  if (order.state !== 'submitted' && order.state !== 'question') {
    return (
      <PlaceFrame
        {...frame}
        primary={
          <Button variant="primary" onClick={drop}>
            {t('amend.toOrder')}
          </Button>
        }
      >
        <EmptyState
          title={t('amend.tooLate', { state: t(`state.${order.state}`) })}
          hint={t('amend.tooLateHint')}
        />
      </PlaceFrame>
    )
  }
  if (outdated && !same && !draft.sending) {
    return (
      <PlaceFrame {...frame}>
        <OrderConflict
          draft={draft}
          order={order}
          stocks={ground.stocks}
          onKeepMine={() => state.submit({ amends: { ...amends, version: order.version } })}
          onTakeTheirs={drop}
        />
      </PlaceFrame>
    )
  }
  const question = order.events.findLast(({ kind }) => kind === 'question')
  return (
    <PlaceFrame
      {...frame}
      primary={
        <Button variant="primary" type="submit" form={FORM} pending={draft.sending}>
          {submitWords(t('amend.submit'))}
        </Button>
      }
    >
      <OrderForm
        id={FORM}
        handle={handle}
        state={state}
        ground={ground}
        boardPath={(line) => paths.roof.board(order.job.id, { line, order: order.id })}
        arrivedAt={{ to: orderPath, label: t('amend.toOrder') }}
        question={order.state === 'question' ? question?.text : undefined}
        more={
          <>
            <ButtonLink to={paths.roof.board(order.job.id, { order: order.id })}>
              {t('drawMore')}
            </ButtonLink>
            <ButtonLink to={paths.roof.shelf(order.job.id, order.id)}>{t('fromShelf')}</ButtonLink>
            <Button variant="quiet" onClick={drop}>
              {t('amend.drop')}
            </Button>
          </>
        }
        onDrop={drop}
      />
    </PlaceFrame>
  )
}
