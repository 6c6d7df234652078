import type { ColorSide } from '#shared/profile/profile.schema'

/** The side that counts as shown when nothing, or everything, is painted: the left. */
export const isLeftTheShownSide = (paintedSide: ColorSide): boolean => paintedSide !== 'right'

/** Whether the one painted side faces up; null where it makes no difference. */
export const isPaintedUp = (paintedSide: ColorSide, leftUp: boolean): boolean | null => {
  if (paintedSide === 'both' || paintedSide === 'none') return null
  return (paintedSide === 'left') === leftUp
}
