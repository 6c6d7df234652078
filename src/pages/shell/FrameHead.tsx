import type { ReactNode } from 'react'
import { BackLink } from '@/pages/shell/BackLink'
import { ConnectionBadge } from '@/pages/shell/ConnectionBadge'
import { HomeLink } from '@/pages/shell/HomeLink'
import { PersonMenu } from '@/pages/shell/PersonMenu'
import { PlacesNav } from '@/pages/shell/PlacesNav'

export interface HeadProps {
  readonly title: string
  /** The words beside the title: whose it is, what is happening. */
  readonly subtitle?: ReactNode
  readonly back?: { readonly to: string; readonly label: string }
  /** Screens beside this one, as a SubNav. */
  readonly nav?: ReactNode
  readonly search?: ReactNode
  /** Small actions of the screen, such as undo and redo. */
  readonly actions?: ReactNode
}

/** Head of a place with a desk: a bar of places and search, then the title of the screen. */
export function FrameHead({ title, subtitle, back, nav, search, actions }: HeadProps) {
  return (
    <>
      <div className="frame-top flex flex-wrap items-center gap-x-6 gap-y-2 border-b border-rule px-(--gutter) py-2">
        <HomeLink wordmark />
        <PlacesNav />
        <div className="ml-auto flex items-center gap-2">
          <ConnectionBadge />
          <PersonMenu />
        </div>
        {search !== undefined && (
          <div className="order-last w-full lg:order-none lg:w-96">{search}</div>
        )}
      </div>
      <div className="flex flex-wrap items-center gap-x-5 gap-y-1 px-(--gutter) pt-4">
        {back !== undefined && <BackLink {...back} />}
        <div className="min-w-0 flex-1 sm:flex sm:flex-wrap sm:items-baseline sm:gap-x-5">
          <h1 className="text-title font-bold">{title}</h1>
          {subtitle !== undefined && <div className="text-scribe">{subtitle}</div>}
        </div>
        {actions !== undefined && (
          <div className="frame-actions flex items-center gap-2">{actions}</div>
        )}
        {nav !== undefined && <div className="w-full overflow-x-auto">{nav}</div>}
      </div>
    </>
  )
}
