import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import { ProfilePair } from '@/features/drawing/figure/ProfilePair'
import { ProfileThumb } from '@/features/drawing/figure/ProfileThumb'

interface Props {
  readonly profile: Profile
  readonly stock: Stock
  /** Null while the drawing cannot be made: then it has no strip. */
  readonly strip: Strip | null
  readonly name: string
}

/** Width of the column on a phone; the figure shrinks with anything narrower. */
const WIDTH = 360
const HEIGHT = 310

export function LineFigure({ profile, stock, strip, name }: Props) {
  return strip ? (
    <ProfilePair
      profile={profile}
      stock={stock}
      strip={strip}
      name={name}
      width={WIDTH}
      height={HEIGHT}
    />
  ) : (
    <ProfileThumb
      profile={profile}
      stock={stock}
      title={name}
      width={WIDTH}
      height={HEIGHT - 80}
      className="h-auto max-w-full"
    />
  )
}
