import { themeSchema, type Language, type Self, type Theme } from '#shared/people/people.contract'
import { recall, remember } from '@/lib/device/remembered'
import { speak } from '@/locales/index'
import { asLanguage } from '@/locales/languages'

/** The language before anyone has signed in: the last one used here, or the browser's. */
export const deviceLanguage = (): Language => asLanguage(recall('language') ?? navigator.language)

/** The theme before anyone has signed in: the last one used here; light, as for the sun. */
export const deviceTheme = (): Theme => themeSchema.catch('light').parse(recall('theme'))

export function applyTheme(theme: Theme): void {
  document.documentElement.dataset.theme = theme
  remember('theme', theme)
}

/** Without signal the words of another language cannot come: then the old ones stay until it is back. */
export async function applyLanguage(language: Language): Promise<void> {
  remember('language', language)
  try {
    await speak(language)
  } catch (error) {
    if (navigator.onLine) throw error
    window.addEventListener('online', () => void applyLanguage(language), { once: true })
    return
  }
  document.documentElement.lang = language
}

/** Language and theme follow the person who is signed in. */
export function followPerson(person: Self): void {
  applyTheme(person.theme)
  void applyLanguage(person.language)
}
