import { useTranslation } from 'react-i18next'
import type { HandOffSheet } from '#shared/hand-off/hand-off.contract'
import { StateWord } from '@/components/StateWord'
import { StateGlyph } from '@/features/drawing/figure/StateGlyph'
import { isHere } from '../hand-over'

/** How many pieces are where: what is not here is named first. */
export function SheetCounts({ sheet }: { readonly sheet: HandOffSheet }) {
  const { t } = useTranslation('hand-off')
  const { queued, bent, bundled, pickedUp } = sheet.order.progress
  const bundles = sheet.bundles.filter(isHere).length
  return (
    <ul aria-label={t('counts.name')} className="flex flex-wrap gap-x-7 gap-y-2 text-lead">
      {queued > 0 && (
        <li>
          <StateWord glyph={<StateGlyph state="queued" />} tone="waiting">
            {t('counts.queued', { count: queued })}
          </StateWord>
        </li>
      )}
      {bent > 0 && (
        <li>
          <StateWord glyph={<StateGlyph state="bent" />} tone="waiting">
            {t('counts.bent', { count: bent })}
          </StateWord>
        </li>
      )}
      {bundles > 0 && (
        <li>
          <StateWord glyph={<StateGlyph state="bundled" />} tone="done">
            {t('counts.bundled', {
              count: bundled,
              bundles: t('counts.bundles', { count: bundles }),
            })}
          </StateWord>
        </li>
      )}
      <li>
        <StateWord glyph={<StateGlyph state="pickedUp" />} tone="quiet">
          {t('counts.pickedUp', { count: pickedUp })}
        </StateWord>
      </li>
    </ul>
  )
}
