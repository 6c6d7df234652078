import { useTranslation } from 'react-i18next'
import type { CodeFault } from '#shared/pieces/codes'
import { pieceConflictSchema } from '#shared/pieces/pieces.contract'
import { ApiProblem, OfflineError } from '@/lib/api/api-errors'
import { errorWords } from '@/lib/api/error-words'
import { useFormats } from '@/lib/format/useFormats'

export interface ScanWords {
  readonly title: string
  readonly detail: string
}

/** A refused scan in words: what it was, and what was expected. */
export function useScanWords() {
  const { t } = useTranslation('codes')
  const { t: problem } = useTranslation('problems')
  const { t: piece } = useTranslation('pieces')
  const { time } = useFormats()

  const ofFault = (fault: CodeFault | 'otherKind'): ScanWords => ({
    title: t(`fault.${fault}.title`),
    detail: t(`fault.${fault}.cure`),
  })

  function ofError(error: unknown): ScanWords {
    if (error instanceof OfflineError)
      return { title: t('offline.title'), detail: t('offline.cure') }
    if (error instanceof ApiProblem && error.is('not-found')) {
      return { title: t('unknown.title'), detail: t('unknown.cure') }
    }
    const conflict =
      error instanceof ApiProblem ? pieceConflictSchema.safeParse(error.problem.current) : null
    if (conflict?.success) {
      const { state, by, at } = conflict.data
      return {
        title: t('conflict.title', { state: piece(`state.${state}`) }),
        detail: t('conflict.detail', { name: by, time: time(at) }),
      }
    }
    if (error instanceof ApiProblem && error.refused) {
      return { title: problem(`${errorWords(error)}.happened`), detail: error.problem.detail }
    }
    const words = errorWords(error)
    return { title: problem(`${words}.happened`), detail: problem(`${words}.todo`) }
  }

  return { ofFault, ofError }
}
