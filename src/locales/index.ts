import i18next, { type i18n, type Resource } from 'i18next'
import { initReactI18next } from 'react-i18next'
import type { Language } from '#shared/people/people.contract'

/** The texts: one namespace a file, named like the file. */
const files = import.meta.glob<Record<string, unknown>>('./{en,es}/*.json', {
  eager: true,
  import: 'default',
})

function resources(): Resource {
  const all: Record<string, Record<string, Record<string, unknown>>> = {}
  for (const [path, texts] of Object.entries(files)) {
    const [, language, namespace] = /^\.\/(\w+)\/([\w-]+)\.json$/.exec(path) ?? []
    if (language === undefined || namespace === undefined) throw new Error(`No locale: ${path}`)
    ;(all[language] ??= {})[namespace] = texts
  }
  return all
}

/** A text without words is a fault of ours: it stops a developer and a test, never a customer. */
function onMissing(languages: readonly string[], namespace: string, key: string): void {
  throw new Error(`No text for ${namespace}:${key} in ${languages.join(', ')}.`)
}

/** Begins i18next with all texts of both languages; use before the first render. */
export async function startLocales(language: Language): Promise<i18n> {
  const strict = import.meta.env.DEV
  await i18next.use(initReactI18next).init({
    resources: resources(),
    lng: language,
    fallbackLng: 'en',
    defaultNS: 'components',
    interpolation: { escapeValue: false },
    returnNull: false,
    saveMissing: strict,
    saveMissingTo: 'current',
    missingKeyHandler: strict ? onMissing : false,
  })
  return i18next
}
