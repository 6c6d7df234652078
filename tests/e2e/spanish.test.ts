import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ORDER_LINES } from '#server/db/tables/order-lines'
import { updateSelf } from '#shared/people/people.contract'
import { useBrowser } from '../support/browser'
import { agentOf } from '../support/journey/beforehand'
import { englishWords, readWords } from '../support/journey/english-left'
import { useProductDatabase } from '../support/journey/product-database'
import { listScreens, openScreen, type PlaceScreens } from '../support/journey/screens'
import { signIn } from '../support/journey/sign-in'

const browser = useBrowser()
const db = useProductDatabase()
const isEnglish = englishWords()

/** Speaks to a person who sees all places, whose language is put back afterwards. */
const speak = async (language: 'en' | 'es') => {
  const juno = await agentOf('juno')
  await juno.call(updateSelf, { body: { language } })
}

let screens: readonly PlaceScreens[]
beforeAll(async () => {
  screens = await listScreens()
  await speak('es')
})
afterAll(() => speak('en'))

describe.each(['roof', 'brake', 'rack', 'counter', 'office'])('%s', (place) => {
  it('speaks Spanish to who chose it, and no English', async () => {
    const here = screens.find((each) => each.place === place)
    if (!here) throw new Error(`There are no screens of ${place}.`)
    const { page } = await browser.open(here.device)
    await signIn(page, 'juno')
    await page.locator('html[lang="es"]').waitFor()
    // What a crew has called its pieces stays as it was typed.
    const typed = await db()(ORDER_LINES).distinct('name').pluck<string[]>('name')
    const left: string[] = []
    for (const address of here.addresses) {
      await openScreen(page, address)
      const words = await readWords(page)
      expect(words.length).toBeGreaterThan(5)
      const english = words.filter((word) => isEnglish(word) && !typed.includes(word))
      left.push(...english.map((word) => `${address}: ${word}`))
    }
    expect(left).toEqual([])
  })
})

it('recognises English that was left', async () => {
  const { page } = await browser.open('phone')
  await signIn(page, 'maren')
  await openScreen(page, '/roof')
  const found = (await readWords(page)).filter(isEnglish)
  expect(found).toContain('Jobs')
  expect(found).toContain('Search jobs')
})

it('turns to Spanish while a person looks, from the account page on', async () => {
  const { page } = await browser.open('phone')
  await signIn(page, 'maren')
  await openScreen(page, '/account')
  try {
    await page.getByRole('radio', { name: 'Español' }).click()
    await page.getByRole('heading', { level: 1, name: 'Cuenta' }).waitFor()
  } finally {
    const maren = await agentOf('maren')
    await maren.call(updateSelf, { body: { language: 'en' } })
  }
})
