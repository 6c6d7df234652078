import { useTranslation } from 'react-i18next'
import { partOfCrease } from '#shared/drawing/strip-figure'
import type { EndLayout, Mark } from '#shared/ends/end-layout'
import type { Strip } from '#shared/strip/strip.schema'
import { usePartName } from '@/features/drawing/usePartName'
import { useUnits } from '@/features/people/useUnits'

/** What the marks of an end are called, and all of them in one sentence. */
export function useMarkWords(strip: Strip) {
  const { t } = useTranslation('ends')
  const { size } = useUnits()
  const partName = usePartName()

  function mark({ of, crease }: Pick<Mark, 'of' | 'crease'>): string {
    if (of !== 'crease') return partName({ kind: 'edge', edge: of === 'edgeA' ? 'A' : 'B' })
    const found = crease === null ? undefined : strip.creases[crease]
    if (!found) throw new RangeError(`The strip has no crease ${crease}.`)
    return partName(partOfCrease(found))
  }

  return {
    mark,
    /** What a figure of the end shows, for who cannot see it. */
    spoken: ({ marks }: EndLayout): string =>
      marks
        .map((each) =>
          t('marks.spoken', { what: mark(each), at: size(each.at), along: size(each.along) }),
        )
        .join('; '),
  }
}
