import { describe, expect, it } from 'vitest'
import { PROFILE_CURE_CODES, PROFILE_PROBLEM_CODES, profileProblem } from '#shared/profile/problem'
import { problemMessage } from '#shared/profile/problem-message'
import { profileProblems } from '#shared/profile/problems'
import { TYPED_REFUSALS } from '#shared/units/typed-number'
import en from '../../../src/locales/en/profile.json'
import enUnits from '../../../src/locales/en/units.json'
import es from '../../../src/locales/es/profile.json'
import esUnits from '../../../src/locales/es/units.json'
import { profileOf, STEEL } from '../../support/arbitrary-profile'

const placeholders = (text: string) => (text.match(/\{\{\w+\}\}/g) ?? []).toSorted()

describe('texts of problems and cures', () => {
  it.each([
    ['en', en],
    ['es', es],
  ])('%s has one for every code', (_, texts) => {
    for (const code of PROFILE_PROBLEM_CODES) expect(texts.problem[code]).toBeTruthy()
    for (const code of PROFILE_CURE_CODES) expect(texts.cure[code]).toBeTruthy()
  })

  it('name the same values in both languages', () => {
    expect(Object.keys(es.problem)).toEqual(Object.keys(en.problem))
    expect(Object.values(es.problem).map(placeholders)).toEqual(
      Object.values(en.problem).map(placeholders),
    )
  })

  it('exist for every refusal of a typed measure', () => {
    for (const texts of [enUnits, esUnits]) {
      for (const code of TYPED_REFUSALS) expect(texts.refused[code]).toBeTruthy()
    }
  })
})

describe('problemMessage', () => {
  const message = (profile: ReturnType<typeof profileOf>, units: 'fraction' | 'decimal' | 'mm') => {
    const [problem] = profileProblems(profile, STEEL)
    if (!problem) throw new Error('The profile has no problem.')
    return problemMessage(problem, units)
  }

  it("prints values in the person's units", () => {
    const short = profileOf([1, 0.0625, 1], [90, -90])
    expect(message(short, 'fraction')).toEqual({
      key: 'problem.legEatenByBends',
      cureKey: 'cure.lengthenLeg',
      values: {
        context: 'leg',
        leg: 2,
        otherLeg: null,
        bend: null,
        hem: null,
        found: '1/16"',
        limit: '1/8"',
      },
    })
    expect(message(short, 'mm').values).toMatchObject({ found: '1.6 mm', limit: '3 mm' })
  })

  it('tells a limit that cures the problem when it is followed', () => {
    // 0.946 in. of room for the lip and 0.108 in. for two bends are told as 15/16 and 1/8.
    const long = profileOf([1, 2], [90], {
      hemA: { style: 'closed', length: 1, turn: 1 },
    })
    expect(message(long, 'fraction').values.limit).toBe('15/16"')
    const followed = profileOf([1, 2], [90], {
      hemA: { style: 'closed', length: 15 / 16, turn: 1 },
    })
    expect(profileProblems(followed, STEEL)).toEqual([])
  })

  it('prints degrees and counts as such, and what is no number too', () => {
    expect(message(profileOf([1, 1], [200]), 'fraction').values.found).toBe('200°')
    expect(message(profileOf([1, 1], []), 'fraction').values).toMatchObject({
      found: '0',
      limit: '1',
    })
    expect(message(profileOf([NaN]), 'fraction').values.found).toBe('?')
    expect(message(profileOf([1e308, 1e308], [90]), 'fraction').values.found).toBe('∞')
  })

  it('says which part is concerned', () => {
    const contexts = [{ leg: 1 }, { bend: 1, leg: 1 }, { hem: 'A' as const, leg: 1 }, {}].map(
      (parts) =>
        problemMessage(profileProblem({ code: 'notFinite', cure: 'enterNumber', ...parts }), 'mm')
          .values.context,
    )
    expect(contexts).toEqual(['leg', 'bend', 'hem', 'piece'])
  })
})
