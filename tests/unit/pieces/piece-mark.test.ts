import { expect, test } from 'vitest'
import { pieceMark } from '#shared/pieces/piece-mark'

test('the first piece of mark P1 is not taken for piece P11', () => {
  expect(pieceMark({ mark: 'P1', sequence: 1 })).not.toBe(pieceMark({ mark: 'P', sequence: 11 }))
})
