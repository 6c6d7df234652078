import { screen, within } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { line } from '../orders/draft-lines'
import { openOrder } from '../ends/order-page'

async function openRoofLine(change: Parameters<typeof line>[0] = {}) {
  const order = await openOrder({ lines: [line({ quantity: 1, length: null, ...change })] })
  await order.user.click(screen.getByRole('button', { name: 'Cover a roof line' }))
  const type = async (name: string, text: string) => {
    const field = screen.getByRole('textbox', { name })
    await order.user.clear(field)
    await order.user.type(field, text)
  }
  const choose = (legend: string, option: string) =>
    order.user.click(
      within(screen.getByRole('group', { name: legend })).getByRole('radio', { name: option }),
    )
  return { ...order, type, choose }
}

describe('a line on the roof', () => {
  it('typed is split at once, and its pieces are put into the order', async () => {
    const { user, type, read } = await openRoofLine()
    expect(screen.getByText(/Type the length on the roof/)).toBeVisible()
    await type('Longest piece', "10'")
    await type('Length to cover', "29'")
    expect(screen.getByText("3 pieces for 29'")).toBeVisible()
    expect(screen.getByText('9\' 8" · 19\' 4"')).toBeVisible()
    expect(
      screen.getByRole('img', { name: /pieces: 10', 10', 9' 8"\. Laps at: 9' 8", 19' 4"/ }),
    ).toBeVisible()
    await user.click(screen.getByRole('button', { name: 'Use these pieces, as 2 lines' }))
    expect(read().lines.map(({ mark, quantity, length }) => [mark, quantity, length])).toEqual([
      ['A', 2, 120],
      ['B', 1, 116],
    ])
  })

  it('put into the order is taken back with one press', async () => {
    const { user, type, read } = await openRoofLine()
    await type('Length to cover', "29'")
    await user.click(screen.getByRole('button', { name: /Use these pieces/ }))
    await user.click(screen.getByRole('button', { name: 'Undo' }))
    expect(read().lines.map(({ mark, length }) => [mark, length])).toEqual([['A', null]])
  })

  it("is as long as its level run and the job's pitch make it", async () => {
    const { type, choose } = await openRoofLine()
    await choose('What you know', 'Level run and pitch')
    await type('Level run', "8'")
    expect(screen.getByRole('textbox', { name: 'Pitch (rise in 12)' })).toHaveValue('6')
    // 96 in. of run at 6/12 are 107.33 in. of rake.
    expect(screen.getByText('1 piece for 8\' 11 5/16"')).toBeVisible()
  })

  it('is shared out equally where that is chosen', async () => {
    const { user, type, choose, read } = await openRoofLine()
    await type('Length to cover', "29'")
    await choose('Pieces', 'All equal')
    await user.click(screen.getByRole('button', { name: 'Use these pieces' }))
    expect(read().lines).toMatchObject([{ quantity: 3, length: Math.ceil((356 / 3) * 16) / 16 }])
  })

  it('has its laps dressed where that is chosen', async () => {
    const { user, type, choose, read } = await openRoofLine()
    await type('Longest piece', "10'")
    await type('Length to cover', '19\' 8"')
    await choose('Ends at the laps', 'Dressed to lap')
    await user.click(screen.getByRole('button', { name: 'Use these pieces, as 2 lines' }))
    expect(read().lines.map(({ ends }) => [ends?.left.kind, ends?.right.kind])).toEqual([
      ['square', 'lap'],
      ['lap', 'square'],
    ])
  })

  it('adds the points of miters, unless it was measured to their tips', async () => {
    const corner = { corner: { slopeIn: 0, slopeOut: 0, plan: -90 } }
    const { user, type } = await openRoofLine({
      ends: {
        left: { kind: 'miter', plane: corner, lay: 0, legs: [], tabs: [{ leg: 1, length: 1 }] },
        right: { kind: 'square', tabs: [] },
        lowEnd: null,
      },
    })
    await type('Length to cover', "8'")
    // The point is as long as the section is wide at 45 degrees, 4 1/2 in.; the tab stands at the
    // deep side of the cut, so that it reaches 5/8 in. beyond the tip and no more.
    expect(screen.getByText(/Added for miter points and tabs: 5 1\/8" at the left/)).toBeVisible()
    await user.click(
      screen.getByRole('checkbox', { name: 'The length runs to the tips of the miters already' }),
    )
    expect(screen.getByText(/Added for miter points and tabs: 5\/8" at the left/)).toBeVisible()
  })

  it('that no piece of the shop can cover so says what would', async () => {
    const { type } = await openRoofLine()
    await type('Length to cover', "29'")
    await type('Longest piece', '10\' 8"')
    expect(screen.getByText('The shop makes 10\' 6" at most.')).toBeVisible()
    await type('Longest piece', '20"')
    expect(screen.getByRole('alert')).toHaveTextContent(/Allow pieces down to/)
    expect(screen.queryByRole('button', { name: /Use these pieces/ })).toBeNull()
  })

  it('is asked again with what was typed before', async () => {
    const { user, type } = await openRoofLine()
    await type('Length to cover', "29'")
    await user.click(screen.getByRole('button', { name: /Use these pieces/ }))
    const [first] = screen.getAllByRole('button', { name: 'Cover a roof line' })
    if (!first) throw new Error('No line covers a roof line.')
    await user.click(first)
    expect(screen.getByRole('textbox', { name: 'Length to cover' })).toHaveValue("29'")
  })
})

describe('small goods', () => {
  it('are added, changed and taken out by hand, and put back', async () => {
    const { user, read } = await openOrder({ lines: [line()] })
    await user.selectOptions(screen.getByRole('combobox', { name: 'Add' }), 'Rivets')
    const field = screen.getByRole('textbox', { name: 'Rivets (pieces)' })
    await user.clear(field)
    await user.type(field, '250')
    expect(read().goods).toMatchObject([{ kind: 'rivets', quantity: 250, unit: 'each' }])
    await user.click(screen.getByRole('button', { name: 'Take out Rivets' }))
    expect(read().goods).toEqual([])
    await user.click(screen.getByRole('button', { name: 'Undo' }))
    expect(read().goods).toMatchObject([{ quantity: 250 }])
  })

  it('are counted from the lines by what is said of them, and changed afterwards', async () => {
    const { user, read } = await openOrder({ lines: [line({ quantity: 2, length: 120 })] })
    await user.click(screen.getByRole('button', { name: 'Count from the lines' }))
    expect(screen.getByText('One line of 19\' 8" with 1 lap of 4"')).toBeVisible()
    await user.click(screen.getByRole('checkbox', { name: 'Closures under it, A' }))
    await user.click(screen.getByRole('button', { name: 'Put on the order' }))
    const kinds = read().goods.map(({ kind }) => kind)
    expect(kinds).toEqual(
      expect.arrayContaining(['fasteners', 'butylTape', 'closures', 'rivets', 'sealant']),
    )
    await user.click(screen.getByRole('button', { name: 'Closures (pieces): one more' }))
    expect(read().goods.find(({ kind }) => kind === 'closures')?.quantity).toBe(8)
    expect(
      within(screen.getByRole('region', { name: 'In all' })).getByText('8 pieces'),
    ).toBeVisible()
  })

  it('cannot be counted where the pieces make no lines alike', async () => {
    const { user } = await openOrder({ lines: [line({ quantity: 3, length: 120 })] })
    await user.click(screen.getByRole('button', { name: 'Count from the lines' }))
    await user.click(screen.getByRole('button', { name: 'Roof lines alike, A: one more' }))
    expect(
      screen.getByRole('textbox', { name: 'Roof lines alike, A' }),
    ).toHaveAccessibleDescription(/cannot be shared out/)
    expect(screen.getByRole('button', { name: 'Put on the order' })).toBeDisabled()
  })

  it('without a number keep the order back', async () => {
    const { user, submit } = await openOrder({
      lines: [line()],
      goods: [{ key: 'g', kind: 'sealant', quantity: null, unit: 'tube', stockId: null, note: '' }],
    })
    await submit()
    const field = screen.getByRole('textbox', { name: 'Sealant (tubes)' })
    expect(field).toHaveAccessibleDescription('Type how many, or take it out.')
    await user.type(field, '3')
    expect(field).not.toHaveAccessibleDescription()
  })
})
