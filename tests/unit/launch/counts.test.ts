import { describe, expect, it } from 'vitest'
import {
  closingLine,
  groupLines,
  judgeRun,
  sumCounts,
} from '../../../server/launch/checks/counts.mjs'
import { countModule } from '../../../server/launch/checks/vitest-reporter.mjs'

type State = 'passed' | 'failed' | 'skipped' | 'pending'

const part = (...errors: string[]) => ({ errors: () => errors })
const module = (states: State[], ownErrors: string[] = [], suites = [part()]) => ({
  ...part(...ownErrors),
  children: {
    allTests: () => states.map((state) => ({ result: () => ({ state }) })),
    allSuites: () => suites,
  },
})

describe('the counts of a test file', () => {
  it('are those of its tests', () => {
    expect(countModule(module(['passed', 'passed', 'failed', 'skipped']))).toEqual({
      passed: 2,
      failed: 1,
      skipped: 1,
    })
  })

  it('take a test that did not finish as failed', () => {
    expect(countModule(module(['passed', 'pending']))).toMatchObject({ passed: 1, failed: 1 })
  })

  it('take a file that did not load as one failure', () => {
    expect(countModule(module([], ['no such module']))).toMatchObject({ passed: 0, failed: 1 })
  })

  it('take a suite whose hook threw as one failure', () => {
    expect(countModule(module(['skipped'], [], [part('hook')]))).toMatchObject({ failed: 1 })
  })
})

describe('a run', () => {
  const unit = { passed: 3, failed: 0, skipped: 0 }
  const failures = (code: number, report: Parameters<typeof judgeRun>[1]) =>
    sumCounts(judgeRun(code, report).groups.map(([, counts]) => counts)).failed

  it('passes with its tests', () => {
    const report = { projects: { unit }, unhandledErrors: 0 }
    expect(judgeRun(0, report)).toEqual({ groups: [['unit', unit]], remarks: [] })
  })

  it('counts a failed test once, whatever the exit code says', () => {
    const report = { projects: { unit: { ...unit, failed: 2 } }, unhandledErrors: 0 }
    expect(failures(1, report)).toBe(2)
  })

  it('counts every error outside the tests', () => {
    expect(failures(1, { projects: { unit }, unhandledErrors: 2 })).toBe(2)
  })

  it.each([
    ['without a report', 0, undefined],
    ['without tests', 0, { projects: {}, unhandledErrors: 0 }],
    [
      'with skipped tests alone',
      0,
      { projects: { unit: { passed: 0, failed: 0, skipped: 4 } }, unhandledErrors: 0 },
    ],
    ['with an exit code that no test explains', 1, { projects: { unit }, unhandledErrors: 0 }],
  ])('fails %s', (_, code, report) => {
    const { groups, remarks } = judgeRun(code, report)
    expect(groups.at(-1)).toEqual(['run', { passed: 0, failed: 1, skipped: 0 }])
    expect(remarks).toHaveLength(1)
  })
})

describe('the summary', () => {
  it('has a line for each group, in columns', () => {
    expect(
      groupLines([
        ['unit', { passed: 120, failed: 0, skipped: 0 }],
        ['client', { passed: 7, failed: 1, skipped: 2 }],
      ]),
    ).toEqual(['unit      120 passed', 'client      7 passed, 1 failed, 2 skipped'])
  })

  it('closes with the sum', () => {
    expect(closingLine({ passed: 127, failed: 1, skipped: 2 })).toBe('127 passed, 1 failed')
  })
})
