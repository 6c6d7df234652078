import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import type { Degrees } from '#shared/units/brands'
import { ProfilePair } from '@/features/drawing/figure/ProfilePair'
import { ProfileThumb } from '@/features/drawing/figure/ProfileThumb'

interface Props {
  readonly profile: Profile
  readonly stock: Stock
  /** Null while the drawing cannot be made: then it has no strip. */
  readonly strip: Strip | null
  readonly name: string
  /** Where leg 1 heads; absent: to the right. */
  readonly heading?: Degrees
}

/** Width of the column on a phone; the figure shrinks with anything narrower. */
const WIDTH = 360
const HEIGHT = 310

export function LineFigure({ profile, stock, strip, name, heading = 0 }: Props) {
  return strip ? (
    <ProfilePair
      profile={profile}
      stock={stock}
      strip={strip}
      name={name}
      width={WIDTH}
      height={HEIGHT}
      heading={heading}
    />
  ) : (
    <ProfileThumb
      profile={profile}
      stock={stock}
      title={name}
      width={WIDTH}
      height={HEIGHT - 80}
      heading={heading}
      className="h-auto max-w-full"
    />
  )
}
