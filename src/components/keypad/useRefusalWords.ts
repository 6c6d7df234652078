import { useTranslation } from 'react-i18next'
import type { TypedRefusal } from '#shared/units/typed-number'

/** Why a typed measure was refused and what cures it, in the words of the `units` texts. */
export function useRefusalWords() {
  const { t } = useTranslation('units')
  return ({ code, cures }: Pick<TypedRefusal, 'code' | 'cures'>, angle = false): string => {
    const [first, second] = cures
    const both =
      first !== undefined && second !== undefined ? t('or', { first, second }) : (first ?? '')
    const key = angle && code === 'malformed' ? 'malformedAngle' : code
    return t(`refused.${key}`, { cures: both })
  }
}
