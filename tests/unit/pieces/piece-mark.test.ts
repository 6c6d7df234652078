import { expect, it } from 'vitest'
import { pieceMark } from '#shared/pieces/piece-mark'

it('tells the first piece of P1 from the eleventh of P', () => {
  expect(pieceMark({ mark: 'P1', sequence: 1, hand: null })).not.toBe(
    pieceMark({ mark: 'P', sequence: 11, hand: null }),
  )
})

it('carries the hand where the line has hands', () => {
  expect(pieceMark({ mark: 'A', sequence: 3, hand: null })).toBe('A-3')
  expect(pieceMark({ mark: 'A', sequence: 3, hand: 'left' })).toBe('A-3 L')
  expect(pieceMark({ mark: 'A', sequence: 4, hand: 'right' })).toBe('A-4 R')
})
