import { useTranslation } from 'react-i18next'
import type { Good } from '#shared/roof-line/goods.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { useFormats } from '@/lib/format/useFormats'

/** What small goods are called. */
export function useGoodWords(stocks: readonly Pick<Stock, 'id' | 'colorName'>[]) {
  const { t } = useTranslation('goods')
  const { count } = useFormats()
  return {
    /** `Fasteners, Kiln 4`; of a stock the shop no longer has the kind alone. */
    name: ({ kind, stockId }: Pick<Good, 'kind' | 'stockId'>): string => {
      const color = stocks.find(({ id }) => id === stockId)?.colorName
      return color === undefined
        ? t(`kind.${kind}`)
        : t('inColor', { kind: t(`kind.${kind}`), color })
    },
    /** `250 pieces`, `34 ft`. */
    amount: ({ quantity, unit }: { quantity: number | null; unit: Good['unit'] }): string =>
      t(`amount.${unit}`, {
        count: quantity ?? 0,
        shown: quantity === null ? '?' : count(quantity),
      }),
    unit: (unit: Good['unit']): string => t(`unit.${unit}`),
  }
}
