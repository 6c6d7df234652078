import { useTranslation } from 'react-i18next'
import type { Bundle } from '#shared/bundles/bundles.contract'
import { pieceConflictSchema } from '#shared/pieces/pieces.contract'
import { Notice } from '@/components/Notice'
import { useScanWords } from '@/features/pieces/useScanWords'
import { bundleMark } from '@/features/rack/bundle-words'
import { ApiProblem } from '@/lib/api/api-errors'
import { useFormats } from '@/lib/format/useFormats'

interface Props {
  readonly error: Error | null
  readonly bundles: readonly Bundle[]
}

/** Why nothing was handed over: which bundle had gone, who let it go and when; or what failed. */
export function HandOverRefusal({ error, bundles }: Props) {
  const { t } = useTranslation('hand-off')
  const words = useScanWords()
  const { moment } = useFormats()
  if (!error) return null

  const current = error instanceof ApiProblem ? error.problem.current : undefined
  const conflict = pieceConflictSchema.safeParse(current)
  const gone = bundles.find(({ code }) => code === conflict.data?.code)
  const said =
    gone && conflict.data
      ? {
          title: t('over.gone', { mark: bundleMark(gone) }),
          detail: t('over.goneDetail', {
            name: conflict.data.by,
            moment: moment(conflict.data.at),
          }),
        }
      : words.ofError(error)
  const refused = error instanceof ApiProblem && error.refused
  return (
    <Notice kind="error">
      <strong className="block">{said.title}</strong>
      {said.detail} {refused && t('over.nothingMoved')}
    </Notice>
  )
}
