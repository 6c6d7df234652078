import type { Page } from 'playwright-core'
import { expect, it } from 'vitest'
import { useBrowser } from '../support/browser'
import { drawingTool, GABLE, tapCorners } from '../support/journey/drawing'
import { fillOrder, openJob, submitOrder } from '../support/journey/roof'
import {
  band,
  bentCount,
  openRun,
  readCodes,
  readHistory,
  scan,
  sign,
} from '../support/journey/shop-floor'
import { goToPlace, signIn } from '../support/journey/sign-in'

const browser = useBrowser()

const RUN = 'Pavilion gable'

it('carries a drawn piece from the roof to the truck', async () => {
  const roof = await browser.open('phone', { name: 'crew lead' })
  const brake = await browser.open('tablet', { name: 'bender' })
  const desk = await browser.open('desktop', { name: 'counter' })

  await signIn(roof.page, 'maren')
  const stripWidth = await drawGable(roof.page)
  await fillOrder(roof.page, { name: RUN, pieces: '6', length: `10' 6"` })
  const number = await submitOrder(roof.page)
  await roof.page.getByText('The shop has it and will check it.').waitFor()

  await signIn(desk.page, 'ines')
  await desk.page.getByRole('link', { name: number }).click()
  await desk.page.getByRole('button', { name: 'Release to the floor' }).click()
  await desk.page.getByRole('link', { name: 'To its hand-off' }).waitFor()
  await roof.page.getByText('The shop has released it').waitFor()

  await signIn(brake.page, 'wren')
  await openRun(brake.page, RUN)
  expect(`${await brake.page.getByTestId('strip-width').innerText()}"`).toBe(stripWidth)
  await readBendCard(brake.page)
  const codes = await bendSix(brake.page)

  await goToPlace(brake.page, 'Rack')
  const bundle = await strapAll(brake.page, number)
  await roof.page.getByText('All pieces lie bundled on the rack').waitFor()

  await desk.page.getByRole('link', { name: /^Hand-off/ }).click()
  await desk.page.getByRole('link', { name: number }).click()
  await handOver(desk.page, bundle)

  // Nobody touched the phone since the order was sent.
  await roof.page.getByText('All pieces are picked up.').waitFor()
  await roof.page.getByRole('link', { name: 'Piece 3 of 6: what happened to it' }).click()
  await roof.page.getByText(codes[2] ?? '').waitFor()
  expect(await readHistory(roof.page)).toEqual([
    'queued: Ines Marrowby, counter',
    'bent: Wren Ashgrove, brake',
    'queued: Wren Ashgrove, brake · takes back a move Reason: Marked by mistake',
    'bent: Wren Ashgrove, brake',
    'bundled: Wren Ashgrove, rack',
    'picked up: Ines Marrowby, counter',
  ])
})

/** Draws a gable trim with a hem in a new job; the width of its strip as the answer bar says it. */
async function drawGable(page: Page): Promise<string> {
  await openJob(page, { name: 'Pavilion', pitch: '6' })
  await page.getByRole('link', { name: 'Draw a profile' }).click()
  await tapCorners(page, GABLE)
  await drawingTool(page, 'Hem at B').click()
  const answer = page.getByLabel('What this piece takes')
  await answer.getByText(/^Bends on/).waitFor()
  // Three legs and a hem of half an inch.
  await answer.getByText('8"', { exact: true }).waitFor()
  const width = await answer
    .locator('div', { has: page.getByText('strip') })
    .last()
    .innerText()
  await page.getByRole('button', { name: 'Done, to the order' }).click()
  return width.replace(/^strip\s+/, '')
}

/** Every hit of the card has a gauge or a line to bend to and an angle. */
async function readBendCard(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Hit 1' }).click()
  const total = Number(/of (\d+)/.exec(await page.getByText(/^Hit 1 of \d+/).innerText())?.[1] ?? 0)
  // Two bends and the hem.
  expect(total).toBe(3)
  for (let number = 1; number <= total; number += 1) {
    await page.getByText(`Hit ${number} of ${total}`).waitFor()
    expect(await page.getByTestId('step-angle').innerText()).toMatch(/^\d+(\.\d+)?°$/)
    expect(await page.getByTestId('step-gauge').innerText()).toMatch(/^\d/)
    if (number < total) await page.getByRole('button', { name: `Hit ${number + 1}` }).click()
  }
}

/** Three by their codes, the last of them taken back, and four by count. */
async function bendSix(page: Page): Promise<string[]> {
  await page.getByRole('button', { name: 'Take this run' }).click()
  await bentCount(page, '0 of 6 bent').waitFor()
  const codes = await readCodes(page)
  expect(codes).toHaveLength(6)
  for (const [index, code] of codes.slice(0, 3).entries()) {
    await scan(page, 'Code of the piece', code)
    await band(page).getByText(code).waitFor()
    await bentCount(page, `${index + 1} of 6 bent`).waitFor()
  }
  await band(page).getByRole('button', { name: 'Undo' }).click()
  await band(page).getByText('1 piece is queued again.').waitFor()
  await bentCount(page, '2 of 6 bent').waitFor()

  await page.getByRole('button', { name: 'Several' }).click()
  const several = page.getByRole('alertdialog')
  for (let more = 1; more < 4; more += 1) {
    await several.getByRole('button', { name: 'One more' }).click()
  }
  await several.getByRole('button', { name: 'Mark 4 bent' }).click()
  await bentCount(page, '6 of 6 bent').waitFor()
  return codes
}

/** Straps what lies loose of the order into one bundle; its code. */
async function strapAll(page: Page, number: string): Promise<string> {
  await page.getByRole('link', { name: `Bundle the pieces of ${number}` }).click()
  await page.getByRole('button', { name: 'Tick all' }).click()
  await page.getByLabel('Place on the rack').fill('R7')
  await page.getByRole('button', { name: 'Strap 6 pieces' }).click()
  await band(page).getByText('Bundle B1: 6 pieces.').waitFor()
  const told = await band(page).innerText()
  const [code] = /B[0-9A-Z]{7}/.exec(told) ?? []
  if (code === undefined) throw new Error(`No code of a bundle in "${told}".`)
  return code
}

async function handOver(page: Page, bundle: string): Promise<void> {
  const press = page.getByRole('button', { name: 'Hand over 1 bundle' })
  await scan(page, 'Scan a bundle of this order', bundle)
  await page.getByText('Nothing stays behind.').waitFor()
  await page.getByLabel('Name', { exact: true }).fill('Dell Harrowgate')
  await sign(page)
  await press.click()
  await band(page).getByText('1 bundle handed over to Dell Harrowgate.').waitFor()
  await page.getByRole('img', { name: 'Signature of Dell Harrowgate' }).waitFor()
}
