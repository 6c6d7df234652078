import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useNavigate } from 'react-router-dom'
import { hasErrors } from '#shared/profile/problem'
import { profileProblems } from '#shared/profile/problems'
import type { Profile } from '#shared/profile/profile.schema'
import { paths } from '@/app/paths'
import { Button } from '@/components/Button'
import { useMay } from '@/features/people/person-context'
import { SaveToShelfDialog } from '@/features/shelf/components/SaveToShelfDialog'

interface Props {
  /** Null while nothing is drawn. */
  readonly profile: Profile | null
  /** Whose shelf it is put on: the job's. */
  readonly companyId: string
  readonly suggestedName: string
}

/** Puts the drawing on the company's shelf, as far as some sheet could be bent to it. */
export function ShelfButton({ profile, companyId, suggestedName }: Props) {
  const { t } = useTranslation('shelf')
  const navigate = useNavigate()
  const [open, setOpen] = useState(false)
  const mayWrite = useMay('shelf.write')
  if (!mayWrite) return null
  const canBeMade = profile !== null && !hasErrors(profileProblems(profile, null))
  return (
    <>
      <Button
        variant="quiet"
        className="shrink-0 whitespace-nowrap"
        disabled={!canBeMade}
        onClick={() => setOpen(true)}
      >
        {t('save.open')}
      </Button>
      {open && profile && (
        <SaveToShelfDialog
          profile={profile}
          companyId={companyId}
          suggestedName={suggestedName}
          onSeen={({ id }) => void navigate(paths.roof.shelfProfile(id))}
          onClose={() => setOpen(false)}
        />
      )}
    </>
  )
}
