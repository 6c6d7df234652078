import { describe, expect, it } from 'vitest'
import { DEMO_BRAKES } from '#shared/bend-plan/demo-brakes'
import { planProfile } from '#shared/bend-plan/plan-profile'
import { resolveFollows } from '#shared/profile/follows'
import { profileProblems } from '#shared/profile/problems'
import { profileSchema } from '#shared/profile/profile.schema'
import { getStarter, STARTER_KEYS, STARTER_KINDS, STARTERS } from '#shared/profile/starters'
import en from '../../../src/locales/en/starters.json'
import es from '../../../src/locales/es/starters.json'
import { STEEL } from '../../support/arbitrary-profile'

describe('starter profiles', () => {
  it('are one for each key', () => {
    expect(STARTERS.map(({ key }) => key).toSorted()).toEqual(STARTER_KEYS.toSorted())
  })

  it.each(STARTERS)('$key is sound in 24 gauge steel from 2/12 to 12/12', ({ profile }) => {
    expect(profileSchema.parse(profile)).toEqual(profile)
    for (const rise of [2, 6, 12]) {
      expect(profileProblems(resolveFollows(profile, rise), STEEL)).toEqual([])
    }
  })

  it.each(STARTERS)('$key bends on every demo brake in 10 ft', ({ key, profile }) => {
    for (const brake of DEMO_BRAKES) {
      // With a hem at each edge the valley reaches further back than the site brake's throat.
      const isTooDeep = key === 'valley' && brake.throat < 21
      expect(planProfile(profile, STEEL, brake, 120).feasible).toBe(!isTooDeep)
    }
  })

  it('have a name and a description in both languages', () => {
    for (const texts of [en, es]) {
      for (const key of STARTER_KEYS) {
        expect(texts[key].name).not.toBe('')
        expect(texts[key].about).not.toBe('')
      }
      for (const kind of STARTER_KINDS) expect(texts.kind[kind]).not.toBe('')
    }
  })

  it('are found by key', () => {
    expect(getStarter('ridge').kind).toBe('ridge')
  })
})
