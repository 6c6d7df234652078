import { useTranslation } from 'react-i18next'
import type { DraftEnds } from '@/features/ends/model/draft-end'
import { useEndWords } from '@/features/ends/useEndWords'

/** How the pieces of a line end and which end lies low; nothing for square ends of a level piece. */
export function LineEnds({ ends }: { readonly ends: DraftEnds | null }) {
  const { t } = useTranslation('orders')
  const words = useEndWords()
  if (ends === null) return null
  return (
    <dl className="border-b border-rule pb-2">
      <dt className="text-small text-scribe">{t('line.ends')}</dt>
      <dd>
        {words.ends(ends)}
        {ends.lowEnd !== null && <span className="block">{words.run(ends.lowEnd)}</span>}
      </dd>
    </dl>
  )
}
