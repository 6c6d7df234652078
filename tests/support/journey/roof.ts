import type { Page } from 'playwright-core'

const DAY = 24 * 60 * 60 * 1000

/** `YYYY-MM-DD`, well after today wherever one stands. */
export const inTenDays = (): string => new Date(Date.now() + 10 * DAY).toISOString().slice(0, 10)

/** Opens a job from the list of jobs and stays on its page. */
export async function openJob(page: Page, job: { name: string; pitch: string }): Promise<void> {
  await page.getByRole('link', { name: 'New job' }).click()
  await page.getByLabel('Name').fill(job.name)
  await page.getByLabel('Pitch').fill(job.pitch)
  await page.getByRole('button', { name: 'Open the job' }).click()
  await page.getByRole('heading', { level: 1, name: job.name }).waitFor()
}

export interface LineWords {
  readonly name: string
  readonly pieces: string
  readonly length: string
}

/** Fills in the only line of the order on screen and the day it is needed. */
export async function fillOrder(page: Page, line: LineWords): Promise<void> {
  await page.getByRole('button', { name: 'Name, stock' }).click()
  await page.getByLabel('Name', { exact: true }).fill(line.name)
  await page.getByLabel('Pieces', { exact: true }).fill(line.pieces)
  await page.getByLabel('Length of a piece', { exact: true }).fill(line.length)
  await page.getByLabel('Needed by').fill(inTenDays())
}

/** Sends the order on screen; its number, such as `F-2047`. */
export async function submitOrder(page: Page): Promise<string> {
  await page.getByRole('button', { name: 'Submit order' }).click()
  return readOrderNumber(page)
}

/** The number of the order on screen, as soon as there is one. */
export async function readOrderNumber(page: Page): Promise<string> {
  const heading = page.getByRole('heading', { level: 1, name: /^F-\d+$/ })
  await heading.waitFor()
  return heading.innerText()
}
