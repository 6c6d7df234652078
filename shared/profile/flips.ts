import type { Bend, ColorSide, Hem, Profile } from '#shared/profile/profile.schema'

const OTHER_SIDE: Record<ColorSide, ColorSide> = {
  left: 'right',
  right: 'left',
  both: 'both',
  none: 'none',
}

/** The color on the other face; a sheet painted on both faces or none stays as it is. */
export const flipColorSide = (profile: Profile): Profile => ({
  ...profile,
  colorSide: OTHER_SIDE[profile.colorSide],
})

// 0 - x, not -x: a turn of nothing must not become minus nothing.
const flipBend = (bend: Bend): Bend => ({ ...bend, turn: 0 - bend.turn })

const flipHem = (hem: Hem | null): Hem | null => hem && { ...hem, turn: hem.turn === 1 ? -1 : 1 }

/**
 * The same piece walked from its edge B: order reversed and turns negated, hems changed over with
 * their lips on the other side of the new walk, and the color on its other side too.
 */
export const reverseProfile = (profile: Profile): Profile => ({
  ...flipColorSide(profile),
  legs: profile.legs.toReversed(),
  bends: profile.bends.map(flipBend).toReversed(),
  hemA: flipHem(profile.hemB),
  hemB: flipHem(profile.hemA),
})

/** The piece seen in a mirror: every turn, lip and the color on the other side of the walk. */
export const mirrorProfile = (profile: Profile): Profile => ({
  ...flipColorSide(profile),
  bends: profile.bends.map(flipBend),
  hemA: flipHem(profile.hemA),
  hemB: flipHem(profile.hemB),
})
