import { useTranslation } from 'react-i18next'
import type { EndLayout } from '#shared/ends/end-layout'
import type { Strip } from '#shared/strip/strip.schema'
import { useUnits } from '@/features/people/useUnits'
import { useMarkWords } from '../useMarkWords'

interface Props {
  readonly end: EndLayout
  readonly strip: Strip
}

const COLUMNS = ['across', 'along'] as const

/** What a tape is laid to: across the strip from edge A, along it from the blank's square end. */
export function EndMarks({ end, strip }: Props) {
  const { t } = useTranslation('ends')
  const { size } = useUnits()
  const words = useMarkWords(strip)
  return (
    <table className="w-full max-w-[22.5rem]">
      <caption className="pb-1 text-left font-semibold">{t(`marks.caption.${end.side}`)}</caption>
      <thead>
        <tr className="border-b border-rule text-small text-scribe">
          <th scope="col" className="py-1 text-left font-normal">
            {t('marks.what')}
          </th>
          {COLUMNS.map((column) => (
            <th key={column} scope="col" className="py-1 pl-3 text-right font-normal">
              {t(`marks.${column}`)}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {end.marks.map((mark, index) => (
          <tr key={index} className="border-b border-rule">
            <th scope="row" className="py-1 text-left font-normal">
              {words.mark(mark)}
            </th>
            <td className="py-1 text-right font-figure">{size(mark.at)}</td>
            <td className="py-1 text-right font-figure">{size(mark.along)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
