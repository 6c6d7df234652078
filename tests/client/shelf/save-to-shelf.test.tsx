import { screen, within } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { findOfName, isSameDrawing } from '@/features/shelf/same-name'
import { profileOf } from '../../support/arbitrary-profile'
import { json } from '../../support/fake-api'
import { openBoard } from '../board/open-board'
import { company, savedItem, starterItem } from './shelf-data'

const drawn = profileOf([4, 4, 0.75], [-90, 45])
const there = savedItem('North rake', profileOf([3, 4], [-90]), 2)

async function openDialog(shelf = [there]) {
  const board = await openBoard(drawn, { shelf })
  await board.user.click(screen.getByRole('button', { name: 'Put on the shelf' }))
  const dialog = within(await screen.findByRole('alertdialog'))
  return { ...board, dialog, name: dialog.getByRole('textbox', { name: 'Name' }) }
}

describe('A drawing put on the shelf', () => {
  it('under a name that is there becomes a new version of it', async () => {
    const { user, api, dialog, name } = await openDialog()
    const put = `PUT /api/profiles/${there.id}`
    api.on(put, () => json({ ...there, profile: drawn, version: 3 }))
    expect(name).toHaveValue('North rake')
    expect(name).toHaveAccessibleDescription(
      '“North rake” is on the shelf as version 2. That one is kept.',
    )
    await user.click(dialog.getByRole('button', { name: 'Save as version 3' }))
    expect(await screen.findByText('“North rake” is on the shelf as version 3.')).toBeVisible()
    expect(api.seen(put).map(({ body }) => body)).toEqual([
      { version: 2, name: 'North rake', profile: drawn },
    ])
  })

  it('under another name becomes a profile of its own', async () => {
    const { user, api, dialog, name } = await openDialog()
    api.on('POST /api/profiles', () => json(savedItem('Porch rake', drawn), 201))
    await user.clear(name)
    await user.type(name, ' Porch rake ')
    await user.click(dialog.getByRole('button', { name: 'Put it on the shelf' }))
    expect(await screen.findByText('“Porch rake” is on the shelf as version 1.')).toBeVisible()
    expect(api.seen('POST /api/profiles').map(({ body }) => body)).toEqual([
      { name: 'Porch rake', profile: drawn, companyId: company.id },
    ])
  })

  it('is not saved where it lies there just so, or without a name', async () => {
    const { user, dialog, name } = await openDialog([savedItem('North rake', drawn)])
    expect(dialog.getByRole('button', { name: 'Save as version 2' })).toBeDisabled()
    expect(name).toHaveAccessibleDescription(
      '“North rake” lies on the shelf just so, as version 1.',
    )
    await user.clear(name)
    expect(dialog.getByRole('button', { name: 'Put it on the shelf' })).toBeDisabled()
  })
})

describe('A name on the shelf', () => {
  it('is the same in any case, with or without room around it', () => {
    expect(findOfName([there], company.id, ' NORTH rake')).toBe(there)
    expect(findOfName([there], company.id, 'North')).toBeUndefined()
  })

  it('of another company or of a starter is none of the own', () => {
    const foreign = { ...there, company: { id: 'another', name: 'Another' } }
    expect(findOfName([foreign], company.id, 'North rake')).toBeUndefined()
    expect(findOfName([starterItem('hat')], company.id, 'hat')).toBeUndefined()
  })
})

describe('Two drawings', () => {
  it('are the same whether a bend says that it follows nothing or leaves it out', () => {
    const said = { ...drawn, bends: drawn.bends.map((bend) => ({ ...bend, follows: null })) }
    expect(isSameDrawing(drawn, said)).toBe(true)
    expect(isSameDrawing(drawn, { ...drawn, colorSide: 'right' })).toBe(false)
    expect(isSameDrawing(drawn, { ...drawn, legs: [4, 4, 1] })).toBe(false)
  })
})
