import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { Link, useNavigate, useParams } from 'react-router-dom'
import { z } from 'zod'
import { seesOnlyOwnCompany } from '#shared/access/permissions'
import { orderNumber, type Order } from '#shared/orders/order.schema'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { useAnswerQuestion } from '@/features/orders/api/orders.mutations'
import { orderQuery } from '@/features/orders/api/orders.queries'
import { OrderCaution } from '@/features/orders/components/OrderCaution'
import { OrderGoods } from '@/features/orders/components/OrderGoods'
import { OrderHistory } from '@/features/orders/components/OrderHistory'
import { OrderLineCard } from '@/features/orders/components/OrderLineCard'
import { OrderSheetLink } from '@/features/orders/components/OrderSheetLink'
import { OrderStateWord } from '@/features/orders/components/OrderStateWord'
import { PieceProgress } from '@/features/orders/components/PieceProgress'
import { QuestionAnswer } from '@/features/orders/components/QuestionAnswer'
import { WithdrawDialog } from '@/features/orders/components/WithdrawDialog'
import { useOrderDraft } from '@/features/orders/draft/useOrderDraft'
import { draftOfOrder } from '@/features/orders/form/order-body'
import { useMay, usePerson } from '@/features/people/person-context'
import { OrderPriceTotal } from '@/features/prices/components/OrderPriceTotal'
import { useFormats } from '@/lib/format/useFormats'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

const ANSWER_FORM = 'answer'

const paramsSchema = z.object({ orderId: z.uuid() })

export function OrderPage() {
  const params = paramsSchema.safeParse(useParams())
  return params.success ? <OneOrder orderId={params.data.orderId} /> : <NotFoundPage />
}

function OneOrder({ orderId }: { readonly orderId: string }) {
  const { t } = useTranslation('orders')
  const order = useQuery(orderQuery(orderId))
  if (order.data) return <OrderScreen order={order.data} />
  return (
    <PlaceFrame title={t('one')} back={{ to: paths.roof.orders(), label: t('back') }}>
      {order.error ? (
        <ErrorState error={order.error} onRetry={() => void order.refetch()} />
      ) : (
        <LoadingState />
      )}
    </PlaceFrame>
  )
}

function OrderScreen({ order }: { readonly order: Order }) {
  const { t } = useTranslation('orders')
  const answer = useAnswerQuestion(order.id)
  const [withdrawing, setWithdrawing] = useState(false)
  const beginAmendment = useBeginAmendment(order)
  const mayAmend = useMay('orders.amend')
  const mayWithdraw = useMay('orders.withdraw')
  const asked = order.state === 'question'
  const open = asked || order.state === 'submitted'

  return (
    <PlaceFrame
      title={orderNumber(order.number)}
      subtitle={order.job.name}
      back={{ to: paths.roof.orders(), label: t('back') }}
      primary={
        open ? (
          <>
            {mayAmend && (
              <Button variant={asked ? 'secondary' : 'primary'} onClick={beginAmendment}>
                {t('amend.begin')}
              </Button>
            )}
            {mayAmend && asked && (
              <Button variant="primary" type="submit" form={ANSWER_FORM} pending={answer.isPending}>
                {t('question.send')}
              </Button>
            )}
          </>
        ) : undefined
      }
    >
      <div className="flex flex-col gap-6">
        <OrderHead order={order} />
        {asked && mayAmend && (
          <QuestionAnswer key={order.version} formId={ANSWER_FORM} order={order} answer={answer} />
        )}
        {order.lines.map((line) => (
          <OrderLineCard
            key={line.id}
            line={line}
            unreleased={open}
            piecePath={(code) => paths.piece('roof', code)}
            sheetPath={paths.roof.stripSheet(order.id, line.id)}
          />
        ))}
        <OrderGoods order={order} />
        <section aria-labelledby="history" className="max-w-3xl border-t-2 border-ink pt-4">
          <h2 id="history" className="mb-2 font-bold">
            {t('history')}
          </h2>
          <OrderHistory events={order.events} />
        </section>
        <OrderCaution />
        {open && mayWithdraw && (
          <div>
            <Button variant="danger" onClick={() => setWithdrawing(true)}>
              {t('withdraw.open')}
            </Button>
            <WithdrawDialog
              order={order}
              open={withdrawing}
              onClose={() => setWithdrawing(false)}
            />
          </div>
        )}
      </div>
    </PlaceFrame>
  )
}

/** An amendment that was begun here before is gone on with; else it begins with the order as it is. */
function useBeginAmendment(order: Order): () => void {
  const navigate = useNavigate()
  const { draft, replace } = useOrderDraft(order.job.id, order.id)
  return () => {
    if (draft.amends === null) replace(draftOfOrder(order, draft.key))
    void navigate(paths.roof.amendOrder(order.id))
  }
}

function OrderHead({ order }: { readonly order: Order }) {
  const { t } = useTranslation('orders')
  const { day, moment } = useFormats()
  const { role } = usePerson()
  const facts = [
    ...(seesOnlyOwnCompany(role) ? [] : [[t('head.company'), order.company.name]]),
    [t('form.neededBy'), day(order.neededBy)],
    ...(order.poNumber === '' ? [] : [[t('head.po'), order.poNumber]]),
    [t('head.ordered'), `${order.orderedBy}, ${moment(order.submittedAt)}`],
  ]
  return (
    <div className="flex max-w-3xl flex-col gap-3">
      <p className="text-title">
        <OrderStateWord state={order.state} />
      </p>
      <p className="text-scribe">{t(`stateMeaning.${order.state}`)}</p>
      <PieceProgress progress={order.progress} />
      <dl>
        {facts.map(([label, value]) => (
          <div key={label} className="flex justify-between gap-4 border-b border-rule py-1">
            <dt className="shrink-0 text-scribe">{label}</dt>
            <dd className="text-right">{value}</dd>
          </div>
        ))}
      </dl>
      <OrderPriceTotal order={order} />
      {order.notes !== '' && <p className="whitespace-pre-line">{order.notes}</p>}
      <Link
        to={paths.roof.job(order.job.id)}
        className="inline-flex min-h-target items-center self-start text-dye underline"
      >
        {t('head.toJob', { job: order.job.name })}
      </Link>
      <OrderSheetLink orderId={order.id} />
    </div>
  )
}
