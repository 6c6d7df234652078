import { useTranslation } from 'react-i18next'

/** What the shop does not vouch for, and what cuts. */
export function OrderCaution() {
  const { t } = useTranslation('orders')
  return (
    <aside
      aria-label={t('caution.title')}
      className="flex max-w-prose flex-col gap-1 border-l-4 border-ochre pl-4 text-small"
    >
      <p>{t('caution.edges')}</p>
      <p>{t('caution.wind')}</p>
    </aside>
  )
}
