import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Bundle } from '#shared/bundles/bundles.contract'
import { Dialog } from '@/components/Dialog'
import { Notice } from '@/components/Notice'
import { TextArea } from '@/components/TextArea'
import { useScanWords } from '@/features/pieces/useScanWords'
import { useReturnBundle } from '../api/hand-off.mutations'
import { bundleMark } from '@/features/rack/bundle-words'

interface Props {
  readonly bundle: Bundle
  readonly onClose: () => void
  readonly onReturned: (bundle: Bundle) => void
}

/** Takes a bundle that had left back onto the rack; needs a reason, for whoever asks later. */
export function ReturnDialog({ bundle, onClose, onReturned }: Props) {
  const { t } = useTranslation('hand-off')
  const words = useScanWords()
  const { mutate, error, isPending } = useReturnBundle()
  const [reason, setReason] = useState('')
  const refusal = error && words.ofError(error)
  return (
    <Dialog
      open
      title={t('return.title', { mark: bundleMark(bundle) })}
      confirm={t('return.confirm')}
      confirmDisabled={reason.trim() === ''}
      pending={isPending}
      cancel={t('return.cancel')}
      onConfirm={() =>
        mutate({ bundleId: bundle.id, reason }, { onSuccess: () => onReturned(bundle) })
      }
      onCancel={onClose}
    >
      <p>{t('return.meaning', { place: bundle.rackPlace })}</p>
      <TextArea
        label={t('return.reason')}
        value={reason}
        maxLength={400}
        onChange={(event) => setReason(event.target.value)}
      />
      {refusal && (
        <Notice kind="error">
          <strong className="block">{refusal.title}</strong>
          {refusal.detail}
        </Notice>
      )}
    </Dialog>
  )
}
