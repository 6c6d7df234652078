import { useQuery } from '@tanstack/react-query'
import { useId } from 'react'
import { useTranslation } from 'react-i18next'
import type { ShelfProfile, ShelfVersion } from '#shared/shelf/shelf.contract'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { useMay } from '@/features/people/person-context'
import { useFormats } from '@/lib/format/useFormats'
import { useUpdateShelfProfile } from '../api/shelf.mutations'
import { shelfVersionsQuery } from '../api/shelf.queries'

interface Props {
  readonly item: ShelfProfile
  /** The version that is looked at; null for the one on the shelf. */
  readonly shown: ShelfVersion | null
  readonly onShow: (version: ShelfVersion | null) => void
}

/** Every version of a company's profile: looked at with a press, taken up again with another. */
export function ShelfVersions({ item, shown, onShow }: Props) {
  const { t } = useTranslation('shelf')
  const { moment } = useFormats()
  const id = useId()
  const mayWrite = useMay('shelf.write')
  const versions = useQuery(shelfVersionsQuery(item.id))
  const { mutate, error, isPending } = useUpdateShelfProfile(item.id)

  const takeUp = ({ profile }: ShelfVersion) =>
    mutate({ version: item.version, name: item.name, profile }, { onSuccess: () => onShow(null) })

  const content = () => {
    if (!versions.data) {
      return versions.error ? (
        <ErrorState error={versions.error} onRetry={() => void versions.refetch()} />
      ) : (
        <LoadingState />
      )
    }
    return (
      <ol className="max-w-2xl divide-y divide-rule border-y border-rule">
        {versions.data.items.map((version) => {
          const isNow = version.version === item.version
          const isShown = isNow ? shown === null : shown?.version === version.version
          return (
            <li
              key={version.version}
              className="flex flex-wrap items-center gap-x-4 gap-y-1 border-l-4 border-l-transparent py-1 pl-3 data-[shown=true]:border-l-dye"
              data-shown={isShown}
            >
              <div className="min-w-0 flex-1 basis-48">
                <p className="font-semibold">
                  {t('versions.number', { version: version.version })}
                  {isNow && <span className="font-normal"> · {t('versions.now')}</span>}
                </p>
                <p className="text-small text-scribe">
                  {[
                    version.name === item.name ? null : version.name,
                    moment(version.savedAt),
                    version.savedBy,
                  ]
                    .filter((fact) => fact !== null)
                    .join(' · ')}
                </p>
              </div>
              <Button
                variant="quiet"
                aria-pressed={isShown}
                disabled={isShown}
                aria-label={t('versions.lookAt', { version: version.version })}
                onClick={() => onShow(isNow ? null : version)}
              >
                {t('versions.look')}
              </Button>
              {!isNow && isShown && mayWrite && (
                <Button pending={isPending} onClick={() => takeUp(version)}>
                  {t('versions.takeUp', { next: item.version + 1 })}
                </Button>
              )}
            </li>
          )
        })}
      </ol>
    )
  }

  return (
    <section aria-labelledby={id} className="flex flex-col gap-2">
      <h2 id={id} className="font-bold">
        {t('versions.title')}
      </h2>
      <p className="max-w-prose text-small text-scribe">{t('versions.meaning')}</p>
      {content()}
      <ErrorNotice error={error} />
    </section>
  )
}
