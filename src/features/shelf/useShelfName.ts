import { useTranslation } from 'react-i18next'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'

/** What a shelf profile is called: starters have their name in the language on screen. */
export function useShelfName(): (profile: Pick<ShelfProfile, 'starterKey' | 'name'>) => string {
  const { t } = useTranslation('starters')
  return ({ starterKey, name }) => (starterKey === null ? name : t(`${starterKey}.name`))
}
