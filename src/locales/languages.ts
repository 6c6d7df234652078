import type { Language } from '#shared/people/people.contract'

export const LANGUAGES = ['en', 'es'] as const satisfies readonly Language[]

/** Each language in its own words, as a person looks for it. */
export const LANGUAGE_NAMES: Record<Language, string> = { en: 'English', es: 'Español' }

export const asLanguage = (tag: string | null | undefined): Language =>
  tag?.toLowerCase().startsWith('es') ? 'es' : 'en'
