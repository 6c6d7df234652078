import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import { useParams } from 'react-router-dom'
import type { Mail } from '#shared/mail/mail.contract'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { ErrorState } from '@/components/ErrorState'
import { LoadingState } from '@/components/LoadingState'
import { Notice } from '@/components/Notice'
import { useSendMailAgain } from '@/features/mail/api/mails.mutations'
import { mailQuery } from '@/features/mail/api/mails.queries'
import { MailBody } from '@/features/mail/components/MailBody'
import { MailStateWord } from '@/features/mail/components/MailStateWord'
import { useFormats } from '@/lib/format/useFormats'
import { PlaceFrame } from '@/pages/shell/PlaceFrame'
import { OfficeNav } from './OfficeNav'

/** One mail: how far it came, and what it says. */
export function MailPage() {
  const { t } = useTranslation('mail')
  const { mailId = '' } = useParams()
  const { data: mail, error, refetch } = useQuery(mailQuery(mailId))
  return (
    <PlaceFrame
      title={mail?.subject ?? t('title')}
      subtitle={mail && t('toWhom', { name: mail.to.name, address: mail.to.address })}
      nav={<OfficeNav />}
      back={{ to: paths.office.mails(), label: t('title') }}
    >
      {!mail &&
        (error ? <ErrorState error={error} onRetry={() => void refetch()} /> : <LoadingState />)}
      {mail && (
        <div className="flex max-w-4xl flex-col gap-6">
          <Sending mail={mail} />
          <MailBody mail={mail} />
        </div>
      )}
    </PlaceFrame>
  )
}

function Sending({ mail }: { readonly mail: Mail }) {
  const { t } = useTranslation('mail')
  const { moment } = useFormats()
  const again = useSendMailAgain()
  return (
    <section aria-label={t('column.state')} className="flex flex-col items-start gap-3">
      <p>
        <MailStateWord state={mail.state} />
        {' · '}
        {mail.sentAt === null
          ? t('written', { at: moment(mail.createdAt) })
          : t('sentAt', { at: moment(mail.sentAt) })}
        {' · '}
        {t('tries', { count: mail.attempts })}
      </p>
      {mail.lastError !== null && (
        <Notice kind={mail.state === 'failed' ? 'error' : 'warn'}>
          <strong className="block">{t(`trouble.${mail.state}`)}</strong>
          <span className="font-figure text-small">{mail.lastError}</span>
        </Notice>
      )}
      {mail.state === 'failed' && (
        <Button variant="primary" pending={again.isPending} onClick={() => again.mutate(mail.id)}>
          {t('sendAgain')}
        </Button>
      )}
      <ErrorNotice error={again.error} />
    </section>
  )
}
