import type { Profile } from '#shared/profile/profile.schema'

/** A fixed sequence of whole numbers below 4, so that every run draws the same. */
const numbers = (seed: number) => () => {
  seed = (seed * 1_103_515_245 + 12_345) % 2 ** 31
  return Math.floor((seed / 2 ** 31) * 4)
}

/**
 * A wavy panel of shallow bends: nearly every order looks possible for long, so that a search looks
 * at many thousands of folds. `seed` tells one from another.
 */
export function hardProfile(seed = 1, bends = 18): Profile {
  const next = numbers(seed)
  return {
    version: 1,
    legs: Array.from({ length: bends + 1 }, () => 1 + next() / 2),
    bends: Array.from({ length: bends }, (_, index) => {
      const side = Math.floor(index / 2) % 2 === 0 ? 1 : -1
      return { turn: side * (15 + next() * 10) }
    }),
    hemA: null,
    hemB: null,
    colorSide: 'left',
  }
}
