import { screen } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { includedAngle, pitchAngle } from '#shared/units/angle'
import { readSlope, slopeText, tieTo } from '@/features/drawing/model/second-slope'
import { profileOf } from '../../support/arbitrary-profile'
import { openBoard } from './open-board'

const wings = profileOf([6, 6], [-50])
const followsSelect = () => screen.getByRole('combobox', { name: 'Angle from the roof' })
const second = () => screen.getByRole('textbox', { name: 'Slope of the other roof' })

/** The board with its only bend in hand, tied to the roof by a rule. */
async function openTied(rule: string) {
  const board = await openBoard(wings, { pitchRise: 6 })
  await board.user.click(screen.getByRole('button', { name: 'Bend 1' }))
  await board.user.selectOptions(followsSelect(), rule)
  const included = () => includedAngle(board.drawn().bends[0]?.turn ?? 0)
  return { ...board, included, follows: () => board.drawn().bends[0]?.follows }
}

describe('a bend between two slopes', () => {
  it.each(['ridge', 'hip', 'valley'])("of a %s has the job's on both sides", async (rule) => {
    const { follows } = await openTied(rule)
    expect(follows()).toEqual({ rule, pitch: 'job' })
    expect(second()).toHaveValue('')
    expect(second()).toHaveAccessibleDescription("Left empty: the job's, 6/12.")
  })

  it('of a ridge takes a rise in 12 for the other roof, as one step of undo', async () => {
    const { user, follows, included } = await openTied('ridge')
    await user.type(second(), '12')
    expect(follows()).toEqual({ rule: 'ridge', pitch: 'job', second: pitchAngle(12) })
    expect(included()).toBeCloseTo(180 - pitchAngle(6) - 45, 9)
    await user.click(screen.getByRole('button', { name: 'Undo' }))
    expect(follows()).toEqual({ rule: 'ridge', pitch: 'job' })
    expect(second()).toHaveValue('')
  })

  it("takes degrees too, and goes back to the job's when it is emptied", async () => {
    const { user, follows } = await openTied('valley')
    await user.click(screen.getByRole('radio', { name: 'Degrees' }))
    await user.type(second(), '18.5')
    expect(follows()).toEqual({ rule: 'valley', pitch: 'job', second: 18.5 })
    await user.clear(second())
    expect(follows()).toEqual({ rule: 'valley', pitch: 'job' })
  })

  it('of a transition is asked for, since two equal slopes are no bend', async () => {
    const { user, follows, included } = await openTied('transition')
    expect(follows()).toEqual({ rule: 'transition', pitch: 'job' })
    expect(screen.getAllByText(/only one is known/)[0]).toBeVisible()
    expect(second()).toHaveAccessibleDescription('Type the slope this roof changes to.')
    await user.type(second(), '3')
    expect(included()).toBeCloseTo(180 - (pitchAngle(6) - pitchAngle(3)), 9)
    expect(screen.queryByText(/only one is known/)).toBeNull()
  })

  it.each([
    ['Rise in 12', '30', 'A roof rises from 0 to 24 in 12. Give a steeper one in degrees.'],
    ['Degrees', '90', 'A roof slopes from 0° to less than 90°.'],
    ['Rise in 12', 'steep', 'Type the rise in 12 as a number, such as 4.'],
  ])('refuses a slope that is none: %s, %s', async (reading, text, words) => {
    const { user, follows } = await openTied('ridge')
    await user.click(screen.getByRole('radio', { name: reading }))
    await user.click(second())
    await user.paste(text)
    expect(second()).toHaveAccessibleDescription(words)
    expect(follows()).toEqual({ rule: 'ridge', pitch: 'job' })
  })
})

describe('a slope as it is typed', () => {
  it.each([
    ['6', 'rise', pitchAngle(6)],
    ['6/12', 'rise', pitchAngle(6)],
    ['26.6°', 'rise', 26.6],
    ['26.6', 'degrees', 26.6],
    ['6/12', 'degrees', pitchAngle(6)],
  ] as const)('%s read as %s', (text, reading, slope) => {
    expect(readSlope(text, reading)).toEqual({ ok: true, degrees: slope })
  })

  it('is written as it is read', () => {
    expect(slopeText(pitchAngle(4.5), 'rise')).toBe('4.5')
    expect(slopeText(26.6, 'degrees')).toBe('26.6')
  })
})

describe('the tie to another rule', () => {
  const given = { rule: 'ridge', pitch: 'job', second: 20 } as const

  it('keeps a second slope where the rule takes one, and drops it elsewhere', () => {
    expect(tieTo('transition', given)).toEqual({ rule: 'transition', pitch: 'job', second: 20 })
    expect(tieTo('eave', given)).toEqual({ rule: 'eave', pitch: 'job' })
  })
})
