import type { Degrees } from '#shared/units/brands'
import type { Brake } from './brake.schema'
import type { PieceBend } from './workpiece'

const PLAIN_SCALE: NonNullable<Brake['scale']> = { reads: 'bend', overbend: 'hand' }

/**
 * What the brake's scale is set to for a fold, in degrees: of bend, or the included angle. `swing` has
 * the springback in it; a machine that adds it is told the finished angle. A hem's first hit goes to
 * the hem angle either way.
 */
export const scaleAngle = (
  bend: PieceBend,
  swing: Degrees,
  { scale = PLAIN_SCALE }: Brake,
): Degrees => {
  const isSetOverbent = bend.hem !== null || scale.overbend === 'hand'
  const ofBend = isSetOverbent ? swing : Math.abs(bend.turn)
  return scale.reads === 'bend' ? ofBend : 180 - ofBend
}
