import { useTranslation } from 'react-i18next'
import { orderSchema, type Order } from '#shared/orders/order.schema'
import { ErrorNotice } from '@/components/ErrorNotice'
import { Notice } from '@/components/Notice'
import { RefusedLines } from '@/features/orders/components/RefusedLines'
import { ApiProblem } from '@/lib/api/api-errors'
import { useFormats } from '@/lib/format/useFormats'

interface Props {
  readonly error: Error | null
  readonly order: Order
}

/** Why a release was refused: who was faster, or which lines cannot be made and why. */
export function ReleaseRefusal({ error, order }: Props) {
  const { t } = useTranslation('counter')
  const { moment } = useFormats()
  if (!(error instanceof ApiProblem)) return <ErrorNotice error={error} />

  if (error.is('cannot-bend') || error.is('profile-problem')) {
    return (
      <Notice kind="error">
        <strong className="block">{t('refused.lines')}</strong>
        {t('refused.linesCure')}
        <RefusedLines lines={order.lines} errors={error.fieldErrors()} />
      </Notice>
    )
  }
  const current = orderSchema.safeParse(error.problem.current)
  const last = current.data?.events.at(-1)
  if (!last) return <ErrorNotice error={error} />
  return (
    <Notice kind="error">
      <strong className="block">
        {t(`orders:event.${last.kind}`, { name: last.by })}, {moment(last.at)}.
      </strong>
      {last.text !== '' && <span className="block">{last.text}</span>}
      {t('refused.meanwhile')}
    </Notice>
  )
}
