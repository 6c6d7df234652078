import { useTranslation } from 'react-i18next'
import type { Stock } from '#shared/stock/stock.schema'

interface Props {
  readonly stocks: readonly Stock[]
  readonly value: string
  readonly onChange: (stockId: string) => void
}

/** Metal, thickness and the true color, in one press; small enough to lie over a drawing. */
export function StockSelect({ stocks, value, onChange }: Props) {
  const { t } = useTranslation('stocks')
  const chosen = stocks.find(({ id }) => id === value)
  return (
    <label className="inline-flex min-h-target items-center gap-2 rounded-full border border-edge bg-sheet pr-2 pl-3 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-dye">
      <span className="sr-only">{t('choose')}</span>
      <svg viewBox="0 0 16 16" className="size-5 shrink-0" aria-hidden="true" focusable="false">
        <circle
          cx="8"
          cy="8"
          r="7"
          fill={chosen?.colorHex ?? 'none'}
          stroke="var(--edge)"
          strokeWidth="1.5"
        />
      </svg>
      <select
        value={value}
        className="min-h-target max-w-44 bg-transparent text-small outline-none"
        onChange={(event) => onChange(event.target.value)}
      >
        {stocks.map((stock) => (
          <option key={stock.id} value={stock.id}>
            {t('line', {
              color: stock.colorName,
              thickness: stock.thicknessName,
              metal: t(`metal.${stock.sheet.metal}`),
            })}
          </option>
        ))}
      </select>
    </label>
  )
}
