import { readdirSync, readFileSync } from 'node:fs'
import { basename, join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { scanTextUses } from '../../support/translation-scan'

const SRC = join(import.meta.dirname, '../../../src')

/**
 * Keys that a program puts together from codes, so that no text in the source names them. Each with
 * the table that the codes come from.
 */
const FROM_CODES: readonly string[] = [
  'plan:', // reasons and cures of the planner
  'profile:', // problems and cures of a profile
  'roof-line:', // problems, cures and notes of a roof line
  'starters:', // keys of the shop's starter profiles
]

type Texts = { readonly [key: string]: string | Texts }
const textsSchema: z.ZodType<Texts> = z.lazy(() =>
  z.record(z.string(), z.union([z.string(), textsSchema])),
)

const flatten = (texts: Texts, before = ''): [string, string][] =>
  Object.entries(texts).flatMap(([key, value]) =>
    typeof value === 'string' ? [[before + key, value]] : flatten(value, `${before}${key}.`),
  )

const namespacesOf = (language: string): string[] =>
  readdirSync(`${SRC}/locales/${language}`)
    .map((file) => basename(file, '.json'))
    .sort()

const read = (language: string, namespace: string): Map<string, string> =>
  new Map(
    flatten(
      textsSchema.parse(
        JSON.parse(readFileSync(`${SRC}/locales/${language}/${namespace}.json`, 'utf8')),
      ),
    ),
  )

/** Spanish may have a form for many that English lacks; otherwise plural forms must match. */
const withoutMany = (keys: Iterable<string>): string[] =>
  [...keys].filter((key) => !key.endsWith('_many')).sort()

const variablesOf = (text: string): string[] =>
  [...new Set([...text.matchAll(/\{\{\s*(\w+)/g)].map((match) => match[1] ?? ''))].sort()

/** The key as it is asked for: without the form that a count or a context chooses. */
const askedFor = (key: string): string[] => [key, key.replace(/_[^_.]+$/, '')]

const pattern = (key: string): RegExp =>
  new RegExp(
    `^${key
      .split('*')
      .map((part) => part.replace(/[.\\+?^$()[\]{}|]/g, '\\$&'))
      .join('.+')}$`,
  )

const namespaces = namespacesOf('en')
const uses = scanTextUses(SRC)

describe('texts in both languages', () => {
  it('English and Spanish have the same namespaces', () => {
    expect(namespacesOf('es')).toEqual(namespaces)
  })

  it.each(namespaces)('%s: the same keys in English and Spanish', (namespace) => {
    expect(withoutMany(read('es', namespace).keys())).toEqual(
      withoutMany(read('en', namespace).keys()),
    )
  })

  it.each(namespaces)('%s: the same variables in English and Spanish', (namespace) => {
    const spanish = read('es', namespace)
    const differing = [...read('en', namespace)].filter(
      ([key, text]) =>
        JSON.stringify(variablesOf(text)) !== JSON.stringify(variablesOf(spanish.get(key) ?? '')),
    )
    expect(differing).toEqual([])
  })

  it.each(namespaces)('%s: no text is empty', (namespace) => {
    for (const language of ['en', 'es']) {
      expect([...read(language, namespace)].filter(([, text]) => text.trim() === '')).toEqual([])
    }
  })
})

describe('texts and the source', () => {
  it('the scan finds the uses it is for', () => {
    expect(uses).toContainEqual(
      expect.objectContaining({ namespace: 'sign-in', key: 'passwordMissing' }),
    )
    expect(uses).toContainEqual(expect.objectContaining({ namespace: 'shell', key: 'place.*' }))
    expect(uses).toContainEqual(expect.objectContaining({ namespace: 'problems', key: '*.todo' }))
  })

  it('every text the source asks for exists', () => {
    const missing = uses.filter(({ namespace, key }) => {
      if (!namespaces.includes(namespace)) return true
      const keys = [...read('en', namespace).keys()].flatMap(askedFor)
      return !keys.some((candidate) => pattern(key).test(candidate))
    })
    expect(missing).toEqual([])
  })

  it('every text is asked for', () => {
    const unused = namespaces.flatMap((namespace) => {
      const asked = uses.filter((use) => use.namespace === namespace).map((use) => pattern(use.key))
      return [...read('en', namespace).keys()]
        .filter((key) => !askedFor(key).some((form) => asked.some((ask) => ask.test(form))))
        .map((key) => `${namespace}:${key}`)
    })
    expect(unused.filter((key) => !FROM_CODES.some((from) => key.startsWith(from)))).toEqual([])
  })
})
