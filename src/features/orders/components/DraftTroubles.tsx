import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { Notice } from '@/components/Notice'
import type { OrderDraftHandle } from '../draft/useOrderDraft'

/** What went wrong with keeping the draft on the device; nothing as a rule. */
export function DraftTroubles({ kept, broken, dismissBroken }: OrderDraftHandle) {
  const { t } = useTranslation('orders')
  return (
    <>
      {!kept && <Notice kind="warn">{t('draft.notKept')}</Notice>}
      {broken !== null && (
        <Notice kind="error">
          <strong className="block">{t('draft.broken')}</strong>
          {t('draft.brokenMeaning')}
          <details className="mt-2">
            <summary className="inline-flex min-h-target items-center underline">
              {t('draft.brokenShow')}
            </summary>
            <p className="max-h-40 overflow-auto font-figure text-small break-all">{broken}</p>
          </details>
          <Button className="mt-2" onClick={dismissBroken}>
            {t('draft.brokenDrop')}
          </Button>
        </Notice>
      )}
    </>
  )
}
