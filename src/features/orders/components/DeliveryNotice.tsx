import { useEffect, useRef, type ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import { Button } from '@/components/Button'
import { Notice } from '@/components/Notice'
import { problemCodeOf } from '@/lib/api/api-errors'
import { errorWords } from '@/lib/api/error-words'
import type { DeliveryState } from '../draft/useDelivery'
import type { Fault } from '../form/order-faults'

interface Props {
  readonly sending: boolean
  readonly delivery: DeliveryState
  /** Faults that no field of the form can show. */
  readonly elsewhere: readonly Fault[]
  /** Where what arrived first can be seen. */
  readonly arrivedAt: { readonly to: string; readonly label: string }
  readonly onStop: () => void
  readonly onDrop: () => void
  /** Gives the draft a key of its own; absent for an amendment. */
  readonly onSendAnother?: () => void
}

/**
 * How the sending stands: on its way, waiting for a signal, arrived before, or refused and why. What
 * has to be read comes into view, wherever on the form the button was pressed.
 */
export function DeliveryNotice(props: Props) {
  const { waiting, error } = props.delivery
  const root = useRef<HTMLDivElement>(null)

  useEffect(() => {
    if (waiting || error) root.current?.scrollIntoView({ block: 'center' })
  }, [waiting, error])

  return (
    <div ref={root} className="empty:hidden">
      <NoticeOf {...props} />
    </div>
  )
}

function NoticeOf({
  sending,
  delivery,
  elsewhere,
  arrivedAt,
  onStop,
  onDrop,
  onSendAnother,
}: Props) {
  const { t } = useTranslation('orders')
  const { t: problem } = useTranslation('problems')
  const { waiting, error } = delivery
  if (sending) {
    return (
      <Notice kind={waiting ? 'warn' : 'info'}>
        <Words title={waiting ? t('delivery.noSignal') : t('delivery.sending')}>
          {waiting && t('delivery.keptHere')}
        </Words>
        <Button className="mt-3" onClick={onStop}>
          {t('delivery.stop')}
        </Button>
      </Notice>
    )
  }
  if (!error) return null
  if (problemCodeOf(error) === 'idempotency-key-reused') {
    return (
      <Notice kind="warn">
        <Words title={t('delivery.arrived')}>{t('delivery.arrivedMeaning')}</Words>
        <div className="mt-3 flex flex-wrap items-center gap-3">
          <Link to={arrivedAt.to} className="inline-flex min-h-target items-center underline">
            {arrivedAt.label}
          </Link>
          <Button onClick={onDrop}>{t('delivery.drop')}</Button>
          {onSendAnother && <Button onClick={onSendAnother}>{t('delivery.another')}</Button>}
        </div>
      </Notice>
    )
  }
  const words = errorWords(error)
  return (
    <Notice kind="error">
      <Words title={problem(`${words}.happened`)}>
        {problem(`${words}.safe`)} {problem(`${words}.todo`)}
      </Words>
      {elsewhere.map(({ path, message }) => (
        <p key={path} className="mt-1">
          {message}
        </p>
      ))}
    </Notice>
  )
}

function Words({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <>
      <strong className="block">{title}</strong>
      {children}
    </>
  )
}
