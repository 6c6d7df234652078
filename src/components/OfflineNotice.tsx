import { useTranslation } from 'react-i18next'
import { useReachable } from '@/lib/api/reachability'

/** Says what no connection means for what is on screen; nothing while there is one. */
export function OfflineNotice() {
  const { t } = useTranslation('components')
  const reachable = useReachable()
  return (
    <div role="status">
      {!reachable && (
        <p className="border-l-4 border-chalk bg-chalk/10 px-(--gutter) py-2">
          <strong>{t('offline.title')}</strong> {t('offline.meaning')}
        </p>
      )}
    </div>
  )
}
