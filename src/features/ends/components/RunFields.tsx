import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import { printSlope } from '#shared/units/print-slope'
import { Choice } from '@/components/Choice'
import type { Run } from '../model/corner-presets'

interface Props {
  readonly run: Run
  readonly disabled: boolean
  readonly onChange: (lowEnd: Side | null) => void
}

/** How the piece runs on the roof: level, or along a slope with one end low. */
export function RunFields({ run, disabled, onChange }: Props) {
  const { t } = useTranslation('ends')
  return (
    <Choice
      legend={t('run.legend')}
      value={run.lowEnd ?? 'level'}
      disabled={disabled}
      options={(['level', 'left', 'right'] as const).map((value) => ({
        value,
        label: t(`run.${value}`, { slope: printSlope(run.slope) }),
      }))}
      onChange={(value) => onChange(value === 'level' ? null : value)}
    />
  )
}
