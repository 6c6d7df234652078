import { readdirSync, readFileSync } from 'node:fs'
import { basename, join } from 'node:path'
import type { Page } from 'playwright-core'
import { z } from 'zod'

const LOCALES = join(import.meta.dirname, '../../../src/locales')

/** Fewer letters than these beside what is filled in say nothing of a language. */
const LETTERS = 4

function textsIn(node: unknown): string[] {
  if (typeof node === 'string') return [node]
  return Object.values(z.record(z.string(), z.unknown()).parse(node)).flatMap(textsIn)
}

const textsOf = (language: string): string[] =>
  readdirSync(join(LOCALES, language)).flatMap((file) =>
    textsIn(JSON.parse(readFileSync(join(LOCALES, language, basename(file)), 'utf8'))),
  )

const letters = (text: string): number =>
  text.replaceAll(/\{\{.*?\}\}/g, '').replaceAll(/[^a-z]/gi, '').length

/** A text as it comes out, whatever is filled in. */
const asShown = (text: string): RegExp =>
  new RegExp(
    `^${text
      .split(/\{\{.*?\}\}/)
      .map((part) => part.replaceAll(/[.*+?^$()[\]{}|\\]/g, '\\$&'))
      .join('.+')}$`,
  )

/** Recognises the product's own words in English that are not Spanish words as well. */
export function englishWords(): (shown: string) => boolean {
  const spanish = new Set(textsOf('es'))
  const english = textsOf('en')
    .filter((text) => !spanish.has(text) && letters(text) >= LETTERS)
    .map(asShown)
  const both = [...spanish].filter((text) => letters(text) >= LETTERS).map(asShown)
  return (shown) =>
    english.some((pattern) => pattern.test(shown)) && !both.some((pattern) => pattern.test(shown))
}

/** All words on the page: texts, and the names that are read out. */
export function readWords(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const words: string[] = [document.title]
    const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT)
    while (walker.nextNode()) words.push(walker.currentNode.textContent ?? '')
    for (const element of document.querySelectorAll('[aria-label], [placeholder], [title]')) {
      for (const name of ['aria-label', 'placeholder', 'title']) {
        words.push(element.getAttribute(name) ?? '')
      }
    }
    return [...new Set(words.map((word) => word.trim()).filter((word) => word !== ''))]
  })
}
