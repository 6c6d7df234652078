import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import { paths } from '@/app/paths'
import { Mark } from '@/components/Mark'

/** The wordmark, or its sign alone where the title needs the room; leads to the first place. */
export function HomeLink({ wordmark = false }: { readonly wordmark?: boolean }) {
  const { t } = useTranslation('shell')
  return (
    <Link
      to={paths.landing()}
      aria-label={t('home')}
      className="inline-flex min-h-target min-w-target shrink-0 items-center justify-center gap-2 rounded-control text-lead font-bold"
    >
      <Mark />
      {wordmark && <span aria-hidden="true">Foldyard</span>}
    </Link>
  )
}
