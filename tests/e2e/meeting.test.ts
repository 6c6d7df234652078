import type { Page, Route } from 'playwright-core'
import { expect, it } from 'vitest'
import { DEMO_PEOPLE } from '#seeds/demo/people'
import { useBrowser } from '../support/browser'
import { orderBeforehand } from '../support/journey/beforehand'
import { openRun } from '../support/journey/shop-floor'
import { goToPlace, signIn } from '../support/journey/sign-in'

const browser = useBrowser()

/** Holds the requests to this address until all of the pages have sent theirs. */
async function holdUntilAllSent(pages: readonly Page[], url: string): Promise<void> {
  const held: Route[] = []
  for (const page of pages) {
    await page.route(url, async (route) => {
      held.push(route)
      if (held.length === pages.length) await Promise.all(held.map((each) => each.continue()))
    })
  }
}

it('gives a run to one of two who take it at once, and tells the other who has it', async () => {
  await orderBeforehand('Twin take', 'released')
  const brake = await browser.open('tablet', { name: 'bender' })
  const office = await browser.open('desktop', { name: 'manager' })
  await signIn(brake.page, 'wren')
  await signIn(office.page, 'juno')
  await office.page.getByRole('link', { name: 'Brake', exact: true }).click()
  const pages = [brake.page, office.page]
  for (const page of pages) await openRun(page, 'Twin take')

  await holdUntilAllSent(pages, '**/api/runs/*/claim')
  for (const device of [brake, office]) device.expectStatus(409)
  await Promise.all(
    pages.map((page) => page.getByRole('button', { name: 'Take this run' }).click()),
  )

  const people = [DEMO_PEOPLE.wren.name, DEMO_PEOPLE.juno.name]
  const outcomes = await Promise.all(
    pages.map(async (page) => {
      const mine = page.getByLabel('Code of the piece')
      const taken = page.getByText(/ took this run at /)
      await mine.or(taken).waitFor()
      return (await mine.isVisible()) ? 'mine' : await taken.innerText()
    }),
  )
  const winner = outcomes.indexOf('mine')
  const loser = 1 - winner
  expect(outcomes.filter((outcome) => outcome === 'mine')).toHaveLength(1)
  expect(outcomes[loser]).toContain(`${people[winner]} took this run at`)
  expect(await pages[loser]?.getByRole('button', { name: 'Take this run' }).count()).toBe(0)
})

it('shows in one browser what another one did, without a reload', async () => {
  const looking = await browser.open('desktop', { name: 'looking on' })
  const acting = await browser.open('desktop', { name: 'acting' })
  const brake = await browser.open('tablet', { name: 'bender' })
  await signIn(looking.page, 'ines')
  await signIn(acting.page, 'juno')
  await signIn(brake.page, 'wren')
  await goToPlace(brake.page, 'Brake')

  const { number } = await orderBeforehand('Seen at once', 'submitted')
  const row = looking.page.getByRole('link', { name: number })
  await row.waitFor()
  await acting.page.getByRole('link', { name: 'Counter', exact: true }).click()
  await acting.page.getByRole('link', { name: number }).click()
  await acting.page.getByRole('button', { name: 'Release to the floor' }).click()
  await row.waitFor({ state: 'detached' })
  await brake.page.getByRole('link', { name: /^Open run \d+, Seen at once$/ }).waitFor()
})
