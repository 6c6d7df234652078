import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { GOODS_DEFAULTS } from '#shared/roof-line/goods-settings.schema'
import type { Good } from '#shared/roof-line/goods.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { Button } from '@/components/Button'
import { DimensionField } from '@/components/keypad/DimensionField'
import { useUnits } from '@/features/people/useUnits'
import {
  countGoods,
  coveredLines,
  usualChoice,
  type CountedLine,
  type CoveredChoice,
} from '../model/count-goods'
import { CoveredRow } from './CoveredRow'
import { GoodsList } from './GoodsList'

interface Props {
  readonly lines: readonly CountedLine[]
  readonly stocks: readonly Stock[]
  readonly onUse: (goods: readonly Good[]) => void
}

/** What the lines of the order take of small goods, by what a person says of each. */
export function CountGoods({ lines, stocks, onUse }: Props) {
  const { t } = useTranslation('goods')
  const { units } = useUnits()
  const covered = coveredLines(lines)
  const [choices, setChoices] = useState<Readonly<Record<string, CoveredChoice>>>({})
  const [spacing, setSpacing] = useState<number | null>(GOODS_DEFAULTS.fastenerSpacing)
  const [panel, setPanel] = useState<number | null>(GOODS_DEFAULTS.panelModule)
  const outOf = (value: number | null, least: number, most: number) =>
    value === null || value < least || value > most
  const [spacingFault, panelFault] = [outOf(spacing, 1, 120), outOf(panel, 1, 240)]
  const choiceOf = (line: (typeof covered)[number]) => choices[line.key] ?? usualChoice(line)
  const counted =
    spacing === null || panel === null || spacingFault || panelFault
      ? null
      : countGoods(covered, choiceOf, {
          ...GOODS_DEFAULTS,
          fastenerSpacing: spacing,
          panelModule: panel,
        })

  if (covered.length === 0) return <p className="text-scribe">{t('nothingToCount')}</p>
  return (
    <div className="flex flex-col gap-4 border-l-4 border-rule pl-3 sm:pl-4">
      <ul className="divide-y divide-rule border-y border-rule">
        {covered.map((line) => (
          <CoveredRow
            key={line.key}
            line={line}
            choice={choiceOf(line)}
            onChange={(choice) => setChoices({ ...choices, [line.key]: choice })}
          />
        ))}
      </ul>
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <DimensionField
          label={t('spacing')}
          units={units}
          value={spacing}
          error={spacingFault ? t('spacingFault') : undefined}
          onChange={setSpacing}
        />
        <DimensionField
          label={t('panelModule')}
          hint={t('panelModuleHint')}
          units={units}
          value={panel}
          error={panelFault ? t('panelFault') : undefined}
          onChange={setPanel}
        />
      </div>
      {counted && <GoodsList goods={counted} stocks={stocks} />}
      <p className="text-small text-scribe">{t('countHint')}</p>
      <Button
        className="self-start"
        disabled={counted === null || counted.length === 0}
        onClick={() => counted && onUse(counted)}
      >
        {t('use')}
      </Button>
    </div>
  )
}
