import i18next, { type i18n } from 'i18next'
import { initReactI18next } from 'react-i18next'
import type { Language } from '#shared/people/people.contract'
import type { Texts } from './texts-of'

/** Nobody loads the words of a language that is not spoken. */
const LOAD: Record<Language, () => Promise<{ readonly texts: Texts }>> = {
  en: () => import('./texts-en'),
  es: () => import('./texts-es'),
}

/** A text without words is a fault of ours: it stops a developer and a test, never a customer. */
function onMissing(languages: readonly string[], namespace: string, key: string): void {
  throw new Error(`No text for ${namespace}:${key} in ${languages.join(', ')}.`)
}

/** Begins i18next with the texts of a language; use before the first render. */
export async function startLocales(language: Language): Promise<i18n> {
  const strict = import.meta.env.DEV
  const { texts } = await LOAD[language]()
  await i18next.use(initReactI18next).init({
    resources: { [language]: texts },
    lng: language,
    // Both languages have the same keys: `tests/client/locales`.
    fallbackLng: false,
    defaultNS: 'components',
    interpolation: { escapeValue: false },
    returnNull: false,
    saveMissing: strict,
    saveMissingTo: 'current',
    missingKeyHandler: strict ? onMissing : false,
  })
  return i18next
}

/** Changes to a language, its texts loaded first. Rejects while they cannot be loaded. */
export async function speak(language: Language): Promise<void> {
  if (i18next.language === language) return
  if (!i18next.hasResourceBundle(language, 'components')) {
    const { texts } = await LOAD[language]()
    for (const [namespace, words] of Object.entries(texts)) {
      i18next.addResourceBundle(language, namespace, words)
    }
  }
  await i18next.changeLanguage(language)
}
