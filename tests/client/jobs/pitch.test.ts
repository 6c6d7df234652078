import { describe, expect, test } from 'vitest'
import { newJobForm } from '@/features/jobs/new-job'
import { parsePitch } from '@/features/jobs/pitch'

describe('a pitch as it is written', () => {
  test.each([
    ['6', 6],
    [' 6/12 ', 6],
    ['4.5', 4.5],
    ['4,5', 4.5],
    ['6:12', 6],
    ['6 in 12', 6],
    ['6 en 12', 6],
    ['0', 0],
    ['24', 24],
  ])('%j is a rise of %d in 12', (text, rise) => {
    expect(parsePitch(text)).toEqual({ ok: true, rise })
  })

  test.each([
    ['', 'empty'],
    ['steep', 'malformed'],
    ['6/10', 'malformed'],
    ['-3', 'malformed'],
    ['24.5', 'outOfRange'],
  ] as const)('%j is refused: %s', (text, refusal) => {
    expect(parsePitch(text)).toEqual({ ok: false, refusal })
  })
})

describe('the form of a new job', () => {
  const fields = { name: 'Barn', address: '', pitch: '6/12', companyId: '' }

  test('gives the rise as a number', () => {
    expect(newJobForm(false).parse(fields).pitch).toBe(6)
  })

  test('asks the shop whose job it is', () => {
    const issues = newJobForm(true).safeParse(fields).error?.issues
    expect(issues?.map(({ path }) => path.join('.'))).toEqual(['companyId'])
  })

  test('says why a pitch is refused', () => {
    const issues = newJobForm(false).safeParse({ ...fields, pitch: '30' }).error?.issues
    expect(issues?.map(({ message }) => message)).toEqual(['outOfRange'])
  })
})
