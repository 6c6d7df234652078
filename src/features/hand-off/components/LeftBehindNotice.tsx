import { useTranslation } from 'react-i18next'
import { Notice } from '@/components/Notice'
import { bundleMark } from '@/features/rack/bundle-words'
import type { LeftBehind } from '../hand-over'

/** What stays here when the scanned bundles go. */
export function LeftBehindNotice({ left }: { readonly left: LeftBehind }) {
  const { t } = useTranslation('hand-off')
  if (!left.some) return <Notice kind="done">{t('left.nothing')}</Notice>
  return (
    <Notice kind="warn">
      <ul>
        {left.bundles.map((bundle) => (
          <li key={bundle.code}>
            {t('left.bundle', { mark: bundleMark(bundle), place: bundle.rackPlace })}
          </li>
        ))}
        {left.loose > 0 && <li>{t('left.loose', { count: left.loose })}</li>}
        {left.queued > 0 && <li>{t('left.queued', { count: left.queued })}</li>}
      </ul>
      <p className="mt-1">{t('left.open')}</p>
    </Notice>
  )
}
