import i18next from 'i18next'
import { themeSchema, type Language, type Self, type Theme } from '#shared/people/people.contract'
import { recall, remember } from '@/lib/device/remembered'
import { asLanguage } from '@/locales/languages'

/** The language before anyone has signed in: the last one used here, or the browser's. */
export const deviceLanguage = (): Language => asLanguage(recall('language') ?? navigator.language)

/** The theme before anyone has signed in: the last one used here; light, as for the sun. */
export const deviceTheme = (): Theme => themeSchema.catch('light').parse(recall('theme'))

export function applyTheme(theme: Theme): void {
  document.documentElement.dataset.theme = theme
  remember('theme', theme)
}

export async function applyLanguage(language: Language): Promise<void> {
  document.documentElement.lang = language
  remember('language', language)
  if (i18next.language !== language) await i18next.changeLanguage(language)
}

/** Language and theme follow the person who is signed in. */
export function followPerson(person: Self): void {
  applyTheme(person.theme)
  void applyLanguage(person.language)
}
