import { useCallback, useId, useRef, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { NavLink } from 'react-router-dom'
import { PLACES_OF } from '#shared/access/permissions'
import { paths } from '@/app/paths'
import { Icon } from '@/components/Icon'
import { useDismiss } from '@/components/useDismiss'
import { useSignOut } from '@/features/people/api/people.mutations'
import { usePerson } from '@/features/people/person-context'
import { setMuted, useMuted } from '@/lib/device/sound'
import { errorWords } from '@/lib/api/error-words'

const ITEM =
  'flex min-h-target w-full items-center px-4 text-left hover:bg-ink/5 aria-[current=page]:font-bold'

/** The person, the places they may go to, the account and the way out. */
export function PersonMenu() {
  const { t } = useTranslation('shell')
  const person = usePerson()
  const signOut = useSignOut()
  const muted = useMuted()
  const [open, setOpen] = useState(false)
  const root = useRef<HTMLDivElement>(null)
  const button = useRef<HTMLButtonElement>(null)
  const listId = useId()

  const close = useCallback((returnFocus: boolean) => {
    setOpen(false)
    if (returnFocus) button.current?.focus()
  }, [])
  useDismiss(open, root, close)
  const closeOnly = () => setOpen(false)

  return (
    <div ref={root} className="relative shrink-0">
      <button
        ref={button}
        type="button"
        aria-expanded={open}
        aria-controls={listId}
        className="flex min-h-target min-w-target items-center justify-center gap-2 rounded-control px-2 hover:bg-ink/5"
        onClick={() => setOpen(!open)}
      >
        <span className="sr-only">{t('menu')}</span>
        <span className="hidden max-w-40 truncate lg:inline">{person.name}</span>
        <Icon name="menu" />
      </button>
      <div
        id={listId}
        hidden={!open}
        className="absolute top-full right-0 z-30 mt-1 w-72 max-w-[calc(100vw-1.5rem)] border border-edge bg-sheet py-1"
      >
        <p className="border-b border-rule px-4 py-3">
          <span className="block font-semibold">{person.name}</span>
          <span className="block text-small text-scribe">
            {person.company?.name ?? t(`role.${person.role}`)}
          </span>
        </p>
        <nav aria-label={t('places')}>
          <ul className="border-b border-rule py-1">
            {PLACES_OF[person.role].map((place) => (
              <li key={place}>
                <NavLink className={ITEM} to={paths.place(place)} onClick={closeOnly}>
                  {t(`place.${place}`)}
                </NavLink>
              </li>
            ))}
          </ul>
        </nav>
        <NavLink className={ITEM} to={paths.account()} onClick={closeOnly}>
          {t('account')}
        </NavLink>
        <button type="button" className={ITEM} onClick={() => setMuted(!muted)}>
          {t(muted ? 'soundOff' : 'soundOn')}
        </button>
        <button type="button" className={ITEM} onClick={() => signOut.mutate()}>
          {t('signOut')}
        </button>
        {signOut.error && (
          <p role="alert" className="px-4 py-2 text-small text-chalk">
            {t(`problems:${errorWords(signOut.error)}.happened`)}
          </p>
        )}
      </div>
    </div>
  )
}
