import { useQuery } from '@tanstack/react-query'
import { useMemo, useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { PersonRow } from '#shared/people/people.contract'
import { paths } from '@/app/paths'
import { ButtonLink } from '@/components/ButtonLink'
import { EmptyState } from '@/components/EmptyState'
import { Notice } from '@/components/Notice'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { companiesQuery } from '@/features/jobs/api/companies.queries'
import { peopleQuery } from '@/features/people/api/people-list.queries'
import { CompanyForm } from '@/features/people/components/CompanyForm'
import { InviteForm } from '@/features/people/components/InviteForm'
import { PersonActions } from '@/features/people/components/PersonActions'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OfficeNav } from './OfficeNav'

const column = columnsOf<PersonRow>()

const stateOf = ({ active, invited }: PersonRow) =>
  active ? (invited ? 'invited' : 'open') : 'closed'

export function PeoplePage() {
  const { t } = useTranslation('people')
  const { moment } = useFormats()
  const { data, error, refetch } = useQuery(peopleQuery())
  const columns = useMemo(
    () =>
      column.columns([
        column.accessor('name', { header: t('column.name') }),
        column.accessor(({ role }) => t(`shell:role.${role}`), {
          id: 'role',
          header: t('column.role'),
        }),
        column.accessor(({ company }) => company?.name ?? t('shop'), {
          id: 'company',
          header: t('column.company'),
        }),
        column.accessor('email', { header: t('column.email') }),
        column.display({
          id: 'lastSignIn',
          header: t('column.lastSignIn'),
          cell: ({ row: { original } }) =>
            original.lastSignInAt === null ? (
              <span className="text-scribe">{t('never')}</span>
            ) : (
              moment(original.lastSignInAt)
            ),
        }),
        column.accessor((person) => t(`state.${stateOf(person)}`), {
          id: 'state',
          header: t('column.account'),
        }),
        column.display({
          id: 'actions',
          header: t('column.actions'),
          cell: ({ row: { original } }) => <PersonActions person={original} />,
        }),
      ]),
    [t, moment],
  )
  return (
    <PlaceFrame title={t('title')} subtitle={t('meaning')} nav={<OfficeNav />}>
      <div className="flex flex-col gap-10">
        <DataTable
          caption={t('title')}
          captionHidden
          rows={data?.items}
          columns={columns}
          rowId={({ id }) => id}
          error={error}
          onRetry={() => void refetch()}
          empty={<EmptyState title={t('empty')} />}
        />
        <Invite />
      </div>
    </PlaceFrame>
  )
}

function Invite() {
  const { t } = useTranslation('people')
  const { data: companies } = useQuery(companiesQuery())
  const [invited, setInvited] = useState<PersonRow | null>(null)
  if (!companies) return null
  return (
    <div className="grid gap-x-12 gap-y-8 border-t border-rule pt-6 md:grid-cols-2">
      <section aria-labelledby="invite" className="flex flex-col gap-4">
        <h2 id="invite" className="text-lead font-bold">
          {t('invite.title')}
        </h2>
        <p className="text-scribe">{t('invite.meaning')}</p>
        {invited && (
          <Notice kind="done">
            <p className="mb-2">{t('invite.done', { email: invited.email })}</p>
            <ButtonLink to={paths.office.mails()}>{t('invite.toMails')}</ButtonLink>
          </Notice>
        )}
        <InviteForm companies={companies.items} onInvited={setInvited} />
      </section>
      <section aria-labelledby="companies" className="flex flex-col gap-4">
        <h2 id="companies" className="text-lead font-bold">
          {t('companies.title')}
        </h2>
        <ul className="border-t border-rule">
          {companies.items.map(({ id, name }) => (
            <li key={id} className="flex min-h-target items-center border-b border-rule">
              {name}
            </li>
          ))}
        </ul>
        <CompanyForm />
      </section>
    </div>
  )
}
