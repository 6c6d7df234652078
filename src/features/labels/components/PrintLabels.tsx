import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { labelPaperSchema, type LabelPaper, type LabelsOf } from '#shared/labels/labels.contract'
import { Button } from '@/components/Button'
import { buttonStyle } from '@/components/button-style'
import { ErrorNotice } from '@/components/ErrorNotice'
import { Select } from '@/components/Select'
import { useMay } from '@/features/people/person-context'
import { recall, remember } from '@/lib/device/remembered'
import { labelsHref, usePrintLabels } from '../api/labels.mutations'

const PAPERS: readonly LabelPaper[] = ['roll4x2', 'letter', 'a4']

/** The paper in the printer beside this device; a roll until somebody says otherwise. */
const devicePaper = (): LabelPaper =>
  labelPaperSchema.catch('roll4x2').parse(recall('label-paper') ?? undefined)

/**
 * Labels of a piece, a run or an order: which paper, one press, and the PDF in a tab of its own. What
 * was printed before is told, so that no piece goes out with two labels unnoticed.
 */
export function PrintLabels({ of }: { readonly of: LabelsOf }) {
  const { t } = useTranslation('labels')
  const may = useMay('labels.print')
  const print = usePrintLabels()
  const [paper, setPaper] = useState(devicePaper)
  if (!may) return null
  const made = print.data

  function choose(value: string) {
    const chosen = labelPaperSchema.parse(value)
    remember('label-paper', chosen)
    setPaper(chosen)
    print.reset()
  }

  return (
    <div className="flex flex-col gap-2">
      <div className="flex flex-wrap items-end gap-3">
        <Select
          label={t('paper')}
          value={paper}
          options={PAPERS.map((value) => ({ value, label: t(`papers.${value}`) }))}
          onChange={(event) => choose(event.target.value)}
        />
        {made ? (
          <a
            href={labelsHref(made)}
            target="_blank"
            rel="noreferrer"
            className={buttonStyle('secondary')}
          >
            {t('open', { count: made.codes.length })}
          </a>
        ) : (
          <Button pending={print.isPending} onClick={() => print.mutate({ of, paper })}>
            {t(`print.${of.kind}`)}
          </Button>
        )}
      </div>
      {made && made.reprinted.length > 0 && (
        <p role="status" className="text-small text-ochre">
          {t('reprinted', { count: made.reprinted.length })}
        </p>
      )}
      <ErrorNotice error={print.error} />
    </div>
  )
}
