import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { orderNumber, type Order } from '#shared/orders/order.schema'
import type { OverrideInput } from '#shared/orders/override.schema'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { ButtonLink } from '@/components/ButtonLink'
import { Notice } from '@/components/Notice'
import { useAnswerQuestion, useReleaseOrder } from '@/features/orders/api/orders.mutations'
import { OrderGoods } from '@/features/orders/components/OrderGoods'
import { QuestionAnswer } from '@/features/orders/components/QuestionAnswer'
import { WithdrawDialog } from '@/features/orders/components/WithdrawDialog'
import { isIncoming } from '@/features/orders/open-orders'
import { useSeenVersion } from '@/features/orders/useSeenVersion'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { CounterNav } from '../CounterNav'
import { useCounterSearch } from '../useCounterSearch'
import { AskDialog } from './AskDialog'
import { CounterLine } from './CounterLine'
import { OrderPast } from './OrderPast'
import { OrderSummaryPanel } from './OrderSummaryPanel'
import { isComplete } from './override-complete'
import { OverrideForm } from './OverrideForm'
import { ReleaseRefusal } from './ReleaseRefusal'

const ANSWER_FORM = 'answer'

export function OrderScreen({ order }: { readonly order: Order }) {
  const { t } = useTranslation('counter')
  const { moment } = useFormats()
  const release = useReleaseOrder(order.id)
  const answer = useAnswerQuestion(order.id)
  const { unseen, look } = useSeenVersion(order, [release.data, answer.data])
  const { search, band } = useCounterSearch()
  const [asking, setAsking] = useState<'question' | 'withdrawal' | null>(null)
  const asked = order.state === 'question'
  const nowhere = order.lines.filter(({ bendsOn }) => bendsOn.length === 0)
  const incoming = isIncoming(order)
  const [overrides, setOverrides] = useState<readonly OverrideInput[]>([])
  const mayRelease = isComplete(nowhere, overrides) && unseen === null
  // Only of lines that need one: a line amended meanwhile may bend now.
  const needed = overrides.filter(({ lineId }) => nowhere.some(({ id }) => id === lineId))

  const buttons = (
    <>
      <Button variant="danger" onClick={() => setAsking('withdrawal')}>
        {t('order.withdraw')}
      </Button>
      <Button disabled={release.isPending} onClick={() => setAsking('question')}>
        {t(asked ? 'order.askAgain' : 'order.ask')}
      </Button>
      {asked ? (
        <Button variant="primary" type="submit" form={ANSWER_FORM} pending={answer.isPending}>
          {t('order.answer')}
        </Button>
      ) : (
        <Button
          variant="primary"
          disabled={!mayRelease}
          pending={release.isPending}
          onClick={() =>
            release.mutate({
              version: order.version,
              ...(needed.length > 0 ? { overrides: [...needed] } : {}),
            })
          }
        >
          {nowhere.length > 0 && mayRelease ? t('override:release') : t('order.release')}
        </Button>
      )}
    </>
  )

  return (
    <PlaceFrame
      title={orderNumber(order.number)}
      subtitle={
        <>
          <span className="mr-4 text-lead text-ink">{order.company.name}</span>
          {order.job.name}
        </>
      }
      back={{ to: paths.counter.incoming(), label: t('order.back') }}
      nav={<CounterNav />}
      search={search}
      actions={
        !incoming &&
        order.state !== 'withdrawn' && (
          <ButtonLink variant="quiet" to={paths.counter.handOffOrder(order.id)}>
            {t('order.toHandOff')}
          </ButtonLink>
        )
      }
      primary={incoming ? buttons : undefined}
    >
      {band}
      <div className="mb-6 flex flex-col gap-4 empty:hidden">
        {unseen && order.state !== 'withdrawn' && (
          <Notice kind="warn">
            <strong className="block">
              {t(`orders:event.${unseen.kind}`, { name: unseen.by })}, {moment(unseen.at)}.
            </strong>
            <span className="mb-2 block">{t('order.changedHere')}</span>
            <Button onClick={() => look(order.version)}>{t('order.looked')}</Button>
          </Notice>
        )}
        {incoming && nowhere.length > 0 && !release.error && (
          <Notice kind="error">
            <strong className="block">
              {t('order.nowhere', { marks: nowhere.map(({ mark }) => mark).join(', ') })}
            </strong>
            {t('order.nowhereCure')}
            <ul className="flex flex-wrap gap-x-5">
              {nowhere.map(({ id, mark, name }) => (
                <li key={id}>
                  <a
                    href={`#line-${id}`}
                    className="inline-flex min-h-target items-center font-semibold underline"
                  >
                    {mark} {name}
                  </a>
                </li>
              ))}
            </ul>
          </Notice>
        )}
        {incoming && nowhere.length > 0 && (
          <OverrideForm lines={nowhere} overrides={overrides} onChange={setOverrides} />
        )}
        <ReleaseRefusal error={release.error} order={order} />
        {asked && (
          <QuestionAnswer key={order.version} formId={ANSWER_FORM} order={order} answer={answer} />
        )}
      </div>
      <div className="flex flex-col gap-8 xl:grid xl:grid-cols-[minmax(0,1fr)_21rem] xl:grid-rows-[auto_1fr] xl:gap-x-12">
        <section aria-label={t('order.summary')} className="xl:col-start-2">
          <OrderSummaryPanel order={order} />
        </section>
        <div className="flex min-w-0 flex-col gap-8 xl:col-start-1 xl:row-span-2 xl:row-start-1">
          <h2 className="sr-only">{t('order.lines')}</h2>
          {order.lines.map((line) => (
            <CounterLine
              key={line.id}
              line={line}
              sheetPath={paths.counter.stripSheet(order.id, line.id)}
            />
          ))}
          <OrderGoods order={order} />
        </div>
        <div className="xl:col-start-2">
          <OrderPast order={order} />
        </div>
      </div>
      {asking === 'question' && (
        <AskDialog
          order={order}
          onClose={() => setAsking(null)}
          onAsked={({ version }) => {
            look(version)
            setAsking(null)
          }}
        />
      )}
      <WithdrawDialog
        order={order}
        open={asking === 'withdrawal'}
        onClose={() => setAsking(null)}
      />
    </PlaceFrame>
  )
}
