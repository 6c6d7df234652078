import { screen } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { line, RAKE } from './draft-lines'
import { openOrder } from '../ends/order-page'

async function openGirth(statedGirth: number | null) {
  const order = await openOrder({ lines: [line({ statedGirth })] })
  await order.user.click(screen.getByRole('button', { name: 'Name, stock, girth' }))
  return order
}

describe('the girth that is expected', () => {
  it('says by how much the drawing differs, and nothing where it agrees', async () => {
    const { user, line: kept } = await openGirth(null)
    const field = screen.getByRole('textbox', { name: 'Girth you expect' })
    await user.type(field, '9 1/4')
    expect(kept().statedGirth).toBe(9.25)
    expect(
      screen.getByText('Expected is a girth of 9 1/4": the drawing is 1/2" short of it.'),
    ).toBeVisible()
    expect(screen.getByText('The girth is not the one expected: A.')).toBeVisible()
    await user.clear(field)
    await user.type(field, '8 3/4')
    expect(screen.queryByText(/Expected is a girth/)).toBeNull()
  })

  it('is met by the leg that is chosen, and the drawing before comes back', async () => {
    const { user, line: kept } = await openGirth(8.5)
    expect(screen.getByText(/the drawing is 1\/4" over it/)).toBeVisible()
    await user.selectOptions(screen.getByRole('combobox', { name: 'Let this leg give way' }), '2')
    await user.click(screen.getByRole('button', { name: 'Set leg 2 to 3 3/4"' }))
    expect(kept().profile.legs).toEqual([4, 3.75, 0.75])
    expect(screen.queryByText(/Expected is a girth/)).toBeNull()
    await user.click(screen.getByRole('button', { name: 'Undo' }))
    expect(kept().profile).toEqual(RAKE)
  })

  it('is not met by a leg that would have nothing left', async () => {
    await openGirth(7)
    expect(screen.getByText('Leg 3 is too short for that. Choose another.')).toBeVisible()
  })
})
