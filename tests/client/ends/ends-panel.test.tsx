import { screen, waitFor, within } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { pitchAngle } from '#shared/units/angle'
import type { DraftEnds } from '@/features/ends/model/draft-end'
import { line } from '../orders/draft-lines'
import { openOrder, SUBMIT } from './order-page'

const SLOPE = pitchAngle(6)

const OUTSIDE = { corner: { slopeIn: 0, slopeOut: 0, plan: -90 } }
const CORNERED: DraftEnds = {
  left: { kind: 'miter', plane: OUTSIDE, lay: 0, legs: [], tabs: [] },
  right: { kind: 'square', tabs: [] },
  lowEnd: null,
}

/** The panel of the only line's ends, opened. */
async function openEnds(...lines: Parameters<typeof line>[0][]) {
  const order = await openOrder({ lines: (lines.length > 0 ? lines : [{}]).map(line) })
  const [open] = screen.getAllByRole('button', { name: 'Ends, hand' })
  if (!open) throw new Error('No line has ends to open.')
  await order.user.click(open)
  const choose = (legend: string, option: string) =>
    order.user.click(
      within(screen.getByRole('group', { name: legend })).getByRole('radio', { name: option }),
    )
  return { ...order, choose }
}

describe('an end', () => {
  it('is square until another kind is chosen, and the line says what it is', async () => {
    const { user, choose, line: kept, card } = await openEnds()
    expect(kept().ends).toBeNull()
    await choose('This end is', 'Lap')
    await choose('At the lap this piece lies', 'Under its neighbor')
    expect(kept().ends?.left).toEqual({ kind: 'lap', side: 'under', length: 4, tabs: [] })
    const length = screen.getByRole('textbox', { name: 'Length of the lap' })
    await user.clear(length)
    await user.type(length, '6')
    expect(kept().ends?.left).toMatchObject({ length: 6 })
    expect(card('North rake').getByText('Left: lap 6" under · Right: square')).toBeVisible()
  })

  it('tried as another kind and back loses nothing', async () => {
    const { choose, line: kept } = await openEnds({ ends: CORNERED })
    const before = kept().ends
    await choose('This end is', 'Square')
    expect(kept().ends).toBeNull()
    await choose('This end is', 'Miter')
    expect(kept().ends).toEqual(before)
  })

  it('gets a tab on a leg, with its length', async () => {
    const { user, line: kept, card } = await openEnds()
    await user.click(screen.getByRole('tab', { name: 'Right end' }))
    await user.click(screen.getByText('Tabs'))
    await user.click(screen.getByRole('checkbox', { name: 'Tab, Leg 2' }))
    const length = screen.getByRole('textbox', { name: 'Tab on leg 2' })
    await user.clear(length)
    await user.type(length, '1 1/2')
    expect(kept().ends?.right.tabs).toEqual([{ leg: 2, length: 1.5 }])
    expect(card('North rake').getByText('Left: square · Right: square + 1 1/2" tab')).toBeVisible()
  })

  it('with a measure missing keeps the order back and says where', async () => {
    const { user, choose, submit, api } = await openEnds()
    await choose('This end is', 'Lap')
    await user.clear(screen.getByRole('textbox', { name: 'Length of the lap' }))
    await user.tab()
    expect(screen.getByRole('textbox', { name: 'Length of the lap' })).toHaveAccessibleDescription(
      /Type a length\./,
    )
    await submit()
    expect(screen.getByText(/Something is missing in the ends/)).toBeVisible()
    expect(api.seen(SUBMIT)).toEqual([])
  })
})

describe('a miter', () => {
  it('begins at an outside corner of level pieces, as the leg on the roof lies level', async () => {
    const { choose, line: kept } = await openEnds()
    await choose('This end is', 'Miter')
    expect(kept().ends?.left).toMatchObject({ kind: 'miter', plane: OUTSIDE, lay: 0 })
    expect(screen.getByRole('radio', { name: 'Outside, turns to edge A' })).toBeChecked()
  })

  it("takes the job's pitch for a plumb cut from the way the piece runs", async () => {
    const { choose, line: kept } = await openEnds()
    await choose('The piece runs', 'Up to the left, 6/12')
    await choose('This end is', 'Miter')
    await choose('The cut', 'Plumb')
    expect(kept().ends).toMatchObject({ lowEnd: 'right', left: { plane: { plumb: -SLOPE } } })
    await choose('The piece runs', 'Up to the right, 6/12')
    expect(kept().ends).toMatchObject({ lowEnd: 'left', left: { plane: { plumb: SLOPE } } })
  })

  it('at the low end of a gable meets a level eave, turned inside where it is', async () => {
    const { choose, line: kept } = await openEnds()
    await choose('The piece runs', 'Up to the right, 6/12')
    await choose('This end is', 'Miter')
    expect(screen.getByRole('combobox', { name: 'It meets' })).toHaveDisplayValue('a level eave')
    await choose('Corner of the building', 'Inside, turns to edge B')
    expect(kept().ends?.left).toMatchObject({
      plane: { corner: { slopeIn: 0, slopeOut: SLOPE, plan: 90 } },
    })
  })

  it('cuts the legs off the roof on their own at a gable, and takes it back', async () => {
    const { user, choose, line: kept } = await openEnds()
    await choose('The piece runs', 'Up to the right, 6/12')
    await choose('This end is', 'Miter')
    await user.click(screen.getByRole('button', { name: 'Cut the other legs plumb' }))
    expect(kept().ends?.left).toMatchObject({
      legs: [
        { leg: 2, plane: { plumb: SLOPE } },
        { leg: 3, plane: { plumb: SLOPE } },
      ],
    })
    await user.click(screen.getByRole('button', { name: 'Cut all legs at the corner' }))
    expect(kept().ends?.left).toMatchObject({ legs: [] })
  })

  it('takes any corner by its slopes and angle', async () => {
    const { user, line: kept } = await openEnds({ ends: CORNERED })
    await user.click(screen.getByText('Angle and slopes of the corner'))
    const turn = screen.getByRole('textbox', { name: 'Turn seen from above' })
    await user.clear(turn)
    await user.type(turn, '45')
    await user.selectOptions(screen.getByRole('combobox', { name: 'Run into the corner' }), 'falls')
    const slope = screen.getByRole('textbox', { name: 'by' })
    await user.clear(slope)
    await user.type(slope, '4/12')
    expect(kept().ends?.left).toMatchObject({
      plane: { corner: { slopeIn: -pitchAngle(4), slopeOut: 0, plan: -45 } },
    })
    expect(screen.getByRole('combobox', { name: 'It meets' })).toHaveDisplayValue(
      'a corner by slopes and angle',
    )
  })

  it('takes a free plane from those who ask for it', async () => {
    const { user, choose, line: kept } = await openEnds({ ends: CORNERED })
    expect(screen.queryByRole('radio', { name: 'Free plane' })).toBeNull()
    await user.click(screen.getByRole('button', { name: 'Free plane, for experts' }))
    await choose('The cut', 'Free plane')
    const u = screen.getByRole('textbox', { name: 'u' })
    await user.clear(u)
    await user.type(u, '-0.5')
    expect(kept().ends?.left).toMatchObject({ plane: { normal: [1, -0.5, 0] } })
  })

  it('cuts a leg by itself', async () => {
    const { user, line: kept } = await openEnds({ ends: CORNERED })
    await user.click(screen.getByText('Leg by leg: tabs and own cuts'))
    await user.selectOptions(screen.getByRole('combobox', { name: 'Leg 2 is cut' }), 'square')
    expect(kept().ends?.left).toMatchObject({ legs: [{ leg: 2, plane: { normal: [1, 0, 0] } }] })
    await user.selectOptions(screen.getByRole('combobox', { name: 'Leg 2 is cut' }), 'as the end')
    expect(kept().ends?.left).toMatchObject({ legs: [] })
  })

  it('lies as a leg of it lies, for both ends together', async () => {
    const { user, line: kept } = await openEnds({
      ends: { ...CORNERED, right: { ...CORNERED.left } },
    })
    await user.selectOptions(screen.getByRole('combobox', { name: 'lies on the roof' }), 'plumb')
    expect(kept().ends).toMatchObject({ left: { lay: 90 }, right: { lay: 90 } })
  })

  it('is copied to the other end, mirrored', async () => {
    const { user, line: kept } = await openEnds({ ends: CORNERED })
    await user.click(screen.getByRole('button', { name: 'Copy to the right end, mirrored' }))
    expect(kept().ends?.right).toMatchObject({ kind: 'miter', plane: OUTSIDE })
  })

  it('says its marks in a table', async () => {
    await openEnds({ ends: CORNERED })
    const table = screen.getByRole('table', { name: /Marks of the left end/ })
    const rows = within(table).getAllByRole('row').slice(1)
    expect(rows.map((row) => within(row).getByRole('rowheader').textContent)).toEqual([
      'Edge A',
      'Bend 1',
      'Bend 2',
      'Edge B',
    ])
    expect(screen.getByRole('img', { name: 'A at its left end, folded' })).toBeVisible()
  })

  it('that cannot be cut says why, and the order stays', async () => {
    const { submit, api } = await openEnds({
      ends: { ...CORNERED, left: { kind: 'square', tabs: [{ leg: 7, length: 1 }] } },
    })
    expect(screen.getByText(/At the left end: there is no leg 7 any more/)).toBeVisible()
    await submit()
    expect(screen.getByText(/The ends cannot be cut like this/)).toBeVisible()
    expect(api.seen(SUBMIT)).toEqual([])
  })
})

describe('what meets here', () => {
  const right: DraftEnds = { ...CORNERED, left: CORNERED.right, right: CORNERED.left }

  it('is the first end in the same corner, and the two close', async () => {
    await openEnds({ ends: CORNERED }, { key: 'line-b', mark: 'B', name: 'Eave', ends: right })
    expect(screen.getByRole('combobox', { name: 'Meets here' })).toHaveDisplayValue(
      'B Eave, right end',
    )
    expect(screen.getByText('Closes on every leg')).toBeVisible()
    expect(
      screen.getByRole('img', { name: 'A at its left end, folded, with B that meets it' }),
    ).toBeVisible()
  })

  it('tells on which legs two others close and how wide the gap is elsewhere', async () => {
    const wider = { ...line().profile, legs: [4, 5, 0.75] }
    await openEnds(
      { ends: CORNERED },
      { key: 'line-b', mark: 'B', name: 'Eave', ends: right, profile: wider },
    )
    expect(screen.getByText('Does not close on every leg')).toBeVisible()
    expect(screen.getAllByText('Leg 1 closes on leg 1')).toHaveLength(2)
    expect(screen.getAllByText('Leg 2: 1" apart from leg 2, the nearest')).toHaveLength(2)
  })

  it('may be any that is chosen, and says where two cannot meet', async () => {
    const octagon = { corner: { slopeIn: 0, slopeOut: 0, plan: 45 } }
    const other: DraftEnds = {
      ...right,
      right: { kind: 'miter', plane: octagon, lay: 0, legs: [], tabs: [] },
    }
    const { user } = await openEnds(
      { ends: CORNERED },
      { key: 'line-b', mark: 'B', name: 'Eave', ends: other },
    )
    const meets = screen.getByRole('combobox', { name: 'Meets here' })
    expect(meets).toHaveDisplayValue('Choose the end that meets it')
    await user.selectOptions(meets, 'B Eave, right end')
    expect(screen.getByText('The two ends are cut for different corners.')).toBeVisible()
  })

  it('can be the other hand of the same line', async () => {
    await openEnds({
      ends: CORNERED,
      quantity: 2,
      hands: { drawn: 'left', left: 1, right: 1 },
    })
    expect(screen.getByRole('combobox', { name: 'Meets here' })).toHaveDisplayValue(
      'this line, right end (right hand)',
    )
    expect(screen.getByText('Closes on every leg')).toBeVisible()
  })

  it('without any other miter says that there is none', async () => {
    await openEnds({ ends: CORNERED })
    expect(
      screen.getByText('No other line has a mitered right end that could meet this one.'),
    ).toBeVisible()
  })
})

describe('hands', () => {
  it('make a pair of which each hand is counted, and the quantity follows', async () => {
    const { user, choose, line: kept, card } = await openEnds({ ends: CORNERED })
    await choose('Hand, seen facing the gable', 'A pair')
    expect(kept()).toMatchObject({ quantity: 6, hands: { drawn: 'left', left: 3, right: 3 } })
    await user.click(screen.getByRole('button', { name: 'Right pieces: one more' }))
    expect(kept()).toMatchObject({ quantity: 7, hands: { left: 3, right: 4 } })
    expect(card('North rake').getByText('3 L · 4 R')).toBeInTheDocument()
    expect(card('North rake').getByText('3 left, 4 right')).toBeInTheDocument()
  })

  it('show the mirrored outline of the hand that is not drawn', async () => {
    const { choose } = await openEnds({
      ends: CORNERED,
      hands: { drawn: 'left', left: 3, right: 3 },
    })
    const along = () =>
      within(screen.getByRole('table', { name: /Marks of the left end/ }))
        .getAllByRole('cell')
        .map(({ textContent }) => textContent)
    const drawn = along()
    await choose('Shown', 'right hand')
    // Its left end is the drawn one's right end mirrored, which is square.
    expect(along()).not.toEqual(drawn)
    expect(along().filter((_, index) => index % 2 === 1)).toEqual(['0"', '0"', '0"', '0"'])
  })

  it('of one side alone may be made of a drawing of the other', async () => {
    const { choose, line: kept } = await openEnds({ ends: CORNERED })
    await choose('Hand, seen facing the gable', 'Right only')
    await choose('The drawing and the ends above show the', 'left hand')
    expect(kept()).toMatchObject({ quantity: 6, hands: { drawn: 'left', left: 0, right: 6 } })
  })
})

it('ends, hands and small goods are sent as they stand', async () => {
  const { submit, api } = await openOrder({
    lines: [line({ ends: CORNERED, hands: { drawn: 'left', left: 2, right: 4 } })],
    goods: [
      { key: 'g', kind: 'rivets', quantity: 12, unit: 'each', stockId: null, note: ' white ' },
    ],
  })
  await submit()
  await waitFor(() => expect(api.seen(SUBMIT)).toHaveLength(1))
  expect(api.seen(SUBMIT)[0]?.body).toMatchObject({
    lines: [{ ends: CORNERED, hands: { drawn: 'left', left: 2, right: 4 }, quantity: 6 }],
    goods: [{ kind: 'rivets', quantity: 12, unit: 'each', stockId: null, note: 'white' }],
  })
})
