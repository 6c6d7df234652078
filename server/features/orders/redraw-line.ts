import type { StoredLine } from '#server/features/orders/orders.queries'
import { TOLERANCE } from '#shared/geometry/tolerance'
import { resolveFollows } from '#shared/profile/follows'
import type { Profile } from '#shared/profile/profile.schema'

/**
 * The drawing of a line at another pitch; null where nothing of it follows the roof there.
 *
 * A bend that the roof lays flat keeps the side it was drawn to by a turn too small to be one:
 * at the next pitch it must not come up on the other face.
 */
export function redrawLine({ profile }: Pick<StoredLine, 'profile'>, rise: number): Profile | null {
  const resolved = resolveFollows(profile, rise)
  const bends = resolved.bends.map((bend, index) => {
    const side = Math.sign(profile.bends[index]?.turn ?? 0)
    return Math.abs(bend.turn) <= TOLERANCE ? { ...bend, turn: (side * TOLERANCE) / 2 } : bend
  })
  const changed = bends.some(({ turn }, index) => turn !== profile.bends[index]?.turn)
  return changed ? { ...resolved, bends } : null
}

/** Whether an end of the line is cut by a plane, which was set for the roof as it was. */
export const isMitered = ({ ends }: Pick<StoredLine, 'ends'>): boolean =>
  ends !== null && [ends.left, ends.right].some(({ kind }) => kind === 'miter')
