import { useTranslation } from 'react-i18next'

const SIDE = 20

/** The roof's triangle, drawn to its slope, and the pitch in figures: 12 along, so many up. */
export function PitchSign({ rise }: { readonly rise: number }) {
  const { t } = useTranslation('jobs')
  const scale = SIDE / Math.max(12, rise)
  return (
    <span className="inline-flex items-baseline gap-2 whitespace-nowrap">
      <svg
        viewBox={`-1.5 -1.5 ${SIDE + 3} ${SIDE + 3}`}
        className="size-[1.25em] shrink-0 self-center"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.8"
        strokeLinejoin="round"
        aria-hidden="true"
        focusable="false"
      >
        <path d={`M0 ${SIDE}H${12 * scale}V${SIDE - rise * scale}Z`} />
      </svg>
      <span className="font-figure">{t('pitchShort', { rise })}</span>
    </span>
  )
}
