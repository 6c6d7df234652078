import type { Part } from '#shared/drawing/display-list'
import { isSamePart } from '#shared/drawing/display-list'
import type { Profile } from '#shared/profile/profile.schema'

/** The parts that have a measure, as the profile is walked: hem A, leg 1, bend 1, leg 2 … hem B. */
export function partsInOrder(profile: Profile): Part[] {
  const walk = profile.legs.flatMap((_, index): Part[] =>
    index === 0
      ? [{ kind: 'leg', leg: 1 }]
      : [
          { kind: 'bend', bend: index },
          { kind: 'leg', leg: index + 1 },
        ],
  )
  return [
    ...(profile.hemA ? [{ kind: 'hem', edge: 'A' } as const] : []),
    ...walk,
    ...(profile.hemB ? [{ kind: 'hem', edge: 'B' } as const] : []),
  ]
}

/** The part before (-1) or after (+1) one in the walk; null at the end of it. */
export function partBeside(profile: Profile, part: Part, by: -1 | 1): Part | null {
  const parts = partsInOrder(profile)
  const place =
    part.kind === 'edge'
      ? part.edge === 'A'
        ? -0.5
        : parts.length - 0.5
      : parts.findIndex((other) => isSamePart(other, part))
  return parts[by > 0 ? Math.floor(place + 1) : Math.ceil(place - 1)] ?? null
}
