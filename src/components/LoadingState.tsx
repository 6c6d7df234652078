import { useTranslation } from 'react-i18next'

/** Says what is being fetched; a flat line runs under it where motion is welcome. */
export function LoadingState({ label }: { readonly label?: string }) {
  const { t } = useTranslation('components')
  return (
    <div role="status" className="flex flex-col items-start gap-3 py-8 text-scribe">
      <span>{label ?? t('loading')}</span>
      <span aria-hidden="true" className="h-0.5 w-32 overflow-hidden bg-rule">
        <span className="block h-full w-10 animate-[sweep_1.1s_ease-in-out_infinite_alternate] bg-scribe" />
      </span>
    </div>
  )
}
