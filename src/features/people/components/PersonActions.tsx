import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { PersonRow } from '#shared/people/people.contract'
import { Button } from '@/components/Button'
import { Dialog } from '@/components/Dialog'
import { ErrorNotice } from '@/components/ErrorNotice'
import {
  useDeactivate,
  useInviteAgain,
  useReactivate,
} from '@/features/people/api/accounts.mutations'
import { useMay } from '@/features/people/person-context'

/** What can be done with an account; closing it asks back first. */
export function PersonActions({ person }: { readonly person: PersonRow }) {
  const { t } = useTranslation('people')
  const manages = useMay('people.manage')
  const again = useInviteAgain()
  const close = useDeactivate()
  const open = useReactivate()
  const [asking, setAsking] = useState(false)
  const named = (text: string) => `${text}: ${person.name}`

  return (
    <div className="flex flex-wrap items-center gap-2">
      {person.active && person.invited && (
        <Button
          aria-label={named(t('action.inviteAgain'))}
          pending={again.isPending}
          disabled={again.isSuccess}
          onClick={() => again.mutate(person.id)}
        >
          {t(again.isSuccess ? 'action.invitedAgain' : 'action.inviteAgain')}
        </Button>
      )}
      {manages && person.active && (
        <Button aria-label={named(t('action.close'))} onClick={() => setAsking(true)}>
          {t('action.close')}
        </Button>
      )}
      {manages && !person.active && (
        <Button
          aria-label={named(t('action.open'))}
          pending={open.isPending}
          onClick={() => open.mutate(person.id)}
        >
          {t('action.open')}
        </Button>
      )}
      <ErrorNotice error={again.error ?? open.error} />
      <Dialog
        open={asking}
        title={t('close.title', { name: person.name })}
        confirm={t('close.confirm')}
        confirmVariant="danger"
        pending={close.isPending}
        cancel={t('close.cancel')}
        onConfirm={() => close.mutate(person.id, { onSuccess: () => setAsking(false) })}
        onCancel={() => setAsking(false)}
      >
        <p>{t('close.meaning')}</p>
        <ErrorNotice error={close.error} />
      </Dialog>
    </div>
  )
}
