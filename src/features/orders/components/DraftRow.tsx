import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import { orderNumber } from '#shared/orders/order.schema'
import { jobQuery } from '@/features/jobs/api/jobs.queries'
import { slotTarget } from '../draft/deliver-draft'
import type { SlottedDraft } from '../draft/draft-store'
import { useDeliveryState } from '../draft/useDelivery'

interface Props extends SlottedDraft {
  readonly to: string
}

/** An order that is on this device alone: begun, waiting for a signal, or refused. */
export function DraftRow({ slot, draft, to }: Props) {
  const { t } = useTranslation('orders')
  const target = slotTarget(slot)
  const job = useQuery({ ...jobQuery(target.id), enabled: target.kind === 'new' })
  const { waiting, error } = useDeliveryState(draft.key)
  const state = draft.sending ? (waiting ? 'noSignal' : 'sending') : error ? 'refused' : 'writing'
  return (
    <li className="relative flex flex-wrap items-center justify-between gap-x-4 border-b border-rule py-3 hover:bg-ink/5">
      <Link to={to} className="font-semibold after:absolute after:inset-0">
        {draft.amends
          ? t('drafts.amendment', { number: orderNumber(draft.amends.number) })
          : (job.data?.name ?? t('drafts.newOrder'))}
      </Link>
      <span className={state === 'writing' ? 'text-scribe' : 'text-chalk'}>
        {t(`drafts.${state}`)} · {t('review.lines', { count: draft.lines.length })}
      </span>
    </li>
  )
}
