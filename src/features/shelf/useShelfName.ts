import { useTranslation } from 'react-i18next'
import { findStarter } from '#shared/profile/starters'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'

type Named = Pick<ShelfProfile, 'starterKey' | 'name'>

/** What a shelf profile is called: starters have their name in the language on screen. */
export function useShelfName(): (profile: Named) => string {
  const { t } = useTranslation('starters')
  return ({ starterKey, name }) => (starterKey === null ? name : t(`${starterKey}.name`))
}

/** All the words a shelf profile is found by: of a starter also what it is and where it belongs. */
export function useShelfWords(): (profile: Named) => string {
  const { t } = useTranslation('starters')
  return ({ starterKey, name }) => {
    if (starterKey === null) return name
    const starter = findStarter(starterKey)
    const kind = starter ? t(`kind.${starter.kind}`) : ''
    return `${t(`${starterKey}.name`)} ${t(`${starterKey}.about`)} ${kind}`
  }
}
