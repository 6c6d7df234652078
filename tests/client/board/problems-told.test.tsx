import { screen, within } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { closedHem, profileOf } from '../../support/arbitrary-profile'
import { STOCK } from '../orders/draft-lines'
import { openBoard } from './open-board'

const button = (name: string | RegExp) => screen.getByRole('button', { name })

describe('a problem on the board', () => {
  it('is told with a cure that is one press and one step of undo', async () => {
    const short = profileOf([3, 0.0625, 1], [90, -90])
    const { user, drawn } = await openBoard(short)
    expect(screen.getByText(/Leg 2 is 1\/16" long, but its bends alone take/)).toBeVisible()
    await user.click(button('Lengthen leg 2 to 3/16"'))
    expect(drawn().legs).toEqual([3, 0.1875, 1])
    expect(screen.queryByText(/Leg 2 is/)).toBeNull()
    await user.click(button('Undo'))
    expect(drawn()).toEqual(short)
  })

  it('is told with general advice where no single edit of the drawing cures it', async () => {
    const softer = { ...STOCK, sheet: { ...STOCK.sheet, insideRadius: 0.01 } }
    await openBoard(profileOf([3, 2], [90]), { stock: softer })
    expect(
      screen.getByText(/may crack\. Bend to a larger radius, or ask the paint maker\./),
    ).toBeVisible()
  })
})

describe('several problems on the board', () => {
  /** Both legs eaten by their bends, in a paint that the hem would crack. */
  const eaten = profileOf([3, 0.0625, 2, 0.0625, 3], [90, -90, 90, -90])

  it('are told worst first, the others counted and one press away', async () => {
    const { user, drawn } = await openBoard(eaten)
    expect(button('Lengthen leg 2 to 3/16"')).toBeVisible()
    await user.click(button('1 more to look at'))
    const list = within(screen.getByRole('region', { name: 'What was found' }))
    expect(list.getAllByRole('listitem')).toHaveLength(2)
    await user.click(list.getByRole('button', { name: 'Lengthen leg 4 to 3/16"' }))
    expect(drawn().legs).toEqual([3, 0.0625, 2, 0.1875, 3])
    expect(list.getAllByRole('listitem')).toHaveLength(1)
    expect(screen.queryByRole('button', { name: /more to look at/ })).toBeNull()
  })

  it('lead each to its part', async () => {
    const { user } = await openBoard(eaten)
    await user.click(button('1 more to look at'))
    const list = within(screen.getByRole('region', { name: 'What was found' }))
    await user.click(list.getByRole('button', { name: 'Leg 4' }))
    expect(screen.queryByRole('region', { name: 'What was found' })).toBeNull()
    // The keypad, and the table of legs that a wide screen shows beside it.
    expect(screen.getAllByRole('textbox', { name: 'Leg 4' }).length).toBeGreaterThan(0)
    // The worst stands in the answer bar; this one is cured where its measure is typed.
    expect(button('Lengthen leg 4 to 3/16"')).toBeVisible()
  })

  it('are warnings after errors', async () => {
    const rated = { ...STOCK, paintTBend: 2 }
    const { user } = await openBoard(
      profileOf([3, 0.0625, 3], [90, -90], { hemB: closedHem(0.5, -1) }),
      { stock: rated },
    )
    await user.click(button('1 more to look at'))
    const told = screen.getAllByRole('listitem').map(({ textContent }) => textContent)
    const [first, second] = told.filter((text) => /may crack|bends alone take/.test(text ?? ''))
    expect(first).toMatch(/^Leg 2 is 1\/16" long/)
    expect(second).toMatch(/^The hem at edge B folds the paint/)
  })
})
