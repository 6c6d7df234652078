import type { Side } from '#shared/ends/end.schema'
import type { Profile } from '#shared/profile/profile.schema'
import { isEqual } from '#shared/geometry/tolerance'
import {
  cornerKind,
  cornerPlane,
  cornersOf,
  plumbPlane,
  turnsTo,
  withTurn,
  type Run,
} from './corner-presets'
import type { DraftEnd, DraftEnds, DraftPlane } from './draft-end'
import { layOf, withLay } from './end-edits'
import { usualLay } from './lay-presets'

/** A cut that came from how the piece runs, for another run; any other stays as it was set. */
function planeOfRun(plane: DraftPlane, side: Side, before: Run, after: Run): DraftPlane {
  if ('plumb' in plane) {
    const usual = plumbPlane(before)
    const follows = 'plumb' in usual && isEqual(usual.plumb ?? NaN, plane.plumb ?? NaN)
    return follows ? plumbPlane(after) : plane
  }
  if ('normal' in plane) return plane
  const kind = cornerKind(plane, side, before)
  if (kind === 'own') return plane
  const { plan } = plane.corner
  const met = cornersOf(after).includes(kind) ? kind : 'level'
  const moved = cornerPlane(met, turnsTo(plan), side, after)
  return 'corner' in moved
    ? { corner: { ...moved.corner, plan: plan === null ? null : withTurn(plan, turnsTo(plan)) } }
    : moved
}

function endOfRun(end: DraftEnd, side: Side, before: Run, after: Run): DraftEnd {
  if (end.kind !== 'miter') return end
  return {
    ...end,
    plane: planeOfRun(end.plane, side, before, after),
    legs: end.legs.map(({ leg, plane }) => ({
      leg,
      plane: planeOfRun(plane, side, before, after),
    })),
  }
}

/** The piece runs another way: cuts and lay that came from its run come from the new one. */
export function withLowEnd(
  ends: DraftEnds,
  lowEnd: Side | null,
  slope: number,
  profile: Profile,
): DraftEnds {
  const before: Run = { slope, lowEnd: ends.lowEnd }
  const after: Run = { slope, lowEnd }
  const turned: DraftEnds = {
    left: endOfRun(ends.left, 'left', before, after),
    right: endOfRun(ends.right, 'right', before, after),
    lowEnd,
  }
  const lay = layOf(ends)
  const usual = lay !== undefined && lay !== null && isEqual(lay, usualLay(profile, before))
  return usual ? withLay(turned, usualLay(profile, after)) : turned
}
