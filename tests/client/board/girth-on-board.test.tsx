import { screen } from '@testing-library/react'
import { expect, it } from 'vitest'
import { profileOf } from '../../support/arbitrary-profile'
import { openBoard } from './open-board'

const gable = profileOf([4, 4, 0.75], [-90, 45])

it('shows how far the drawing is off the girth the order expects, and sets the leg in hand to it', async () => {
  const { user, drawn } = await openBoard(gable, { change: { statedGirth: 9.25 } })
  expect(
    screen.getByText('Expected is a girth of 9 1/4": the drawing is 1/2" short of it.'),
  ).toBeVisible()
  await user.click(screen.getByRole('button', { name: 'Set leg 1 to 4 1/2"' }))
  expect(drawn().legs).toEqual([4.5, 4, 0.75])
  expect(screen.queryByText(/Expected is a girth/)).toBeNull()
  // The board's own undo takes it back as one step.
  const [undo] = screen.getAllByRole('button', { name: 'Undo' })
  if (undo) await user.click(undo)
  expect(drawn()).toEqual(gable)
})

it('says nothing where no girth is expected', async () => {
  await openBoard(gable)
  expect(screen.queryByText(/Expected is a girth/)).toBeNull()
})
