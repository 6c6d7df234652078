import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { PersonRow } from '#shared/people/people.contract'
import { paths } from '@/app/paths'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { Notice } from '@/components/Notice'
import { crewQuery } from '@/features/people/api/accounts.queries'
import { InviteForm } from '@/features/people/components/InviteForm'
import { PersonActions } from '@/features/people/components/PersonActions'
import { useMay, usePerson } from '@/features/people/person-context'
import { NotFoundPage } from '@/pages/not-found/NotFoundPage'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'

/** The people of a crew lead's own company, and an invitation for another one. */
export function CrewPage() {
  const { t } = useTranslation('people')
  const { company } = usePerson()
  if (!useMay('crew.read')) return <NotFoundPage />
  return (
    <PlaceFrame
      title={t('crew.title')}
      subtitle={company?.name}
      back={{ to: paths.account(), label: t('account:title') }}
    >
      <div className="flex max-w-xl flex-col gap-8">
        <Crew />
        <InviteToCrew />
      </div>
    </PlaceFrame>
  )
}

function Crew() {
  const { t } = useTranslation('people')
  const { data, error, refetch } = useQuery(crewQuery())
  if (!data) {
    return error ? <ErrorState error={error} onRetry={() => void refetch()} /> : <LoadingState />
  }
  return (
    <ul className="border-t border-rule">
      {data.items.map((person) => (
        <li
          key={person.id}
          className="flex flex-wrap items-center justify-between gap-3 border-b border-rule py-3"
        >
          <span>
            <strong className="block">{person.name}</strong>
            <span className="text-small text-scribe">{person.email}</span>
          </span>
          {!person.active && <span className="text-scribe">{t('state.closed')}</span>}
          {person.active && person.invited && (
            <span className="text-scribe">{t('state.invited')}</span>
          )}
          <PersonActions person={person} />
        </li>
      ))}
    </ul>
  )
}

function InviteToCrew() {
  const { t } = useTranslation('people')
  const [invited, setInvited] = useState<PersonRow | null>(null)
  return (
    <section aria-labelledby="invite" className="flex flex-col gap-4">
      <h2 id="invite" className="text-lead font-bold">
        {t('crew.invite')}
      </h2>
      <p className="text-scribe">{t('crew.meaning')}</p>
      {invited && <Notice kind="done">{t('invite.done', { email: invited.email })}</Notice>}
      <InviteForm companies={null} onInvited={setInvited} />
    </section>
  )
}
