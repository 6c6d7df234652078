import { BackLink } from '@/pages/shell/BackLink'
import { ConnectionBadge } from '@/pages/shell/ConnectionBadge'
import type { HeadProps } from '@/pages/shell/FrameHead'
import { HomeLink } from '@/pages/shell/HomeLink'
import { PersonMenu } from '@/pages/shell/PersonMenu'

/** Head of a place worked in with a device in the hand: way back, title, what can be done. */
export function HandHead({ title, subtitle, back, nav, search, actions }: HeadProps) {
  return (
    <div className="flex flex-wrap items-center gap-x-3 border-b border-rule px-[max(0.25rem,calc(var(--gutter)-1rem))] py-1.5">
      {back === undefined ? <HomeLink /> : <BackLink {...back} />}
      <div className="min-w-0 flex-1 sm:flex sm:items-baseline sm:gap-6">
        <h1 className="truncate text-lead leading-tight font-bold sm:max-w-[60%] sm:shrink-0 sm:text-title">
          {title}
        </h1>
        {subtitle !== undefined && (
          <div className="truncate text-small text-scribe">{subtitle}</div>
        )}
      </div>
      {search !== undefined && <div className="min-w-48 flex-1">{search}</div>}
      {nav !== undefined && (
        <div className="order-last w-full overflow-x-auto px-2 md:order-none md:w-auto">{nav}</div>
      )}
      {actions !== undefined && <div className="frame-actions flex items-center">{actions}</div>}
      <div className="frame-top flex items-center gap-1">
        <ConnectionBadge />
        <PersonMenu />
      </div>
    </div>
  )
}
