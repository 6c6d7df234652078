import fc from 'fast-check'
import type { Profile } from '#shared/profile/profile.schema'
import { profileArbitrary, profileOf, turnArbitrary } from '../../support/arbitrary-profile'

/** Frames from a thumbnail to a page, slim or wide; pixels. */
export const frameArbitrary = fc.record({
  width: fc.oneof(fc.integer({ min: 12, max: 200 }), fc.integer({ min: 200, max: 1400 })),
  height: fc.oneof(fc.integer({ min: 12, max: 150 }), fc.integer({ min: 150, max: 1000 })),
})

/** Profiles of about as many bends as there may be, most of which cannot be made. */
const crowdedArbitrary: fc.Arbitrary<Profile> = fc.integer({ min: 19, max: 24 }).chain((bends) =>
  fc
    .tuple(
      fc.array(
        fc.integer({ min: 4, max: 48 }).map((count) => count / 16),
        { minLength: bends + 1, maxLength: bends + 1 },
      ),
      fc.array(turnArbitrary, { minLength: bends, maxLength: bends }),
    )
    .map(([legs, turns]) => profileOf(legs, turns)),
)

/** Any profile, of up to 24 bends. */
export const anyProfileArbitrary = fc.oneof(profileArbitrary, crowdedArbitrary)
