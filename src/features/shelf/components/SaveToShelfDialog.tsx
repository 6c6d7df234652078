import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Profile } from '#shared/profile/profile.schema'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'
import { Dialog } from '@/components/Dialog'
import { ErrorNotice } from '@/components/ErrorNotice'
import { TextField } from '@/components/TextField'
import { useCreateShelfProfile, useUpdateShelfProfile } from '../api/shelf.mutations'
import { shelfQuery } from '../api/shelf.queries'
import { findOfName, isSameDrawing } from '../same-name'

interface Props {
  readonly profile: Profile
  /** Whose shelf it is put on. */
  readonly companyId: string
  readonly suggestedName: string
  /** What was saved, to be looked at. */
  readonly onSeen: (saved: ShelfProfile) => void
  readonly onClose: () => void
}

/**
 * Puts a drawing on the company's shelf. Under a name that is there it becomes a new version of that
 * profile, else a profile of its own.
 */
export function SaveToShelfDialog({ profile, companyId, suggestedName, onSeen, onClose }: Props) {
  const { t } = useTranslation('shelf')
  const shelf = useQuery(shelfQuery())
  const [name, setName] = useState(suggestedName)
  const [saved, setSaved] = useState<ShelfProfile | null>(null)
  const there = findOfName(shelf.data?.items ?? [], companyId, name)
  const isThere = there !== undefined && isSameDrawing(there.profile, profile)
  const create = useCreateShelfProfile()
  const update = useUpdateShelfProfile(there?.id ?? '')

  function save() {
    const done = { onSuccess: setSaved }
    if (there) update.mutate({ version: there.version, name: there.name, profile }, done)
    else create.mutate({ name: name.trim(), profile, companyId }, done)
  }

  if (saved) {
    return (
      <Dialog
        open
        title={t('save.done')}
        confirm={t('save.see')}
        cancel={t('save.back')}
        onConfirm={() => onSeen(saved)}
        onCancel={onClose}
      >
        <p role="status">{t('save.doneAs', { name: saved.name, version: saved.version })}</p>
      </Dialog>
    )
  }
  return (
    <Dialog
      open
      title={t('save.title')}
      confirm={there ? t('save.asVersion', { version: there.version + 1 }) : t('save.asNew')}
      confirmDisabled={name.trim() === '' || isThere || !shelf.data}
      pending={create.isPending || update.isPending}
      cancel={t('save.back')}
      onConfirm={save}
      onCancel={onClose}
    >
      <TextField
        label={t('save.name')}
        value={name}
        maxLength={80}
        autoComplete="off"
        hint={
          isThere
            ? t('save.isThere', { name: there.name, version: there.version })
            : there
              ? t('save.versionMeaning', { name: there.name, version: there.version })
              : t('save.newMeaning')
        }
        onChange={(event) => setName(event.target.value)}
      />
      <ErrorNotice error={create.error ?? update.error ?? shelf.error} />
    </Dialog>
  )
}
