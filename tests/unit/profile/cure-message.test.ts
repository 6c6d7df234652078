import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { CURE_WORDS, cureMessage } from '#shared/profile/cure-message'
import { findCureEdit } from '#shared/profile/cures'
import { profileProblems } from '#shared/profile/problems'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { ProfileCure } from '#shared/profile/profile-cure'
import en from '../../../src/locales/en/profile.json'
import es from '../../../src/locales/es/profile.json'
import { closedHem, profileArbitrary, profileOf, STEEL } from '../../support/arbitrary-profile'

const z = profileOf([3, 2, 1], [90, -60], { hemB: closedHem(0.5, -1) })
const openHem = (gap: number): Hem => ({ style: 'open', length: 0.5, gap, turn: -1 })
const hemB = (hem: Hem | null): ProfileCure => ({ kind: 'setHem', edge: 'B', hem })
const ridge: Profile = {
  ...profileOf([4, 4]),
  bends: [{ turn: -50, follows: { rule: 'ridge', pitch: 95, second: 20 } }],
}

describe('cureMessage', () => {
  it.each<[Profile, ProfileCure, string, Record<string, unknown>]>([
    [z, { kind: 'setLeg', leg: 3, length: 1.625 }, 'lengthenLeg', { leg: 3, length: '1 5/8"' }],
    [z, { kind: 'setLeg', leg: 1, length: 2.5 }, 'shortenLeg', { leg: 1, length: '2 1/2"' }],
    [z, { kind: 'removeCorner', corner: 2 }, 'takeBendOut', { bend: 2 }],
    [z, { kind: 'setTurn', bend: 2, turn: 60 }, 'turnBendOver', { bend: 2 }],
    [z, { kind: 'setTurn', bend: 2, turn: -45 }, 'setBend', { bend: 2, angle: '135°' }],
    [ridge, { kind: 'setFollows', bend: 1, follows: null }, 'bendByHand', { bend: 1 }],
    [
      ridge,
      { kind: 'setFollows', bend: 1, follows: { rule: 'ridge', pitch: 'job', second: 20 } },
      'bendToJob',
      { bend: 1 },
    ],
    [
      ridge,
      { kind: 'setFollows', bend: 1, follows: { rule: 'ridge', pitch: 95 } },
      'bendToOneSlope',
      { bend: 1 },
    ],
    [z, hemB(null), 'dropHem', { edge: 'B' }],
    [z, hemB(closedHem(0.5, 1)), 'turnHemOver', { edge: 'B' }],
    [z, hemB(closedHem(0.75, -1)), 'lengthenHem', { edge: 'B', length: '3/4"' }],
    [z, hemB(closedHem(0.25, -1)), 'shortenHem', { edge: 'B', length: '1/4"' }],
    [z, hemB(openHem(0.125)), 'openHem', { edge: 'B', gap: '1/8"' }],
    [{ ...z, hemB: openHem(0.01) }, hemB(openHem(0.125)), 'setGap', { edge: 'B', gap: '1/8"' }],
    [{ ...z, hemB: openHem(0.01) }, hemB(closedHem(0.5, -1)), 'closeHem', { edge: 'B' }],
  ])('%#: says what the press will do', (profile, cure, word, values) => {
    expect(cureMessage(profile, cure, 'fraction')).toEqual({ key: `edit.${word}`, values })
  })

  it("prints lengths in the person's units", () => {
    const cure = { kind: 'setLeg', leg: 3, length: 1.5 } as const
    expect(cureMessage(z, cure, 'mm').values).toEqual({ leg: 3, length: '38.1 mm' })
  })

  it('has words for whatever cure is found', () => {
    fc.assert(
      fc.property(profileArbitrary, (profile) => {
        for (const problem of profileProblems(profile, STEEL)) {
          const cure = findCureEdit(profile, problem, STEEL)
          if (cure === null) continue
          const word = cureMessage(profile, cure, 'fraction').key.replace('edit.', '')
          expect(CURE_WORDS).toContain(word)
        }
      }),
    )
  })

  it.each([
    ['en', en],
    ['es', es],
  ])('%s has a text for each', (_, texts) => {
    expect(Object.keys(texts.edit).toSorted()).toEqual(CURE_WORDS.toSorted())
  })
})
