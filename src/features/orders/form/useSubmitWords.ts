import { useTranslation } from 'react-i18next'
import type { OrderFormState } from './useOrderForm'

/** What the submitting button says: its own words, or how the sending stands. */
export function useSubmitWords(
  { delivery }: Pick<OrderFormState, 'delivery'>,
  sending: boolean,
): (idle: string) => string {
  const { t } = useTranslation('orders')
  return (idle) => {
    if (!sending) return idle
    return delivery.waiting ? t('delivery.waiting') : t('delivery.sending')
  }
}
