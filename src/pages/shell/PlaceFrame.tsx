import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import type { Place } from '#shared/access/permissions'
import { OfflineNotice } from '@/components/OfflineNotice'
import { FrameHead, type HeadProps } from '@/pages/shell/FrameHead'
import { HandHead } from '@/pages/shell/HandHead'
import { usePlace } from '@/pages/shell/place-context'
import { useDocumentTitle } from '@/pages/shell/useDocumentTitle'

interface Props extends HeadProps {
  /**
   * The buttons of the bottom edge, one of them primary, in reading order. On a desk they stand at
   * the right.
   */
  readonly primary?: ReactNode
  /** The screen fills the frame to its edges and scrolls inside: the drawing board, the bend card. */
  readonly fill?: boolean
  readonly children: ReactNode
}

/** Places worked in with a device in the hand or at arm's length: one row of head, no more. */
const IN_HAND: readonly Place[] = ['roof', 'brake']

/** The frame of every screen of a place: head, content, and the bottom edge with its one action. */
export function PlaceFrame({ primary, fill = false, children, ...head }: Props) {
  const { t } = useTranslation('shell')
  const place = usePlace()
  useDocumentTitle(head.title)
  const Head = IN_HAND.includes(place) ? HandHead : FrameHead
  return (
    <div className="frame" data-fill={fill}>
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-40 focus:bg-sheet focus:px-4 focus:py-3"
      >
        {t('skip')}
      </a>
      <header className="frame-head">
        <Head {...head} />
        <OfflineNotice />
      </header>
      <main id="main" tabIndex={-1} className="frame-main">
        {children}
      </main>
      {primary !== undefined && <div className="frame-primary">{primary}</div>}
    </div>
  )
}
