import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { pieceMark } from '#shared/pieces/piece-mark'
import type { Run } from '#shared/runs/runs.contract'
import { Dialog } from '@/components/Dialog'
import { Select } from '@/components/Select'
import { TextField } from '@/components/TextField'

interface Props {
  readonly run: Run
  readonly open: boolean
  readonly pending: boolean
  readonly onCancel: () => void
  readonly onConfirm: (code: string, reason: string) => void
}

/** A spoiled piece with its reason; its remake is queued at once. */
export function TroubleDialog({ run, open, pending, onCancel, onConfirm }: Props) {
  const { t } = useTranslation('brake')
  const { t: piece } = useTranslation('pieces')
  const inHand = run.pieces.filter(({ state }) => state === 'queued' || state === 'bent')
  const [wanted, setWanted] = useState('')
  const code = inHand.some((each) => each.code === wanted) ? wanted : (inHand[0]?.code ?? '')
  const [reason, setReason] = useState('')

  return (
    <Dialog
      open={open}
      title={t('trouble.title')}
      confirm={t('trouble.confirm')}
      confirmVariant="danger"
      confirmDisabled={code === '' || reason.trim() === ''}
      cancel={t('cancel')}
      pending={pending}
      onCancel={onCancel}
      onConfirm={() => onConfirm(code, reason.trim())}
    >
      <Select
        label={t('trouble.piece')}
        value={code}
        options={inHand.map((each) => ({
          value: each.code,
          label: `${pieceMark(each)} · ${each.code} · ${piece(`state.${each.state}`)}`,
        }))}
        onChange={(event) => setWanted(event.target.value)}
      />
      <TextField
        label={t('trouble.reason')}
        hint={t('trouble.hint')}
        value={reason}
        maxLength={400}
        onChange={(event) => setReason(event.target.value)}
      />
    </Dialog>
  )
}
