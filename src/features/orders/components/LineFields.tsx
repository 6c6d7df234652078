import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { DimensionField } from '@/components/keypad/DimensionField'
import { Select } from '@/components/Select'
import { TextField } from '@/components/TextField'
import { handChoice, withHandCount, withQuantity } from '@/features/ends/model/hand-edits'
import { useUnits } from '@/features/people/useUnits'
import type { DraftLine, LinePatch } from '../draft/order-draft'
import { faultAt, type Fault } from '../form/order-faults'
import { useFaultWords } from '../form/useFaultWords'
import { QuantityField } from './QuantityField'

interface Props {
  readonly line: DraftLine
  readonly index: number
  readonly faults: readonly Fault[]
  readonly disabled: boolean
  readonly onChange: (patch: LinePatch) => void
}

function useLineError(index: number, faults: readonly Fault[]) {
  const words = useFaultWords()
  return (field: string) => words(faultAt(faults, `lines.${index}.${field}`))
}

const SIDES: readonly Side[] = ['left', 'right']

/** What every line has to be told: how many, of a pair each hand, and how long. */
export function LineAmounts({ line, index, faults, disabled, onChange }: Props) {
  const { t } = useTranslation('orders')
  const { units } = useUnits()
  const error = useLineError(index, faults)
  const { hands } = line
  return (
    <div className="grid items-start gap-4 sm:grid-cols-2">
      {hands && handChoice(hands) === 'pair' ? (
        SIDES.map((hand) => (
          <QuantityField
            key={hand}
            label={t(`line.quantityOf.${hand}`)}
            value={hands[hand]}
            error={hands[hand] === null ? error('hands') : error('quantity')}
            disabled={disabled}
            onChange={(count) => onChange(withHandCount(hands, hand, count))}
          />
        ))
      ) : (
        <QuantityField
          label={t('line.quantity')}
          value={line.quantity}
          error={error('quantity') ?? error('hands')}
          disabled={disabled}
          onChange={(quantity) => onChange(withQuantity(line, quantity))}
        />
      )}
      <DimensionField
        label={t('line.length')}
        hint={line.ends ? t('line.lengthHint') : undefined}
        purpose="run"
        units={units}
        value={line.length}
        disabled={disabled}
        error={error('length')}
        onChange={(length) => onChange({ length })}
      />
    </div>
  )
}

/** What the board has filled in already: mark, name and stock; the girth that is expected. */
export function LineNames({
  line,
  index,
  stocks,
  faults,
  disabled,
  onChange,
}: Props & { readonly stocks: readonly Stock[] }) {
  const { t } = useTranslation('orders')
  const { t: stockText } = useTranslation('stocks')
  const { units } = useUnits()
  const error = useLineError(index, faults)
  return (
    <div className="flex flex-col gap-4">
      <div className="grid grid-cols-[5.5rem_1fr] items-start gap-4">
        <TextField
          label={t('line.mark')}
          value={line.mark}
          maxLength={20}
          autoComplete="off"
          disabled={disabled}
          error={error('mark')}
          onChange={(event) => onChange({ mark: event.target.value })}
        />
        <TextField
          label={t('line.name')}
          value={line.name}
          maxLength={80}
          autoComplete="off"
          disabled={disabled}
          error={error('name')}
          onChange={(event) => onChange({ name: event.target.value })}
        />
      </div>
      <Select
        label={t('line.stock')}
        placeholder={t('line.stockChoose')}
        value={line.stockId ?? ''}
        disabled={disabled}
        error={error('stockId')}
        options={stocks.map(({ id, colorName, thicknessName, sheet }) => ({
          value: id,
          label: stockText('line', {
            color: colorName,
            thickness: thicknessName,
            metal: stockText(`metal.${sheet.metal}`),
          }),
        }))}
        onChange={(event) => onChange({ stockId: event.target.value || null })}
      />
      <DimensionField
        label={t('girth.label')}
        hint={t('girth.hint')}
        units={units}
        value={line.statedGirth}
        disabled={disabled}
        error={error('statedGirth')}
        onChange={(statedGirth) => onChange({ statedGirth })}
      />
    </div>
  )
}
