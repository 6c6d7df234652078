import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { orderNumber, type Order } from '#shared/orders/order.schema'
import { Dialog } from '@/components/Dialog'
import { Notice } from '@/components/Notice'
import { TextArea } from '@/components/TextArea'
import { errorWords } from '@/lib/api/error-words'
import { useWithdrawOrder } from '../api/orders.mutations'

interface Props {
  readonly order: Order
  readonly open: boolean
  readonly onClose: () => void
}

/** Takes an order back before the shop begins; needs a reason, for whoever asks later. */
export function WithdrawDialog({ order, open, onClose }: Props) {
  const { t } = useTranslation('orders')
  const { mutate, error, isPending } = useWithdrawOrder(order.id)
  const [reason, setReason] = useState('')
  return (
    <Dialog
      open={open}
      title={t('withdraw.title', { number: orderNumber(order.number) })}
      confirm={t('withdraw.confirm')}
      confirmVariant="danger"
      confirmDisabled={reason.trim() === ''}
      pending={isPending}
      cancel={t('withdraw.cancel')}
      onConfirm={() => mutate({ version: order.version, reason }, { onSuccess: onClose })}
      onCancel={onClose}
    >
      <p>{t('withdraw.meaning')}</p>
      <TextArea
        label={t('withdraw.reason')}
        value={reason}
        maxLength={400}
        onChange={(event) => setReason(event.target.value)}
      />
      {error && (
        <Notice kind="error">
          <strong className="block">{t(`problems:${errorWords(error)}.happened`)}</strong>
          {t(`problems:${errorWords(error)}.todo`)}
        </Notice>
      )}
    </Dialog>
  )
}
