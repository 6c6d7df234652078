import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { useState } from 'react'
import { describe, expect, it, vi } from 'vitest'
import type { Inches } from '#shared/units/brands'
import type { LengthUnits } from '#shared/units/length-units'
import { AngleKeypad } from '@/components/keypad/AngleKeypad'
import { LengthKeypad } from '@/components/keypad/LengthKeypad'

function openKeypad(units: LengthUnits = 'fraction', first: Inches | null = 4) {
  const told = vi.fn<(inches: Inches | null) => void>()
  const done = vi.fn()
  function Owner() {
    const [value, setValue] = useState<Inches | null>(first)
    return (
      <>
        <LengthKeypad
          label="Leg 2"
          value={value}
          units={units}
          onDone={done}
          onChange={(inches) => {
            told(inches)
            // An owner keeps the last length that could be read, as a profile must.
            if (inches !== null) setValue(inches)
          }}
        />
        <button type="button" onClick={() => setValue(7.25)}>
          dragged
        </button>
      </>
    )
  }
  render(<Owner />)
  return { user: userEvent.setup(), told, done, field: screen.getByLabelText('Leg 2') }
}

const key = (name: string) => screen.getByRole('button', { name })

describe('the keypad for lengths', () => {
  it('enters feet, inches and a fraction by key and tape', async () => {
    const { user, told, field } = openKeypad()
    for (const name of ['1', '0', 'feet', '6']) await user.click(key(name))
    screen.getByRole('slider', { name: 'Fraction of an inch' }).focus()
    await user.keyboard('{ArrowRight}{ArrowRight}')
    expect(field).toHaveValue("10' 6 1/8")
    expect(told).toHaveBeenLastCalledWith(126.125)
  })

  it('says the chosen fraction to those who cannot see the tape', async () => {
    const { user } = openKeypad()
    const tape = screen.getByRole('slider')
    expect(tape).toHaveAttribute('aria-valuetext', 'no fraction')
    tape.focus()
    await user.keyboard('{PageUp}{PageUp}{PageUp}')
    expect(tape).toHaveAttribute('aria-valuetext', '3/8')
    await user.keyboard('{Home}')
    expect(tape).toHaveAttribute('aria-valuetext', 'no fraction')
  })

  it('takes typed text, and lets half a word stand while it is typed', async () => {
    const { user, told, field } = openKeypad()
    await user.clear(field)
    await user.type(field, '5 3/')
    expect(field).toHaveValue('5 3/')
    expect(field).toBeInvalid()
    expect(told).toHaveBeenLastCalledWith(null)
    await user.type(field, '4')
    expect(field).toBeValid()
    expect(told).toHaveBeenLastCalledWith(5.75)
  })

  it('says why a text cannot be read and what would do', async () => {
    const { user, field } = openKeypad()
    await user.clear(field)
    await user.type(field, '5,75')
    expect(field).toHaveAccessibleDescription(/comma can be read two ways.*5\.75/i)
  })

  it('asks for no native keyboard until it is wanted', async () => {
    const { user, field } = openKeypad()
    expect(field).toHaveAttribute('inputmode', 'none')
    await user.click(key('Keyboard of the device'))
    expect(field).toHaveAttribute('inputmode', 'text')
    expect(field).toHaveFocus()
  })

  it('follows its owner when the value is changed elsewhere', async () => {
    const { user, field } = openKeypad()
    await user.click(key('9'))
    await user.click(key('dragged'))
    expect(field).toHaveValue('7 1/4')
  })

  it('is done with Enter', async () => {
    const { user, done, field } = openKeypad()
    await user.type(field, '{Enter}')
    expect(done).toHaveBeenCalledOnce()
  })

  it('has a point and no tape for millimeters', async () => {
    const { user, told } = openKeypad('mm', null)
    expect(screen.queryByRole('slider')).not.toBeInTheDocument()
    expect(screen.queryByRole('button', { name: 'feet' })).not.toBeInTheDocument()
    for (const name of ['2', '5', 'decimal point', '4']) await user.click(key(name))
    expect(told).toHaveBeenLastCalledWith(1)
  })
})

describe('the keypad for angles', () => {
  function openAngles() {
    const told = vi.fn()
    function Owner() {
      const [value, setValue] = useState<number | null>(90)
      return (
        <AngleKeypad
          label="Bend 1"
          value={value}
          quick={[{ degrees: 153.43, label: 'from pitch' }]}
          onChange={(angle) => {
            told(angle)
            setValue(angle)
          }}
        />
      )
    }
    render(<Owner />)
    return { user: userEvent.setup(), told, keys: within(screen.getByRole('group')) }
  }

  it('has the usual angles and the pitch one press away', async () => {
    const { user, told, keys } = openAngles()
    for (const name of ['135°', '45°', 'from pitch']) {
      await user.click(keys.getByRole('button', { name }))
    }
    expect(told.mock.calls).toEqual([[135], [45], [153.43]])
    expect(keys.getByRole('button', { name: 'from pitch' })).toHaveAttribute('aria-pressed', 'true')
  })

  it('enters any angle digit by digit', async () => {
    const { user, told, keys } = openAngles()
    for (const name of ['2', '2', 'decimal point', '5']) {
      await user.click(keys.getByRole('button', { name }))
    }
    expect(told).toHaveBeenLastCalledWith(22.5)
    expect(screen.getByLabelText('Bend 1')).toHaveValue('22.5')
  })
})
