import { useTranslation } from 'react-i18next'
import type { MailState } from '#shared/mail/mail.contract'
import { Icon } from '@/components/Icon'

/** Never by color alone: a failed mail has a sign, and every state its word. */
export function MailStateWord({ state }: { readonly state: MailState }) {
  const { t } = useTranslation('mail')
  return (
    <span
      className={
        state === 'failed' ? 'inline-flex items-center gap-1.5 font-semibold text-chalk' : undefined
      }
    >
      {state === 'failed' && <Icon name="warn" className="size-4" />}
      {t(`state.${state}`)}
    </span>
  )
}
