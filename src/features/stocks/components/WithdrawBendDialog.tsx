import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { TestBendRecord } from '#shared/stock/stock.contract'
import { Dialog } from '@/components/Dialog'
import { ErrorNotice } from '@/components/ErrorNotice'
import { TextField } from '@/components/TextField'
import { useWithdrawTestBend } from '../api/test-bends.mutations'

interface Props {
  readonly stockId: string
  readonly bend: TestBendRecord
  readonly onClose: () => void
}

/** A bend that was measured wrong does not count any more; it stays in the list with the reason. */
export function WithdrawBendDialog({ stockId, bend, onClose }: Props) {
  const { t } = useTranslation('stocks')
  const { mutate, error, isPending } = useWithdrawTestBend(stockId)
  const [reason, setReason] = useState('')
  return (
    <Dialog
      open
      title={t('testBend.withdrawTitle')}
      confirm={t('testBend.withdrawConfirm')}
      confirmVariant="danger"
      confirmDisabled={reason.trim() === ''}
      pending={isPending}
      cancel={t('testBend.withdrawCancel')}
      onConfirm={() => mutate({ bendId: bend.id, reason }, { onSuccess: onClose })}
      onCancel={onClose}
    >
      <p>{t('testBend.withdrawMeaning')}</p>
      <TextField
        label={t('testBend.withdrawReason')}
        value={reason}
        maxLength={200}
        autoComplete="off"
        onChange={(event) => setReason(event.target.value)}
      />
      <ErrorNotice error={error} />
    </Dialog>
  )
}
