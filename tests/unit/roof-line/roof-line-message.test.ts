import { describe, expect, it } from 'vitest'
import { roofLineSchema } from '#shared/roof-line/roof-line.schema'
import { roofLineMessage } from '#shared/roof-line/roof-line-message'
import { roofPieces } from '#shared/roof-line/roof-pieces'
import {
  ROOF_LINE_CURE_CODES,
  ROOF_LINE_NOTES,
  ROOF_LINE_PROBLEM_CODES,
} from '#shared/roof-line/roof-line-problem'
import en from '../../../src/locales/en/roof-line.json'
import es from '../../../src/locales/es/roof-line.json'

const line = { length: 130, pieceLength: 120, lap: 4, mode: 'full' }

const messageOf = (given: object) => {
  const found = roofPieces(roofLineSchema.parse({ ...line, ...given }))
  const problem = found.ok ? undefined : found.problems[0]
  if (!problem) throw new Error('The line has an answer.')
  return roofLineMessage(problem, 'fraction')
}

describe('texts of roof lines', () => {
  it.each([
    ['en', en],
    ['es', es],
  ])('%s has one for every code', (_, texts) => {
    const problems = Object.keys(texts.problem).map((key) => key.replace(/_(left|right)$/, ''))
    expect(new Set(problems)).toEqual(new Set(ROOF_LINE_PROBLEM_CODES))
    expect(Object.keys(texts.cure).toSorted()).toEqual(ROOF_LINE_CURE_CODES.toSorted())
    expect(Object.keys(texts.note).toSorted()).toEqual(ROOF_LINE_NOTES.toSorted())
  })
})

describe('roofLineMessage', () => {
  it('prints measures along the roof, and counts as such', () => {
    expect(messageOf({ lap: 20, pieceLength: 20, minimum: 0 })).toEqual({
      key: 'problem.lapOverPiece',
      cureKey: 'cure.shortenLap',
      values: { context: 'line', found: `1' 8"`, limit: `1' 8"`, cured: `1' 8"` },
    })
    expect(messageOf({ pieceLength: 4.5, length: 12_000, minimum: 0 }).values).toMatchObject({
      found: '23992',
      limit: '500',
    })
  })

  it('names a measure that cures when it is followed', () => {
    // Two pieces of 67.04 in.: told as 5 ft 7 in., the next sixteenth down.
    const { values } = messageOf({ length: 130.08, minimum: 110 })
    expect(values.cured).toBe(`5' 7"`)
    expect(roofPieces(roofLineSchema.parse({ ...line, length: 130.08, minimum: 67 })).ok).toBe(true)
  })

  it('says which end is concerned', () => {
    const short = { pieceLength: 40, length: 100 }
    expect(messageOf({ ...short, leftExtra: 37 }).values.context).toBe('left')
    expect(messageOf({ ...short, rightExtra: 59, minimum: 0 }).values.context).toBe('right')
  })
})
