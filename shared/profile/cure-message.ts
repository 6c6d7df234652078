import { isEqual, isLess } from '#shared/geometry/tolerance'
import type { ProfileCure } from '#shared/profile/profile-cure'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import { includedAngle, printAngle } from '#shared/units/angle'
import type { Inches } from '#shared/units/brands'
import type { LengthUnits } from '#shared/units/length-units'
import { printSize } from '#shared/units/print-length'

/** What a press on a cure does, in the order in which they are looked for. */
export const CURE_WORDS = [
  'lengthenLeg',
  'shortenLeg',
  'takeBendOut',
  'turnBendOver',
  'setBend',
  'bendByHand',
  'bendToJob',
  'bendToOneSlope',
  'dropHem',
  'turnHemOver',
  'closeHem',
  'openHem',
  'setGap',
  'lengthenHem',
  'shortenHem',
] as const

export interface CureMessage {
  readonly key: `edit.${(typeof CURE_WORDS)[number]}`
  readonly values: Readonly<Record<string, string | number>>
}

const message = (
  word: (typeof CURE_WORDS)[number],
  values: CureMessage['values'],
): CureMessage => ({ key: `edit.${word}`, values })

const hemMessage = (
  edge: 'A' | 'B',
  before: Hem | null,
  after: Hem | null,
  print: (inches: Inches) => string,
): CureMessage => {
  if (after === null) return message('dropHem', { edge })
  if (before !== null && before.turn !== after.turn) return message('turnHemOver', { edge })
  if (after.style === 'closed' && before?.style === 'open') return message('closeHem', { edge })
  if (after.style === 'open') {
    if (before?.style !== 'open') return message('openHem', { edge, gap: print(after.gap) })
    if (!isEqual(before.gap, after.gap)) return message('setGap', { edge, gap: print(after.gap) })
  }
  const word = isLess(before?.length ?? 0, after.length) ? 'lengthenHem' : 'shortenHem'
  return message(word, { edge, length: print(after.length) })
}

/**
 * The key and printed values of what a cure does to a profile, namespace `profile`: "Lengthen leg 2
 * to 5/8 in." `profile` is the one that the cure was found for. Never throws on what `findCureEdit`
 * gives.
 */
export const cureMessage = (
  profile: Profile,
  cure: ProfileCure,
  units: LengthUnits,
): CureMessage => {
  const print = (inches: Inches) => printSize(inches, units, 64)
  switch (cure.kind) {
    case 'setLeg': {
      const { leg, length } = cure
      const word = isLess(profile.legs[leg - 1] ?? 0, length) ? 'lengthenLeg' : 'shortenLeg'
      return message(word, { leg, length: print(length) })
    }
    case 'removeCorner':
      return message('takeBendOut', { bend: cure.corner })
    case 'setTurn': {
      const { bend, turn } = cure
      return isEqual(turn, 0 - (profile.bends[bend - 1]?.turn ?? 0))
        ? message('turnBendOver', { bend })
        : message('setBend', { bend, angle: printAngle(includedAngle(turn)) })
    }
    case 'setFollows': {
      const { bend, follows } = cure
      if (follows === null) return message('bendByHand', { bend })
      const second = profile.bends[bend - 1]?.follows?.second
      return message(second === follows.second ? 'bendToJob' : 'bendToOneSlope', { bend })
    }
    case 'setHem':
      return hemMessage(cure.edge, cure.edge === 'A' ? profile.hemA : profile.hemB, cure.hem, print)
  }
}
