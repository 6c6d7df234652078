import { useTranslation } from 'react-i18next'
import type { NoPrice } from '#shared/pricing/line-quote'
import { useUnits } from '@/features/people/useUnits'

/** Why a line has no price, and what to do about it. */
export function useNoPriceWords() {
  const { t } = useTranslation('prices')
  const { size } = useUnits()
  return ({ code, widest }: NoPrice): string =>
    code === 'girthNotPriced' && widest !== null
      ? t('none.girthOver', { widest: size(widest) })
      : t(`none.${code}`)
}
