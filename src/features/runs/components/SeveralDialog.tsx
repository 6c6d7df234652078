import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Run } from '#shared/runs/runs.contract'
import { Dialog } from '@/components/Dialog'
import { Select } from '@/components/Select'
import { IconButton } from '@/components/IconButton'
import { Icon } from '@/components/Icon'
import { useUnits } from '@/features/people/useUnits'

interface Props {
  readonly run: Run
  readonly open: boolean
  readonly pending: boolean
  readonly onCancel: () => void
  readonly onConfirm: (count: number, length: number) => void
}

/** So many of a run at once, for a stack that was bent in one go: one event a piece all the same. */
export function SeveralDialog({ run, open, pending, onCancel, onConfirm }: Props) {
  const { t } = useTranslation('brake')
  const { run: print } = useUnits()
  const queued = run.pieces.filter(({ state }) => state === 'queued')
  const lengths = [...new Set(queued.map(({ length }) => length))]
  const [wantedLength, setWantedLength] = useState<number | null>(null)
  const length = wantedLength !== null && lengths.includes(wantedLength) ? wantedLength : lengths[0]
  const most = queued.filter((piece) => piece.length === length).length
  const [wanted, setWanted] = useState(1)
  const count = Math.max(1, Math.min(wanted, most))

  return (
    <Dialog
      open={open}
      title={t('several.title')}
      confirm={t('several.confirm', { count })}
      cancel={t('cancel')}
      pending={pending}
      confirmDisabled={most === 0 || length === undefined}
      onCancel={onCancel}
      onConfirm={() => length !== undefined && onConfirm(count, length)}
    >
      {lengths.length > 1 && (
        <Select
          label={t('several.length')}
          value={String(length)}
          options={lengths.map((each) => ({ value: String(each), label: print(each) }))}
          onChange={(event) => setWantedLength(Number(event.target.value))}
        />
      )}
      <div className="flex items-center justify-center gap-6">
        <IconButton
          label={t('several.less')}
          icon={<Icon name="minus" />}
          disabled={count <= 1}
          onClick={() => setWanted(count - 1)}
        />
        <output className="font-figure text-stand font-medium" aria-live="polite">
          {count}
        </output>
        <IconButton
          label={t('several.more')}
          icon={<Icon name="plus" />}
          disabled={count >= most}
          onClick={() => setWanted(count + 1)}
        />
      </div>
      <p className="text-center text-scribe">{t('several.left', { count: most })}</p>
    </Dialog>
  )
}
