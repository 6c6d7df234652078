import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { orderNumber, type Order } from '#shared/orders/order.schema'
import { Dialog } from '@/components/Dialog'
import { ErrorNotice } from '@/components/ErrorNotice'
import { TextArea } from '@/components/TextArea'
import { useAskAboutOrder } from '@/features/orders/api/orders.mutations'

interface Props {
  readonly order: Order
  readonly onClose: () => void
  readonly onAsked: (order: Order) => void
}

/** Sends the order back to the crew with a question; it waits until they answer or amend it. */
export function AskDialog({ order, onClose, onAsked }: Props) {
  const { t } = useTranslation('counter')
  const { mutate, error, isPending } = useAskAboutOrder(order.id)
  const [text, setText] = useState('')
  return (
    <Dialog
      open
      title={t('ask.title', { number: orderNumber(order.number) })}
      confirm={t('ask.confirm')}
      confirmDisabled={text.trim() === ''}
      pending={isPending}
      cancel={t('ask.cancel')}
      onConfirm={() => mutate({ version: order.version, text }, { onSuccess: onAsked })}
      onCancel={onClose}
    >
      <p>{t('ask.meaning')}</p>
      <TextArea
        label={t('ask.question')}
        value={text}
        maxLength={1000}
        onChange={(event) => setText(event.target.value)}
      />
      <ErrorNotice error={error} />
    </Dialog>
  )
}
