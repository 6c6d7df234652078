import { useTranslation } from 'react-i18next'
import { TextArea } from '@/components/TextArea'
import { TextField } from '@/components/TextField'
import type { DraftFields, OrderDraft } from '../draft/order-draft'
import { faultAt, type Fault } from '../form/order-faults'
import { useFaultWords } from '../form/useFaultWords'

interface Props {
  readonly draft: OrderDraft
  /** The first day that can be chosen, `YYYY-MM-DD`. */
  readonly today: string
  readonly faults: readonly Fault[]
  readonly disabled: boolean
  /** The shop's open question, when the order is amended because of it. */
  readonly question?: string
  readonly onChange: (patch: DraftFields) => void
}

/** What belongs to the order as a whole. */
export function OrderFields({ draft, today, faults, disabled, question, onChange }: Props) {
  const { t } = useTranslation('orders')
  const words = useFaultWords()
  const { amends } = draft
  return (
    <div className="grid items-start gap-4 lg:grid-cols-2">
      {amends && question !== undefined && (
        <TextArea
          label={t('form.answer')}
          hint={t('form.asked', { question })}
          className="lg:col-span-2"
          value={amends.answer}
          maxLength={1000}
          disabled={disabled}
          error={words(faultAt(faults, 'answer'))}
          onChange={(event) => onChange({ amends: { ...amends, answer: event.target.value } })}
        />
      )}
      <TextField
        label={t('form.neededBy')}
        type="date"
        min={today}
        value={draft.neededBy}
        disabled={disabled}
        error={words(faultAt(faults, 'neededBy'))}
        onChange={(event) => onChange({ neededBy: event.target.value })}
      />
      <TextField
        label={t('form.poNumber')}
        hint={t('form.poHint')}
        value={draft.poNumber}
        maxLength={40}
        autoComplete="off"
        disabled={disabled}
        error={words(faultAt(faults, 'poNumber'))}
        onChange={(event) => onChange({ poNumber: event.target.value })}
      />
      <TextArea
        label={t('form.notes')}
        className="lg:col-span-2"
        value={draft.notes}
        maxLength={1000}
        disabled={disabled}
        error={words(faultAt(faults, 'notes'))}
        onChange={(event) => onChange({ notes: event.target.value })}
      />
    </div>
  )
}
