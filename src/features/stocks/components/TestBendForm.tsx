import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { ShopBrake } from '#shared/brakes/brakes.contract'
import { judgeThickness, nominalThickness } from '#shared/metal/gauges'
import type { Stock } from '#shared/stock/stock.schema'
import type { Inches } from '#shared/units/brands'
import { printSize } from '#shared/units/print-length'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { DimensionField } from '@/components/keypad/DimensionField'
import { Notice } from '@/components/Notice'
import { Select } from '@/components/Select'
import { TextField } from '@/components/TextField'
import { AngleField } from '@/features/drawing/panels/AngleField'
import { useUnits } from '@/features/people/useUnits'
import { useRecordTestBend } from '../api/test-bends.mutations'
import {
  checkTestBend,
  emptyTestBend,
  type MeasuredField,
  type TestBendDraft,
} from '../test-bend/test-bend-form'
import { TestBendPicture } from './TestBendPicture'

interface Props {
  readonly stock: Stock
  readonly brakes: readonly ShopBrake[]
}

/** A thickness in the limits of its gauge, or what is odd about it; null where nothing limits it. */
function useThicknessWords(stock: Stock, measured: Inches | null): string | null {
  const { t } = useTranslation('stocks')
  if (measured === null) return null
  const named = nominalThickness({
    metal: stock.sheet.metal,
    finish: 'galvanized',
    name: stock.thicknessName,
  })
  if (!named.ok) return null
  const verdict = judgeThickness(named.nominal, measured)
  if (verdict === 'noLimits') return null
  const fine = (inches: Inches | null) => (inches === null ? '–' : printSize(inches, 'decimal'))
  return t(`testBend.thickness.${verdict}`, {
    name: stock.thicknessName,
    least: fine(named.nominal.least),
    most: fine(named.nominal.most),
  })
}

/** One measured bend: the strip before, both legs and the angle after. */
export function TestBendForm({ stock, brakes }: Props) {
  const { t } = useTranslation('stocks')
  const { units } = useUnits()
  const [first] = brakes
  const [draft, setDraft] = useState<TestBendDraft>(() =>
    emptyTestBend(first?.id ?? '', stock.sheet.thickness),
  )
  const [tried, setTried] = useState(false)
  const record = useRecordTestBend(stock.id)
  const check = checkTestBend(draft, stock.sheet.insideRadius)
  const thicknessWords = useThicknessWords(stock, draft.thickness)
  const change = (patch: Partial<TestBendDraft>) => setDraft({ ...draft, ...patch })
  const missing = (field: MeasuredField) =>
    tried && check.kind === 'open' && check.fields.includes(field)
      ? t('testBend.missing')
      : undefined

  function submit() {
    setTried(true)
    if (check.kind === 'open' || record.isPending) return
    record.mutate(check.body, {
      onSuccess: () => {
        setTried(false)
        setDraft({ ...emptyTestBend(draft.brakeId, stock.sheet.thickness), turn: draft.turn })
      },
    })
  }

  return (
    <form
      noValidate
      className="grid gap-x-10 gap-y-4 lg:grid-cols-[minmax(0,34rem)_20rem]"
      onSubmit={(event) => {
        event.preventDefault()
        submit()
      }}
    >
      <div className="flex flex-col gap-4">
        <Select
          label={t('testBend.brake')}
          value={draft.brakeId}
          options={brakes.map(({ id, brake }) => ({ value: id, label: brake.name }))}
          onChange={(event) => change({ brakeId: event.target.value })}
        />
        <div className="grid items-start gap-4 sm:grid-cols-2">
          {(['stripWidth', 'legA', 'legB'] as const).map((field) => (
            <DimensionField
              key={field}
              label={t(`testBend.${field}`)}
              hint={field === 'stripWidth' ? t('testBend.stripHint') : t('testBend.legHint')}
              units={units}
              value={draft[field]}
              error={missing(field)}
              onChange={(inches) => change({ [field]: inches })}
            />
          ))}
          <AngleField
            label={t('testBend.angle')}
            turn={draft.turn ?? 90}
            onChange={(turn) => change({ turn: Math.abs(turn) })}
          />
          <DimensionField
            label={t('testBend.thicknessField')}
            hint={thicknessWords ?? t('testBend.thicknessHint')}
            units={units === 'mm' ? 'mm' : 'decimal'}
            value={draft.thickness}
            error={missing('thickness')}
            onChange={(thickness) => change({ thickness })}
          />
          <DimensionField
            label={t('testBend.radius')}
            hint={t('testBend.radiusHint')}
            units={units === 'mm' ? 'mm' : 'decimal'}
            value={draft.insideRadius}
            error={missing('insideRadius')}
            onChange={(insideRadius) => change({ insideRadius })}
          />
        </div>
        <TextField
          label={t('testBend.note')}
          value={draft.note}
          maxLength={200}
          autoComplete="off"
          onChange={(event) => change({ note: event.target.value })}
        />
        {check.kind === 'ready' && (
          <Notice kind={check.kFactor === null ? 'warn' : 'info'}>
            {check.kFactor === null
              ? t('testBend.kImpossible')
              : t(draft.insideRadius === null ? 'testBend.kAtOwnRadius' : 'testBend.kFound', {
                  k: check.kFactor.toFixed(3),
                })}
          </Notice>
        )}
        <ErrorNotice error={record.error} />
        <Button type="submit" variant="primary" pending={record.isPending} className="self-start">
          {t('testBend.record')}
        </Button>
      </div>
      <TestBendPicture turn={draft.turn ?? 90} />
    </form>
  )
}
