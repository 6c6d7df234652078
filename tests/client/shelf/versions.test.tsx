import { screen, within } from '@testing-library/react'
import { expect, it } from 'vitest'
import { profileOf } from '../../support/arbitrary-profile'
import { json, problem } from '../../support/fake-api'
import { openShelf, savedItem, versionOf } from './shelf-data'

const old = profileOf([3, 4], [-90])
const now = profileOf([3, 7], [-90])
const saved = savedItem('Barn rake', now, 2)
const PUT = `PUT /api/profiles/${saved.id}`

async function openVersions() {
  const opened = await openShelf(`/roof/shelf/${saved.id}`, [saved])
  opened.api.on(`GET /api/profiles/${saved.id}/versions`, () =>
    json({ items: [versionOf(2, now, 'Maren Quillfeather'), versionOf(1, old, null)] }),
  )
  const region = await screen.findByRole('region', { name: 'Versions' })
  const press = async (name: string) =>
    opened.user.click(await within(region).findByRole('button', { name }))
  return { ...opened, region, press }
}

it('An old version is looked at, and taken up again as a new one', async () => {
  const { api, press, region } = await openVersions()
  api.on(PUT, () => json({ ...saved, profile: old, version: 3 }))
  expect(await within(region).findByText(/Maren Quillfeather/)).toBeVisible()
  await press('Look at version 1')
  expect(screen.getByText('You are looking at version 1. Version 2 is on the shelf.')).toBeVisible()
  expect(screen.getByText('7"')).toBeVisible()
  await press('Take it up again as version 3')
  expect(api.seen(PUT).map(({ body }) => body)).toEqual([
    { version: 2, name: 'Barn rake', profile: old },
  ])
  expect(screen.queryByText(/You are looking at version 1/)).toBeNull()
})

it('What is drawn with is the version on the shelf, which comes back with a press', async () => {
  const { user, press } = await openVersions()
  await user.selectOptions(
    await screen.findByRole('combobox', { name: 'Draw with it for a job' }),
    'Harrow Lane house',
  )
  await press('Look at version 1')
  expect(screen.queryByRole('link', { name: 'Take it to the board' })).toBeNull()
  await press('Look at version 2')
  expect(screen.getByRole('link', { name: 'Take it to the board' })).toBeVisible()
})

it('A change that somebody else made first is told', async () => {
  const { api, press } = await openVersions()
  api.on(PUT, () => problem('changed-meanwhile'))
  await press('Look at version 1')
  await press('Take it up again as version 3')
  expect(await screen.findByRole('alert')).toBeVisible()
})
