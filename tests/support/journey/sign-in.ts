import type { Page } from 'playwright-core'
import { DEMO_PASSWORD, DEMO_PEOPLE, type DemoPerson } from '#seeds/demo/people'

/** Types address and password into the sign-in page that is on screen. */
export async function giveCredentials(page: Page, person: DemoPerson): Promise<void> {
  await page.getByLabel('Mail address').fill(DEMO_PEOPLE[person].email)
  await page.getByLabel('Password').fill(DEMO_PASSWORD)
  await page.getByRole('button', { name: 'Sign in' }).click()
}

/** Opens the product and signs a person of the demo shop in, up to the landing page of the role. */
export async function signIn(page: Page, person: DemoPerson): Promise<void> {
  await page.goto('/')
  await giveCredentials(page, person)
  await page.getByRole('heading', { level: 1 }).and(page.getByText('Sign in')).waitFor({
    state: 'detached',
  })
  await page.locator('#main').waitFor()
}

/** By the menu of the person, as on a phone or a tablet. */
export async function goToPlace(page: Page, place: string): Promise<void> {
  await page.getByRole('button', { name: /^Menu/ }).click()
  await page.getByRole('navigation', { name: 'Places' }).getByRole('link', { name: place }).click()
}
