import { useTranslation } from 'react-i18next'
import type { EndLayout } from '#shared/ends/end-layout'
import type { Strip } from '#shared/strip/strip.schema'
import { useMarkWords } from '@/features/ends/useMarkWords'
import { useUnits } from '@/features/people/useUnits'

interface Props {
  readonly end: EndLayout
  readonly strip: Strip
  readonly caption: string
}

/** What a person pricks along an end: how far from edge A, and how far in from the square blank. */
export function MarkTable({ end, strip, caption }: Props) {
  const { t } = useTranslation('strip-sheet')
  const { size } = useUnits()
  const words = useMarkWords(strip)
  return (
    <table className="data-table">
      <caption className="mb-1 text-left font-semibold">{caption}</caption>
      <thead>
        <tr>
          <th scope="col">{t('mark.at')}</th>
          <th scope="col" data-align="end">
            {t('mark.fromA')}
          </th>
          <th scope="col" data-align="end">
            {t('mark.in')}
          </th>
        </tr>
      </thead>
      <tbody>
        {end.marks.map((mark, index) => (
          <tr key={index}>
            <th scope="row" className="text-left font-normal">
              {words.mark(mark)}
            </th>
            <td data-align="end" className="font-figure">
              {size(mark.at)}
            </td>
            <td data-align="end" className="font-figure">
              {size(mark.along)}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
