import { useTranslation } from 'react-i18next'
import { orderSheet } from '#shared/sheets/sheets.contract'
import { buttonStyle } from '@/components/button-style'
import { fileHref } from '@/lib/api/file-href'

/** The order on paper, every line drawn; opens in a tab of its own. */
export function OrderSheetLink({ orderId }: { readonly orderId: string }) {
  const { t } = useTranslation('orders')
  return (
    <a
      href={fileHref(orderSheet, { params: { orderId } })}
      target="_blank"
      rel="noreferrer"
      className={buttonStyle('quiet', '-mx-1.5 self-start px-1.5!')}
    >
      {t('sheet')}
    </a>
  )
}
