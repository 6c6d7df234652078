import { useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { PersonRow } from '#shared/people/people.contract'
import { EmptyState } from '@/components/EmptyState'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { peopleQuery } from '@/features/people/api/people-list.queries'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OfficeNav } from './OfficeNav'

const column = columnsOf<PersonRow>()

export function PeoplePage() {
  const { t } = useTranslation('office')
  const { moment } = useFormats()
  const { data, error, refetch } = useQuery(peopleQuery())
  const columns = useMemo(
    () =>
      column.columns([
        column.accessor('name', { header: t('people.name') }),
        column.accessor(({ role }) => t(`shell:role.${role}`), {
          id: 'role',
          header: t('people.role'),
        }),
        column.accessor(({ company }) => company?.name ?? t('people.shop'), {
          id: 'company',
          header: t('people.company'),
        }),
        column.accessor('email', { header: t('people.email') }),
        column.display({
          id: 'lastSignIn',
          header: t('people.lastSignIn'),
          cell: ({ row: { original } }) =>
            original.lastSignInAt === null ? (
              <span className="text-scribe">{t('people.never')}</span>
            ) : (
              moment(original.lastSignInAt)
            ),
        }),
        column.accessor(({ active }) => t(active ? 'people.active' : 'people.closed'), {
          id: 'active',
          header: t('people.account'),
        }),
      ]),
    [t, moment],
  )
  return (
    <PlaceFrame title={t('people.title')} subtitle={t('people.meaning')} nav={<OfficeNav />}>
      <DataTable
        caption={t('people.title')}
        captionHidden
        rows={data?.items}
        columns={columns}
        rowId={({ id }) => id}
        error={error}
        onRetry={() => void refetch()}
        empty={<EmptyState title={t('people.empty')} />}
      />
    </PlaceFrame>
  )
}
