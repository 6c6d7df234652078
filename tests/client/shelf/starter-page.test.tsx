import { screen, within } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { starterProfile } from '#shared/profile/starters'
import { readDraft } from '@/features/orders/draft/draft-text'
import { JOB_ID } from '../orders/draft-lines'
import { openShelf, starterItem } from './shelf-data'

const headwall = starterItem('headwall')
const forJob = `/roof/shelf/${headwall.id}?job=${JOB_ID}`
const height = () => screen.findByRole('textbox', { name: 'Height on the wall' })
const toBoard = () => screen.getByRole('link', { name: 'Take it to the board' })

/** The only drawing that is kept on the device. */
function keptProfile() {
  const key = Object.keys(window.localStorage).find((name) => name.includes('order-draft'))
  const found = readDraft(window.localStorage.getItem(key ?? '') ?? '')
  return found.ok ? found.draft.lines[0]?.profile : undefined
}

describe('a starter before it is drawn with', () => {
  it('is set to the roof, and opens on the board as it was set', async () => {
    const { user } = await openShelf(forJob, [headwall])
    expect(await height()).toHaveValue('3 1/2')
    expect(await height()).toHaveAccessibleDescription('From 2" to 12".')
    await user.clear(await height())
    await user.type(await height(), '8')
    // The girth follows at once: 3/4 + 5 1/2 + 8 and half an inch of hem.
    expect(await screen.findByText('14 3/4"')).toBeVisible()
    await user.click(toBoard())
    await screen.findByRole('toolbar', { name: 'Drawing tools' }, { timeout: 30_000 })
    expect(keptProfile()).toEqual(starterProfile('headwall', { wallHeight: 8 }, 6))
  })

  it('refuses a measure out of its range with words, and keeps the last sound figure', async () => {
    const { user } = await openShelf(forJob, [headwall])
    await user.clear(await height())
    await user.type(await height(), '14')
    expect(await height()).toHaveAccessibleDescription(/This can be from 2" to 12"/)
    expect(screen.getByRole('button', { name: 'Take it to the board' })).toBeDisabled()
    await user.clear(await height())
    await user.type(await height(), '12')
    expect(toBoard()).toHaveAttribute('href', expect.stringContaining('set=wallHeight%3A12'))
  })

  it('asks for a number where the measure is none of length', async () => {
    const corner = starterItem('outsideCorner')
    const { user } = await openShelf(`/roof/shelf/${corner.id}?job=${JOB_ID}`, [corner])
    const angle = await screen.findByRole('textbox', { name: 'Angle between the walls' })
    await user.clear(angle)
    await user.type(angle, 'blunt')
    expect(angle).toHaveAccessibleDescription('Type the angle in degrees, such as 135.')
    await user.clear(angle)
    await user.type(angle, '135')
    expect(toBoard()).toHaveAttribute('href', expect.stringContaining('set=cornerAngle%3A135'))
  })

  it('takes a pitch to be seen by, and then that of the job that is chosen', async () => {
    const { user } = await openShelf(`/roof/shelf/${headwall.id}`, [headwall])
    const pitch = await screen.findByRole('textbox', { name: 'Pitch, rise in 12' })
    await user.clear(pitch)
    await user.type(pitch, '25')
    expect(pitch).toHaveAccessibleDescription(/Type a rise from 0 to 24\./)
    expect(screen.queryByRole('link', { name: 'Take it to the board' })).toBeNull()
    await user.selectOptions(
      await screen.findByRole('combobox', { name: 'Draw with it for a job' }),
      'Harrow Lane house',
    )
    expect(screen.queryByRole('textbox', { name: 'Pitch, rise in 12' })).toBeNull()
    expect(screen.getByText('for Harrow Lane house, 6/12')).toBeVisible()
    expect(toBoard()).toBeVisible()
  })

  it('says where its roof is none of those it is meant for', async () => {
    const ridge = starterItem('ridge')
    const { user } = await openShelf(`/roof/shelf/${ridge.id}`, [ridge])
    const pitch = await screen.findByRole('textbox', { name: 'Pitch, rise in 12' })
    await user.clear(pitch)
    await user.type(pitch, '0')
    expect(
      screen.getByText('This is meant for a pitch from 0.25 to 24 in 12; the roof has 0.'),
    ).toBeVisible()
  })
})

describe('the board asked for a starter', () => {
  it.each(['wallHeight:80', 'wallHeight:', 'roofColor:3', 'wallHeight'])(
    'with a measure that it cannot have, %s, is not there',
    async (set) => {
      await openShelf(`/roof/jobs/${JOB_ID}/board?shelf=${headwall.id}&set=${set}`, [headwall])
      expect(await screen.findByRole('heading', { name: 'Nothing lies here' })).toBeVisible()
    },
  )
})

describe('the wall of starters', () => {
  it('stands by where a piece belongs, and is searched by what it is', async () => {
    const items = [starterItem('hat'), starterItem('coping'), headwall]
    const { user } = await openShelf(`/roof/shelf?job=${JOB_ID}`, items)
    const walls = within(await screen.findByRole('region', { name: 'Walls' }))
    expect(walls.getAllByRole('link').map(({ textContent }) => textContent)).toEqual([
      'Headwall',
      'Coping',
    ])
    expect(walls.getByRole('link', { name: 'Headwall' })).toHaveAttribute('href', forJob)
    await user.type(screen.getByRole('searchbox'), 'kicked apron')
    expect(screen.getAllByRole('link', { name: /^(Hat|Coping|Headwall)$/ })).toHaveLength(1)
  })
})
