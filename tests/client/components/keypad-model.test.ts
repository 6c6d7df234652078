import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import {
  keypadLength,
  keypadText,
  openKeypad,
  pressDigit,
  pressErase,
  pressFeet,
  pressPoint,
  pressTick,
  tickAt,
  tickText,
  typeText,
  type KeypadState,
} from '@/components/keypad/keypad-model'

type Press = number | 'ft' | '.' | 'erase' | { tick: number } | { text: string }

function press(state: KeypadState, ...presses: Press[]): KeypadState {
  return presses.reduce<KeypadState>((now, key) => {
    if (typeof key === 'number') return pressDigit(now, key)
    if (key === 'ft') return pressFeet(now)
    if (key === '.') return pressPoint(now)
    if (key === 'erase') return pressErase(now)
    return 'tick' in key ? pressTick(now, key.tick) : typeText(now, key.text)
  }, state)
}

const inches = (state: KeypadState) => {
  const length = keypadLength(state)
  return length.ok ? length.inches : length.code
}

const fractions = openKeypad(null, 'fraction', 'size')

describe('digits, feet and the tape', () => {
  it.each<[string, Press[], string, number]>([
    ['whole inches', [1, 2], '12', 12],
    ['inches and a fraction', [4, { tick: 6 }], '4 3/8', 4.375],
    ['a fraction alone', [{ tick: 12 }], '3/4', 0.75],
    ['feet alone', [1, 0, 'ft'], "10'", 120],
    ['feet and inches', [1, 0, 'ft', 6], "10' 6", 126],
    ['feet, inches and a fraction', [1, 0, 'ft', 6, { tick: 8 }], "10' 6 1/2", 126.5],
    ['feet and a fraction', [2, 'ft', { tick: 1 }], "2' 1/16", 24.0625],
  ])('%s', (_, presses, text, value) => {
    const state = press(fractions, ...presses)
    expect(keypadText(state)).toBe(text)
    expect(inches(state)).toBe(value)
  })

  it('the fraction may come before the inches', () => {
    expect(inches(press(fractions, { tick: 4 }, 3))).toBe(3.25)
  })

  it('another tick replaces the fraction, and the zero takes it away', () => {
    expect(inches(press(fractions, 4, { tick: 4 }, { tick: 8 }))).toBe(4.5)
    expect(inches(press(fractions, 4, { tick: 4 }, { tick: 0 }))).toBe(4)
  })

  it('ft twice makes inches again', () => {
    expect(inches(press(fractions, 9, 'ft', 'ft'))).toBe(9)
  })

  it('ft without a number before it does nothing', () => {
    expect(keypadText(press(fractions, 'ft'))).toBe('')
  })

  it('a leading zero is not kept', () => {
    expect(keypadText(press(fractions, 0, 7))).toBe('7')
  })

  it('nothing entered is told as empty', () => {
    expect(inches(fractions)).toBe('empty')
  })

  it('far too much is refused, not cut down', () => {
    expect(inches(press(fractions, 9, 9, 9, 9, 9, 9, 9))).toBe('tooLarge')
  })
})

describe('erase', () => {
  it('takes the fraction, then digits, then feet', () => {
    const full = press(fractions, 1, 0, 'ft', 6, { tick: 8 })
    const texts = [1, 2, 3, 4].map((times) =>
      keypadText(press(full, ...Array.from({ length: times }, () => 'erase' as const))),
    )
    expect(texts).toEqual(["10' 6", "10'", "1'", ''])
  })

  it('empties typed text at once', () => {
    expect(keypadText(press(fractions, { text: '4 5/32' }, 'erase'))).toBe('')
  })
})

describe('a value that was there before', () => {
  const four = openKeypad(4.5, 'fraction', 'size')

  it('is replaced by the first digit', () => {
    expect(inches(press(four, 6))).toBe(6)
    expect(inches(press(four, 6, 2))).toBe(62)
  })

  it('keeps its inches when a tick is touched', () => {
    expect(inches(press(four, { tick: 2 }))).toBe(4.125)
  })

  it('opens in feet where it is a length, in inches where it is a size', () => {
    expect(keypadText(openKeypad(126.5, 'fraction', 'run'))).toBe("10' 6 1/2")
    expect(keypadText(openKeypad(126.5, 'fraction', 'size'))).toBe('126 1/2')
  })

  it('that the tape has no tick for is shown exactly, as text', () => {
    expect(keypadText(openKeypad(9.15625, 'fraction', 'size'))).toBe('9 5/32"')
    expect(inches(openKeypad(9.15625, 'fraction', 'size'))).toBe(9.15625)
  })

  it.each(['size', 'run'] as const)('in any 64th reads back as itself (%s)', (purpose) => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 600 * 64 }), (sixtyFourths) => {
        expect(inches(openKeypad(sixtyFourths / 64, 'fraction', purpose))).toBe(sixtyFourths / 64)
      }),
    )
  })

  it.each([
    ['decimal', 0.00005],
    ['mm', 0.05 / 25.4],
  ] as const)('reads back to half of the last place shown (%s)', (units, half) => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 600 * 64 }), (sixtyFourths) => {
        const read = Number(inches(openKeypad(sixtyFourths / 64, units, 'size')))
        expect(Math.abs(read - sixtyFourths / 64)).toBeLessThanOrEqual(half + 1e-9)
      }),
    )
  })
})

describe('decimals and millimeters', () => {
  it('a point stands in for the tape', () => {
    expect(inches(press(openKeypad(null, 'decimal', 'size'), 4, '.', 3, 7, 5))).toBe(4.375)
  })

  it('millimeters are meant where millimeters are read', () => {
    expect(inches(press(openKeypad(null, 'mm', 'size'), 2, 5, '.', 4))).toBe(1)
  })

  it('a number has one point, and a zero before it', () => {
    expect(keypadText(press(openKeypad(null, 'mm', 'size'), '.', 5, '.', 5))).toBe('0.55')
  })
})

describe('typed text', () => {
  it('follows the rules of every typed length', () => {
    expect(inches(press(fractions, { text: `5' 3 1/2"` }))).toBe(63.5)
    expect(inches(press(fractions, { text: '146 mm' }))).toBeCloseTo(5.748, 3)
    expect(inches(press(fractions, { text: '5,75' }))).toBe('comma')
  })

  it('gives way to the keys', () => {
    expect(inches(press(fractions, { text: 'abc' }, 7))).toBe(7)
    expect(inches(press(fractions, { text: 'abc' }, { tick: 8 }))).toBe(0.5)
  })
})

describe('the tape', () => {
  it('writes fractions in lowest terms', () => {
    expect([1, 2, 4, 6, 8, 12, 15].map(tickText)).toEqual([
      '1/16',
      '1/8',
      '1/4',
      '3/8',
      '1/2',
      '3/4',
      '15/16',
    ])
  })

  it('gives each tick an equal part of its width', () => {
    expect(tickAt(0, 320)).toBe(0)
    expect(tickAt(19.9, 320)).toBe(0)
    expect(tickAt(20, 320)).toBe(1)
    expect(tickAt(170, 320)).toBe(8)
  })

  it('holds a finger that slides past its ends', () => {
    expect(tickAt(-5, 320)).toBe(0)
    expect(tickAt(400, 320)).toBe(15)
  })
})
