import type { Locator, Page } from 'playwright-core'

/** The run of this name in the queue of the brake. */
export async function openRun(page: Page, name: string): Promise<void> {
  await page.getByRole('link', { name: new RegExp(`^Open run \\d+, ${name}$`) }).click()
  await page.getByRole('button', { name: 'Take this run' }).waitFor()
}

export const bentCount = (page: Page, words: string): Locator =>
  page.getByTestId('bent-count').getByText(words, { exact: true })

/** Codes of the pieces of the run on screen, as they stand under their pictures, by mark. */
export async function readCodes(page: Page): Promise<string[]> {
  const marks = page.getByRole('link', { name: /^[\w-]+, P[0-9A-Z]{7}: / })
  await marks.first().waitFor()
  const labels = await marks.evaluateAll((links) =>
    links.map((link) => link.getAttribute('aria-label') ?? ''),
  )
  return labels.toSorted().map((label) => label.replace(/^[\w-]+, (P[0-9A-Z]{7}): .*$/, '$1'))
}

/** Types a code where the scanner would, and ends it as a scanner does. */
export async function scan(page: Page, field: string, code: string): Promise<void> {
  const input = page.getByLabel(field, { exact: true })
  await input.fill(code)
  await input.press('Enter')
}

/** The answer to the last scan or press. */
export const band = (page: Page): Locator => page.getByRole('status').locator('[data-band]')

/** Pulls a pen across the pad. */
export async function sign(page: Page): Promise<void> {
  const pad = page.getByTestId('signature-pad')
  await pad.scrollIntoViewIfNeeded()
  const box = await pad.boundingBox()
  if (!box) throw new Error('There is no pad to sign on.')
  const at = (x: number, y: number) => [box.x + x * box.width, box.y + y * box.height] as const
  await page.mouse.move(...at(0.2, 0.7))
  await page.mouse.down()
  await page.mouse.move(...at(0.4, 0.3), { steps: 4 })
  await page.mouse.move(...at(0.7, 0.6), { steps: 4 })
  await page.mouse.up()
}

/** What happened to the piece on screen, the oldest first: state, who and where. */
export async function readHistory(page: Page): Promise<string[]> {
  const rows = page.getByRole('list', { name: 'What happened to it' }).getByRole('listitem')
  await rows.first().waitFor()
  const texts = await rows.evaluateAll((items) =>
    items.map((item) =>
      [...item.children]
        .filter((child) => child.tagName !== 'TIME')
        .map((child) => (child instanceof HTMLElement ? child.innerText.trim() : ''))
        .join(': ')
        .replaceAll('\n', ' '),
    ),
  )
  return texts.toReversed()
}
