import { useTranslation } from 'react-i18next'
import type { Stock } from '#shared/stock/stock.schema'

interface Props {
  readonly stocks: readonly Stock[]
  readonly value: string
  readonly onChange: (stockId: string) => void
}

/** Metal, thickness and the true color, in one press; on a phone the color alone lies over the drawing. */
export function StockSelect({ stocks, value, onChange }: Props) {
  const { t } = useTranslation('stocks')
  const chosen = stocks.find(({ id }) => id === value)
  return (
    <label className="relative inline-flex size-target items-center justify-center rounded-full border border-edge bg-sheet has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-dye lg:w-auto lg:gap-2 lg:pr-2 lg:pl-3">
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
        className="absolute inset-0 cursor-pointer opacity-0 outline-none lg:static lg:min-h-target lg:max-w-56 lg:bg-transparent lg:opacity-100"
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
