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

/** The shortest bundle is still wide enough for its mark. */
const LEAST_WIDTH = 45

/** A bay with its arms, or a spot on the floor; bundles lie on it as folded metal. */
export function RackPlanPlace({ place, found, longest }: Props) {
  const { t } = useTranslation('rack-plan')
  const { name, onFloor, bundles, others } = place
  const wanted = bundles.length > 0
  return (
    <li
      className={`flex flex-col border-2 p-2.5 ${onFloor ? 'min-h-24 w-56' : 'min-h-36 w-34'} ${wanted ? 'border-dye bg-dye/8' : 'border-rule bg-sheet text-scribe'}`}
    >
      <p className="font-figure">
        <span className={wanted ? 'font-bold' : ''}>{name}</span>
        {onFloor && ` ${t('floor')}`}
      </p>
      <ul className="mt-auto flex flex-col gap-1">
        {bundles.map((bundle) => (
          <li key={bundle.code} className="border-b border-edge">
            <span
              className="flex h-6 items-center gap-1 border-3 border-b-0 border-dye px-1.5 font-figure text-small leading-none font-bold text-dye"
              style={{
                width: `${Math.max(LEAST_WIDTH, (bundle.longest / longest) * 100)}%`,
              }}
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
        {others > 0 && (
          <li className="border-b border-edge pt-1 text-small">{t('others', { count: others })}</li>
        )}
      </ul>
    </li>
  )
}
