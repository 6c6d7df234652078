import { keepPreviousData, useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import { useSearchParams } from 'react-router-dom'
import type { AuditEntry } from '#shared/audit/audit.contract'
import { EmptyState } from '@/components/EmptyState'
import { Select } from '@/components/Select'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { auditQuery } from '@/features/audit/api/audit.queries'
import { changedFields } from '@/features/audit/changed-fields'
import { peopleQuery } from '@/features/people/api/people-list.queries'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OfficeNav } from './OfficeNav'

const column = columnsOf<AuditEntry>()

/** Who changed people, companies and prices, newest first. */
export function AuditPage() {
  const { t } = useTranslation('audit')
  const { moment } = useFormats()
  const [params, setParams] = useSearchParams()
  const person = params.get('person') ?? undefined
  const { data: people } = useQuery(peopleQuery())
  const found = useInfiniteQuery({ ...auditQuery(person), placeholderData: keepPreviousData })
  const entries = useMemo(() => found.data?.pages.flatMap(({ items }) => items), [found.data])
  const columns = useMemo(
    () =>
      column.columns([
        column.accessor(({ at }) => moment(at), { id: 'at', header: t('column.at') }),
        column.accessor(({ by }) => by.name, { id: 'by', header: t('column.by') }),
        column.accessor(({ action }) => t(`action.${action}`), {
          id: 'action',
          header: t('column.action'),
        }),
        column.accessor(({ subject }) => `${t(`kind.${subject.kind}`)}: ${subject.name}`, {
          id: 'subject',
          header: t('column.subject'),
        }),
        column.display({
          id: 'fields',
          header: t('column.fields'),
          cell: ({ row: { original } }) => <Fields entry={original} />,
        }),
      ]),
    [t, moment],
  )
  return (
    <PlaceFrame title={t('title')} subtitle={t('meaning')} nav={<OfficeNav />}>
      <Select
        className="mb-4 max-w-72"
        label={t('person')}
        value={person ?? ''}
        placeholder={t('everybody')}
        options={(people?.items ?? []).map(({ id, name }) => ({ value: id, label: name }))}
        onChange={({ target: { value } }) =>
          setParams(value === '' ? {} : { person: value }, { replace: true })
        }
      />
      <DataTable
        caption={t('title')}
        captionHidden
        rows={entries}
        columns={columns}
        rowId={({ id }) => String(id)}
        error={found.error}
        onRetry={() => void found.refetch()}
        paging={{
          hasMore: found.hasNextPage,
          loading: found.isFetchingNextPage,
          onMore: () => void found.fetchNextPage(),
        }}
        empty={<EmptyState title={t('empty')} hint={t('emptyHint')} />}
      />
    </PlaceFrame>
  )
}

function Fields({ entry }: { readonly entry: AuditEntry }) {
  const { t } = useTranslation('audit')
  return (
    <ul className="font-figure text-small">
      {changedFields(entry.before, entry.after).map(({ name, before, after }) => (
        <li key={name}>
          {name}: {before ?? t('nothing')} → {after ?? t('nothing')}
        </li>
      ))}
    </ul>
  )
}
