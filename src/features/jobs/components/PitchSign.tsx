import { useTranslation } from 'react-i18next'

/** The roof's triangle and its pitch: 12 along, so many up. */
export function PitchSign({ rise }: { readonly rise: number }) {
  const { t } = useTranslation('jobs')
  const height = Math.min(rise, 24) / 2
  return (
    <span className="inline-flex items-center gap-2 whitespace-nowrap">
      <svg
        viewBox="0 0 28 16"
        className="h-[1em] w-auto shrink-0"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.8"
        strokeLinejoin="round"
        aria-hidden="true"
        focusable="false"
      >
        <path d={`M2 14H26V${14 - height}Z`} />
      </svg>
      <span className="font-figure">{t('pitchShort', { rise })}</span>
    </span>
  )
}
