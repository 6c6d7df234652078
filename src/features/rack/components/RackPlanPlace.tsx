import { useTranslation } from 'react-i18next'
import { Icon } from '@/components/Icon'
import { bundleMark } from '../bundle-words'
import type { PlanPlace } from '../rack-plan'

interface Props {
  readonly place: PlanPlace
  readonly found: readonly string[]
  /** Inches of the longest bundle drawn: the width of a place. */
  readonly longest: number
}

/** The shortest bundle is still wide enough for its mark and its tick. */
const LEAST_WIDTH = 55

/** A bay is drawn with so many arms, more where more lies on it; a spot on the floor has none. */
const ARMS = 4

const ROW = 'h-7 border-b border-edge'

/** A bay with its arms, or a spot on the floor; bundles lie on it as folded metal. */
export function RackPlanPlace({ place, found, longest }: Props) {
  const { t } = useTranslation('rack-plan')
  const { name, onFloor, bundles, others } = place
  const wanted = bundles.length > 0
  const free = onFloor ? 0 : Math.max(0, ARMS - bundles.length - (others > 0 ? 1 : 0))
  return (
    <li
      className={`flex flex-col border-2 px-2.5 pt-2 pb-3 ${onFloor ? 'w-40' : 'w-28'} ${wanted ? 'border-dye bg-dye/8' : 'border-rule bg-sheet text-scribe'}`}
    >
      <p className="font-figure">
        <span className={wanted ? 'font-bold' : ''}>{name}</span>
        {onFloor && ` ${t('floor')}`}
      </p>
      {Array.from({ length: free }, (_, arm) => (
        <span key={arm} aria-hidden="true" className={ROW} />
      ))}
      <ul>
        {others > 0 && (
          <li className={`flex items-end text-small ${ROW}`}>{t('others', { count: others })}</li>
        )}
        {bundles.map((bundle) => (
          <li key={bundle.code} className={`flex items-end ${ROW}`}>
            <span
              className="flex h-6 items-center gap-1 border-3 border-b-0 border-dye px-1.5 font-figure text-small leading-none font-bold text-dye"
              style={{ width: `${Math.max(LEAST_WIDTH, (bundle.longest / longest) * 100)}%` }}
            >
              {bundleMark(bundle)}
              {found.includes(bundle.code) && (
                <>
                  <Icon name="done" className="size-4" />
                  <span className="sr-only">{t('scanned')}</span>
                </>
              )}
            </span>
          </li>
        ))}
      </ul>
    </li>
  )
}
