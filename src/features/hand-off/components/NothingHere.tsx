import { useTranslation } from 'react-i18next'
import type { HandOffSheet } from '#shared/hand-off/hand-off.contract'
import { leftBehind } from '../hand-over'
import { LeftBehindNotice } from './LeftBehindNotice'

/** No bundle lies here: it has all gone, or is not bundled yet. */
export function NothingHere({ sheet }: { readonly sheet: HandOffSheet }) {
  const { t } = useTranslation('hand-off')
  const left = leftBehind(sheet, [])
  const { state } = sheet.order
  const words = state === 'withdrawn' ? 'withdrawn' : !left.some ? 'allGone' : 'notYet'
  return (
    <div className="flex flex-col gap-3 bg-sheet p-(--gutter)">
      <h2 className="text-title font-bold">{t(`nothing.${words}`)}</h2>
      <p className="text-scribe">{t(`nothing.${words}Hint`)}</p>
      {words === 'notYet' && <LeftBehindNotice left={left} />}
    </div>
  )
}
