import { useTranslation } from 'react-i18next'
import { buttonStyle } from '@/components/button-style'

/** Addresses of a sheet's files; a run offers what is printed, an order what is sent on as well. */
export interface SheetLinks {
  readonly sheet: string
  readonly ends: string
  readonly svg?: string
  readonly dxf?: string
}

/** The sheet on paper and as a drawing; each opens in a tab of its own. */
export function SheetFiles({ sheet, ends, svg, dxf }: SheetLinks) {
  const { t } = useTranslation('strip-sheet')
  const files = [
    [t('file.sheet'), sheet],
    [t('file.ends'), ends],
    ...(svg === undefined ? [] : [[t('file.svg'), svg] as const]),
    ...(dxf === undefined ? [] : [[t('file.dxf'), dxf] as const]),
  ] as const
  return (
    <nav aria-label={t('file.title')}>
      <ul className="flex flex-wrap gap-2">
        {files.map(([label, href]) => (
          <li key={label}>
            <a href={href} target="_blank" rel="noreferrer" className={buttonStyle('secondary')}>
              {label}
            </a>
          </li>
        ))}
      </ul>
      <p className="mt-2 text-small text-scribe">{t('file.endsMeaning')}</p>
    </nav>
  )
}
