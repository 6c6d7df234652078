import { useTranslation } from 'react-i18next'
import { Link } from 'react-router-dom'
import { resolveFollows } from '#shared/profile/follows'
import { findStarter, starterHeading } from '#shared/profile/starters'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import type { Stock } from '#shared/stock/stock.schema'
import { girthOf } from '#shared/strip/flat-strip'
import { ProfileThumb } from '@/features/drawing/figure/ProfileThumb'
import { useUnits } from '@/features/people/useUnits'
import { useShelfName } from '../useShelfName'

interface Props {
  readonly item: ShelfProfile
  readonly to: string
  readonly stock: Stock
  /** Rise in 12 of the job it is taken for; null outside a job. */
  readonly pitchRise: number | null
}

/** One figure on the wall; the whole of it leads on. */
export function ShelfCard({ item, to, stock, pitchRise }: Props) {
  const { t } = useTranslation('shelf')
  const { size } = useUnits()
  const name = useShelfName()(item)
  const profile = resolveFollows(item.profile, pitchRise)
  const starter = item.starterKey === null ? undefined : findStarter(item.starterKey)
  return (
    <li className="relative flex flex-col border border-rule bg-sheet p-2 has-focus-visible:outline-3 has-focus-visible:outline-dye hover:border-ink">
      <ProfileThumb
        profile={profile}
        heading={starter && starterHeading(starter.key, profile, pitchRise)}
        stock={stock}
        title={name}
        width={160}
        height={110}
        className="h-auto w-full"
      />
      <Link to={to} className="font-semibold outline-none after:absolute after:inset-0">
        {name}
      </Link>
      <p className="font-figure text-small text-scribe">
        {t('girth', { size: size(girthOf(profile)) })}
      </p>
    </li>
  )
}
