import { useTranslation } from 'react-i18next'
import type { Override } from '#shared/orders/override.schema'
import { Notice } from '@/components/Notice'
import { useFormats } from '@/lib/format/useFormats'

/** Stands wherever a piece is shown that the shop makes although no order of folds was found. */
export function OverrideNote({ override }: { readonly override: Override }) {
  const { t } = useTranslation('override')
  const { moment } = useFormats()
  return (
    <Notice kind="warn">
      <strong className="block">
        {t('note', { name: override.by, when: moment(override.at) })}
      </strong>
      {override.reason}
    </Notice>
  )
}
