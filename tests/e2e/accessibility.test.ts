import { AxeBuilder } from '@axe-core/playwright'
import type { Page } from 'playwright-core'
import { beforeAll, describe, expect, it } from 'vitest'
import { useBrowser } from '../support/browser'
import { bentCount } from '../support/journey/shop-floor'
import { listScreens, openScreen, type PlaceScreens } from '../support/journey/screens'
import { signIn } from '../support/journey/sign-in'

const browser = useBrowser()

const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']

let screens: readonly PlaceScreens[]
beforeAll(async () => {
  screens = await listScreens()
})

/** What breaks a rule on the page in both themes, each as a line to act on. */
async function violations(page: Page, name: string): Promise<string[]> {
  const found: string[] = []
  for (const theme of ['light', 'dark']) {
    await page.evaluate((wanted) => {
      document.documentElement.dataset.theme = wanted
    }, theme)
    const { violations, passes } = await new AxeBuilder({ page })
      .withTags(RULES)
      .setLegacyMode(true)
      .analyze()
    expect(passes.length).toBeGreaterThan(5)
    found.push(
      ...violations.flatMap(({ id, nodes }) =>
        nodes.map((node) =>
          [name, theme, id, node.target.join(' '), node.failureSummary?.split('\n')[1]].join(' | '),
        ),
      ),
    )
  }
  return found
}

it('the sign-in page breaks no rule', async () => {
  const { page } = await browser.open('phone')
  await page.goto('/')
  await page.getByLabel('Mail address').waitFor()
  expect(await violations(page, 'sign-in')).toEqual([])
})

describe.each(['roof', 'brake', 'rack', 'counter', 'office'])('%s', (place) => {
  it('breaks no rule, light or dark', async () => {
    const here = screens.find((each) => each.place === place)
    if (!here) throw new Error(`There are no screens of ${place}.`)
    const { page } = await browser.open(here.device)
    await signIn(page, here.person)
    const found: string[] = []
    for (const address of here.addresses) {
      await openScreen(page, address)
      found.push(...(await violations(page, address)))
    }
    expect(found).toEqual([])
  })
})

it('neither does a step of the bend card, nor the questions asked beside it', async () => {
  const { page } = await browser.open('tablet')
  await signIn(page, 'wren')
  await page.getByRole('link', { name: /^Open run \d+, Alder 2$/ }).click()
  await page.getByRole('button', { name: 'Take this run' }).click()
  await bentCount(page, '0 of 2 bent').waitFor()
  await page.getByRole('button', { name: 'Hit 1' }).click()
  await page.getByTestId('step-angle').waitFor()
  const found = await violations(page, 'step')
  for (const question of ['Several', 'Trouble']) {
    await page.getByRole('button', { name: question }).click()
    await page.getByRole('alertdialog').waitFor()
    found.push(...(await violations(page, question)))
    await page.getByRole('alertdialog').getByRole('button', { name: 'Cancel' }).click()
    await page.getByRole('alertdialog').waitFor({ state: 'detached' })
  }
  expect(found).toEqual([])
})
