import { fireEvent, render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { useState } from 'react'
import { describe, expect, it } from 'vitest'
import type { Inches } from '#shared/units/brands'
import { DimensionField } from '@/components/keypad/DimensionField'

function open(error?: string) {
  function Owner() {
    const [value, setValue] = useState<Inches | null>(126)
    return (
      <>
        <DimensionField
          label="Length"
          hint="Up to 50 ft"
          value={value}
          units="fraction"
          purpose="run"
          error={error}
          onChange={setValue}
        />
        <output>{value === null ? 'none' : value}</output>
      </>
    )
  }
  render(<Owner />)
  return {
    user: userEvent.setup(),
    field: screen.getByRole('textbox', { name: 'Length' }),
    value: () => screen.getByRole('status').textContent,
  }
}

const keypad = () => screen.queryByRole('group', { name: 'Keypad' })

describe('a field for a length', () => {
  it('shows its value as the person reads lengths', () => {
    const { field } = open()
    expect(field).toHaveValue("10' 6")
    expect(field).toHaveAccessibleDescription('Up to 50 ft')
  })

  it('reads what is typed while it is typed', async () => {
    const { user, field, value } = open()
    await user.clear(field)
    await user.type(field, '8ft 3 1/2')
    expect(value()).toBe('99.5')
    expect(field).toHaveValue('8ft 3 1/2')
  })

  it('has no value, and says why, when what was typed cannot be read', async () => {
    const { user, field, value } = open()
    await user.clear(field)
    await user.type(field, 'ten feet')
    expect(field).not.toBeInvalid()
    await user.tab()
    expect(value()).toBe('none')
    expect(field).toBeInvalid()
    expect(screen.getByRole('alert')).toHaveTextContent('cannot be read as a measure')
  })

  it('shows the fault its form has found', () => {
    const { field } = open('No piece is longer than 50 ft.')
    expect(field).toBeInvalid()
    expect(screen.getByRole('alert')).toHaveTextContent('No piece is longer than 50 ft.')
  })

  it('opens the shop keypad when it is touched, and not for a mouse', () => {
    const { field } = open()
    fireEvent.pointerDown(field, { pointerType: 'mouse' })
    expect(keypad()).not.toBeInTheDocument()
    fireEvent.pointerDown(field, { pointerType: 'touch' })
    expect(keypad()).toBeInTheDocument()
    expect(field).toHaveAttribute('inputmode', 'none')
  })

  it('is entered with the keys, which close with Escape', async () => {
    const { user, field, value } = open()
    await user.click(screen.getByRole('button', { name: 'Keypad for Length' }))
    for (const name of ['9', 'feet', '4']) await user.click(screen.getByRole('button', { name }))
    expect(value()).toBe('112')
    expect(field).toHaveValue("9' 4")
    await user.keyboard('{Escape}')
    expect(keypad()).not.toBeInTheDocument()
  })
})
