import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useMay } from '@/features/people/person-context'
import { useFormats } from '@/lib/format/useFormats'
import { labelPrintsQuery } from '../api/labels.queries'

/** When labels of a piece were printed, and by whom. Says nothing to who may not print. */
export function LabelHistory({ code }: { readonly code: string }) {
  const { t } = useTranslation('labels')
  const { moment } = useFormats()
  const may = useMay('labels.print')
  const { data } = useQuery({ ...labelPrintsQuery(code), enabled: may })
  if (!data || data.items.length === 0) return null
  return (
    <ul className="text-small text-scribe">
      {data.items.map(({ id, by, at, reprinted }) => (
        <li key={id}>
          {t(reprinted.includes(code) ? 'again' : 'first', { name: by, at: moment(at) })}
        </li>
      ))}
    </ul>
  )
}
