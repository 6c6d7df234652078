import type { Page } from 'playwright-core'
import { expect, it } from 'vitest'
import { DEMO_PEOPLE } from '#seeds/demo/people'
import { ORDERS } from '#server/db/tables/orders'
import { SESSIONS } from '#server/db/tables/sessions'
import { submitOrder as submitEndpoint } from '#shared/orders/orders.contract'
import { useBrowser, type Device } from '../support/browser'
import { useProductDatabase } from '../support/journey/product-database'
import { fillOrder, openJob, readOrderNumber } from '../support/journey/roof'
import { giveCredentials, signIn } from '../support/journey/sign-in'

const browser = useBrowser()
const db = useProductDatabase()

const SUBMISSION = `**/api${submitEndpoint.path}`

const isSubmission = (url: string, method: string): boolean =>
  method === 'POST' && new URL(url).pathname === `/api${submitEndpoint.path}`

/** A phone with an order of a starter profile filled in and not sent; the id of its job. */
async function orderInHand(jobName: string): Promise<Device & { jobId: string }> {
  const phone = await browser.open('phone')
  const { page } = phone
  await signIn(page, 'maren')
  await openJob(page, { name: jobName, pitch: '4.5' })
  const jobId = new URL(page.url()).pathname.split('/').at(-1) ?? ''
  await page.getByRole('link', { name: 'From the shelf' }).click()
  await page.getByRole('link', { name: /Z closure/i }).click()
  await page.getByRole('link', { name: 'Take it to the board' }).click()
  for (const next of ['Bend 1', 'Leg 2', 'Bend 2', 'Leg 3', 'Done, to the order']) {
    await page.getByRole('button', { name: next, exact: true }).click()
  }
  await fillOrder(page, { name: `Closure of ${jobName}`, pieces: '3', length: `8'` })
  return { ...phone, jobId }
}

const press = (page: Page) => page.getByRole('button', { name: 'Submit order' }).click()

const ordersOf = (jobId: string) => db()(ORDERS).where({ job_id: jobId }).select('number')

it('keeps what was typed when the session ends in the middle of it', async () => {
  const phone = await browser.open('phone')
  const { page } = phone
  await signIn(page, 'maren')
  await page.getByRole('link', { name: 'New job' }).click()
  await page.getByLabel('Name').fill('Dovecote')
  await page.getByLabel('Address').fill('1 Loft Row')
  await page.getByLabel('Pitch').fill('12')

  await db()(SESSIONS)
    .whereRaw("sess -> 'passport' ->> 'user' = ?", [DEMO_PEOPLE.maren.id])
    .delete()
  phone.expectStatus(401)
  // The token of the lost session is refused once and a new one is fetched.
  phone.expectStatus(403)
  await page.getByRole('button', { name: 'Open the job' }).click()
  await page.getByText(`${DEMO_PEOPLE.maren.name}, your session ended.`).waitFor()
  expect(await page.getByLabel('Mail address').inputValue()).toBe(DEMO_PEOPLE.maren.email)
  await giveCredentials(page, 'maren')

  await page.getByRole('heading', { level: 1, name: 'New job' }).waitFor()
  expect(await page.getByLabel('Name').inputValue()).toBe('Dovecote')
  expect(await page.getByLabel('Address').inputValue()).toBe('1 Loft Row')
  expect(await page.getByLabel('Pitch').inputValue()).toBe('12')
  await page.getByRole('button', { name: 'Open the job' }).click()
  await page.getByRole('heading', { level: 1, name: 'Dovecote' }).waitFor()
})

it('makes one order when the answer is lost on the way back', async () => {
  const { page, jobId, expectLostConnection } = await orderInHand('Boathouse')
  expectLostConnection()
  const keys: string[] = []
  await page.route(SUBMISSION, async (route) => {
    if (route.request().method() !== 'POST') return route.continue()
    keys.push((await route.request().headerValue('idempotency-key')) ?? '')
    if (keys.length > 1) return route.continue()
    // The shop gets it and answers, but the signal is gone.
    const answer = await route.fetch()
    expect(answer.status()).toBe(201)
    await route.abort('connectionreset')
  })
  await press(page)
  const number = await readOrderNumber(page)

  expect(keys.length).toBeGreaterThan(1)
  expect(new Set(keys).size).toBe(1)
  expect(keys[0]).not.toBe('')
  const orders = await ordersOf(jobId)
  expect(orders.map((order) => `F-${order.number}`)).toEqual([number])
})

it('sends an order by itself when the signal comes back', async () => {
  const { page, context, jobId, expectLostConnection } = await orderInHand('Ferry shed')
  expectLostConnection()
  await context.setOffline(true)
  await press(page)
  await page.getByText('The order is kept on this device').waitFor()
  expect(await ordersOf(jobId)).toEqual([])

  const sent = page.waitForResponse((response) =>
    isSubmission(response.url(), response.request().method()),
  )
  await context.setOffline(false)
  expect((await sent).status()).toBe(201)
  const number = await readOrderNumber(page)
  expect((await ordersOf(jobId)).map((order) => `F-${order.number}`)).toEqual([number])
})

it('keeps a drawing that was not sent through a reload', async () => {
  const { page } = await orderInHand('Ice house')
  await page.getByLabel('Notes for the shop').fill('Ring before it is loaded.')
  await page.reload()
  await page.getByRole('heading', { level: 1, name: 'New order' }).waitFor()
  expect(await page.getByLabel('Notes for the shop').inputValue()).toBe('Ring before it is loaded.')
  expect(await page.getByLabel('Pieces', { exact: true }).inputValue()).toBe('3')
  await page.getByRole('heading', { name: 'Closure of Ice house' }).waitFor()
})
