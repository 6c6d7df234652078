import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { ErrorNotice } from '@/components/ErrorNotice'
import { Notice } from '@/components/Notice'
import { useSignOut, useSignOutEverywhere } from '@/features/people/api/people.mutations'

/** Signing out here, or on every device at once, which asks back first. */
export function SessionsSection() {
  const { t } = useTranslation('account')
  const here = useSignOut()
  const everywhere = useSignOutEverywhere()
  const [asking, setAsking] = useState(false)
  const error = here.error ?? everywhere.error

  return (
    <section className="flex flex-col gap-3 border-t border-rule pt-6">
      <h2 className="font-semibold">{t('sessions')}</h2>
      {asking ? (
        <Notice kind="warn">
          <p className="mb-3">{t('everywhereAsk')}</p>
          <div className="flex flex-wrap gap-3">
            <Button
              variant="danger"
              pending={everywhere.isPending}
              onClick={() => everywhere.mutate()}
            >
              {t('everywhereYes')}
            </Button>
            <Button onClick={() => setAsking(false)}>{t('everywhereNo')}</Button>
          </div>
        </Notice>
      ) : (
        <div className="flex flex-wrap gap-3">
          <Button pending={here.isPending} onClick={() => here.mutate()}>
            {t('signOut')}
          </Button>
          <Button onClick={() => setAsking(true)}>{t('everywhere')}</Button>
        </div>
      )}
      <ErrorNotice error={error} />
    </section>
  )
}
