import { useTranslation } from 'react-i18next'
import type { Mail } from '#shared/mail/mail.contract'
import { Notice } from '@/components/Notice'
import { attachmentHref } from '@/features/mail/api/mails.queries'
import { useFormats } from '@/lib/format/useFormats'

/** A mail as it is read: HTML in a frame that runs nothing and reaches nothing, and its text. */
export function MailBody({ mail }: { readonly mail: Mail }) {
  const { t } = useTranslation('mail')
  const { count } = useFormats()
  return (
    <div className="flex flex-col gap-6">
      {mail.secretHidden && <Notice kind="info">{t('secretHidden')}</Notice>}
      {mail.attachments.length > 0 && (
        <section aria-labelledby="attachments">
          <h2 id="attachments" className="mb-2 text-lead font-bold">
            {t('attachments')}
          </h2>
          <ul className="border-t border-rule">
            {mail.attachments.map(({ position, name, size }) => (
              <li
                key={position}
                className="flex min-h-target items-center gap-4 border-b border-rule"
              >
                <a href={attachmentHref(mail.id, position)} target="_blank" rel="noreferrer">
                  {name}
                </a>
                <span className="font-figure text-small text-scribe">
                  {t('kilobytes', { size: count(Math.ceil(size / 1024)) })}
                </span>
              </li>
            ))}
          </ul>
        </section>
      )}
      <section aria-labelledby="as-html">
        <h2 id="as-html" className="mb-2 text-lead font-bold">
          {t('asHtml')}
        </h2>
        <iframe
          title={mail.subject}
          sandbox=""
          srcDoc={mail.html}
          className="h-[36rem] w-full border border-rule"
        />
      </section>
      <section aria-labelledby="as-text">
        <h2 id="as-text" className="mb-2 text-lead font-bold">
          {t('asText')}
        </h2>
        <pre className="border border-rule bg-sheet p-4 font-figure text-small whitespace-pre-wrap">
          {mail.text}
        </pre>
      </section>
    </div>
  )
}
