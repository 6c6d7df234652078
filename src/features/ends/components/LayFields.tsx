import { useMemo, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { sectionFigure } from '#shared/drawing/section-figure'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Degrees } from '#shared/units/brands'
import { printSlope } from '#shared/units/print-slope'
import { Disclosure } from '@/components/Disclosure'
import { Select } from '@/components/Select'
import { SvgFigure } from '@/features/drawing/figure/SvgFigure'
import { useFigureColors, useFigureLabels } from '@/features/drawing/figure/useFigureLook'
import type { Run } from '../model/corner-presets'
import { layFor, legLies, liesOf } from '../model/lay-presets'
import { DegreesField } from './DegreesField'

interface Props {
  readonly profile: Profile
  readonly stock: Stock
  readonly lay: Degrees | null
  readonly run: Run
  readonly disabled: boolean
  readonly onChange: (lay: Degrees | null) => void
}

const SIZE = 112

/** How the section lies on the roof: by one leg that is known, or in degrees. */
export function LayFields({ profile, stock, lay, run, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  const [chosenLeg, setLeg] = useState(1)
  const leg = Math.min(chosenLeg, profile.legs.length)
  const lies = legLies(profile, leg, lay, run)
  const slope = printSlope(run.slope)
  return (
    <div className="flex flex-col gap-3">
      <div className="grid grid-cols-[minmax(0,1fr)_auto] items-end gap-x-4 sm:grid-cols-[minmax(0,34rem)_auto] sm:justify-start">
        <div className="flex min-w-0 flex-col gap-3 sm:flex-row">
          <Select
            label={t('lay.leg')}
            className="sm:w-28"
            value={String(leg)}
            disabled={disabled}
            options={profile.legs.map((_, index) => ({
              value: String(index + 1),
              label: t('drawing:part.leg', { number: index + 1 }),
            }))}
            onChange={(event) => setLeg(Number(event.target.value))}
          />
          <Select
            label={t('lay.lies')}
            className="sm:max-w-md sm:flex-1"
            value={lies}
            disabled={disabled}
            options={liesOf(run)
              .filter((known) => known !== 'own' || lies === 'own')
              .map((known) => ({ value: known, label: t(`lay.${known}`, { slope }) }))}
            onChange={(event) => {
              const chosen = liesOf(run).find((known) => known === event.target.value)
              if (chosen === undefined || chosen === 'own') return
              onChange(layFor(profile, leg, chosen, lay ?? 0, run))
            }}
          />
        </div>
        {lay !== null && <LaidSection profile={profile} stock={stock} lay={lay} />}
      </div>
      <Disclosure summary={t('lay.exact')} wanted={lies === 'own'}>
        <DegreesField
          label={t('lay.degrees')}
          hint={t('lay.degreesHint')}
          value={lay}
          within={[-360, 360]}
          disabled={disabled}
          onChange={onChange}
        />
      </Disclosure>
    </div>
  )
}

interface LaidProps {
  readonly profile: Profile
  readonly stock: Stock
  readonly lay: Degrees
}

/** The section as it lies, seen from the piece's right end, up is up. */
function LaidSection({ profile, stock, lay }: LaidProps) {
  const { t } = useTranslation('ends')
  const colors = useFigureColors(stock.painted ? stock.colorHex : null)
  const labels = useFigureLabels()
  const { display } = useMemo(
    () =>
      sectionFigure(profile, stock.sheet, {
        width: SIZE,
        height: SIZE,
        labels,
        rotation: lay,
        show: { dimensions: false, angles: false, edges: true },
      }),
    [profile, stock.sheet, labels, lay],
  )
  return <SvgFigure display={display} colors={colors} title={t('lay.picture')} />
}
