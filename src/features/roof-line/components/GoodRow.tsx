import { useTranslation } from 'react-i18next'
import type { Stock } from '#shared/stock/stock.schema'
import { Disclosure } from '@/components/Disclosure'
import { Icon } from '@/components/Icon'
import { IconButton } from '@/components/IconButton'
import { Select } from '@/components/Select'
import { TextField } from '@/components/TextField'
import { QuantityField } from '@/features/orders/components/QuantityField'
import type { DraftGood } from '@/features/orders/draft/order-draft'
import { useGoodWords } from '../useGoodWords'

interface Props {
  readonly good: DraftGood
  readonly stocks: readonly Stock[]
  readonly errors: { readonly quantity?: string; readonly note?: string; readonly stockId?: string }
  readonly disabled: boolean
  readonly onChange: (good: DraftGood) => void
  readonly onRemove: () => void
}

/** As many digits as the shop counts. */
const DIGITS = 6
const NOTE_LETTERS = 200

/** One of the small goods: how many, in which color, and a word to the shop. */
export function GoodRow({ good, stocks, errors, disabled, onChange, onRemove }: Props) {
  const { t } = useTranslation('goods')
  const words = useGoodWords(stocks)
  const name = words.name(good)
  return (
    <li className="flex flex-col gap-1 py-3">
      <div className="flex items-end gap-2">
        <div className="min-w-0 flex-1">
          <QuantityField
            label={t('labelled', { name, unit: words.unit(good.unit) })}
            value={good.quantity}
            digits={DIGITS}
            disabled={disabled}
            error={errors.quantity}
            onChange={(quantity) => onChange({ ...good, quantity })}
          />
        </div>
        {!disabled && (
          <IconButton
            label={t('remove', { name })}
            icon={<Icon name="close" />}
            onClick={onRemove}
          />
        )}
      </div>
      <Disclosure
        wanted={errors.note !== undefined || errors.stockId !== undefined}
        summary={
          <>
            {t('more')}
            <span className="sr-only">, {name}</span>
          </>
        }
      >
        <div className="flex flex-col gap-4">
          <Select
            label={t('color')}
            placeholder={t('anyColor')}
            value={good.stockId ?? ''}
            disabled={disabled}
            error={errors.stockId}
            options={stocks.map(({ id, colorName, thicknessName, sheet }) => ({
              value: id,
              label: t('stocks:line', {
                color: colorName,
                thickness: thicknessName,
                metal: t(`stocks:metal.${sheet.metal}`),
              }),
            }))}
            onChange={(event) => onChange({ ...good, stockId: event.target.value || null })}
          />
          <TextField
            label={t('note')}
            value={good.note}
            maxLength={NOTE_LETTERS}
            autoComplete="off"
            disabled={disabled}
            error={errors.note}
            onChange={(event) => onChange({ ...good, note: event.target.value })}
          />
        </div>
      </Disclosure>
    </li>
  )
}
