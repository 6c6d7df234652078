import { keepPreviousData, useInfiniteQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import { useSearchParams } from 'react-router-dom'
import { mailStateSchema, type MailSummary } from '#shared/mail/mail.contract'
import { paths } from '@/app/paths'
import { EmptyState } from '@/components/EmptyState'
import { Notice } from '@/components/Notice'
import { Select } from '@/components/Select'
import { DataTable } from '@/components/table/DataTable'
import { columnsOf } from '@/components/table/table-features'
import { mailsQuery } from '@/features/mail/api/mails.queries'
import { MailStateWord } from '@/features/mail/components/MailStateWord'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OfficeNav } from './OfficeNav'

const column = columnsOf<MailSummary>()

/** What was mailed to whom, newest first, and what could not be. */
export function MailsPage() {
  const { t } = useTranslation('mail')
  const { moment } = useFormats()
  const [params, setParams] = useSearchParams()
  const state = mailStateSchema.safeParse(params.get('state')).data
  const found = useInfiniteQuery({ ...mailsQuery(state), placeholderData: keepPreviousData })
  const mails = useMemo(() => found.data?.pages.flatMap(({ items }) => items), [found.data])
  const columns = useMemo(
    () =>
      column.columns([
        column.accessor('subject', { header: t('column.subject') }),
        column.accessor(({ to }) => to.name, { id: 'to', header: t('column.to') }),
        column.accessor(({ template }) => t(`template.${template}`), {
          id: 'template',
          header: t('column.template'),
        }),
        column.accessor(({ createdAt }) => moment(createdAt), {
          id: 'created',
          header: t('column.created'),
        }),
        column.display({
          id: 'state',
          header: t('column.state'),
          cell: ({ row: { original } }) => <MailStateWord state={original.state} />,
        }),
        column.accessor('attempts', {
          header: t('column.attempts'),
          meta: { figure: true, align: 'end' },
        }),
        column.accessor(({ lastError }) => lastError ?? '', {
          id: 'error',
          header: t('column.error'),
        }),
      ]),
    [t, moment],
  )
  return (
    <PlaceFrame title={t('title')} subtitle={t('meaning')} nav={<OfficeNav />}>
      {found.data?.pages[0]?.leaves === false && (
        <div className="mb-4">
          <Notice kind="info">{t('stays')}</Notice>
        </div>
      )}
      <Select
        className="mb-4 max-w-72"
        label={t('show')}
        value={state ?? ''}
        options={[
          { value: '', label: t('all') },
          ...mailStateSchema.options.map((each) => ({ value: each, label: t(`state.${each}`) })),
        ]}
        onChange={({ target: { value } }) =>
          setParams(value === '' ? {} : { state: value }, { replace: true })
        }
      />
      <DataTable
        caption={t('title')}
        captionHidden
        rows={mails}
        columns={columns}
        rowId={({ id }) => id}
        rowLink={({ id }) => paths.office.mail(id)}
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
