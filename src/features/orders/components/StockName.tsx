import { useTranslation } from 'react-i18next'
import type { Stock } from '#shared/stock/stock.schema'
import { ColorChip } from '@/components/ColorChip'

/** The true color and, in words, color, thickness and metal. */
export function StockName({ stock }: { readonly stock: Stock }) {
  const { t } = useTranslation('stocks')
  return (
    <ColorChip
      hex={stock.colorHex}
      name={t('line', {
        color: stock.colorName,
        thickness: stock.thicknessName,
        metal: t(`metal.${stock.sheet.metal}`),
      })}
    />
  )
}
