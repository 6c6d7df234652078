import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import type { OrderLine } from '#shared/orders/order.schema'
import type { OverrideInput } from '#shared/orders/override.schema'
import { Select } from '@/components/Select'
import { TextField } from '@/components/TextField'
import { brakesQuery } from '@/features/brakes/api/brakes.queries'

interface Props {
  /** The lines that no brake bends under the checks. */
  readonly lines: readonly OrderLine[]
  readonly overrides: readonly OverrideInput[]
  readonly onChange: (overrides: readonly OverrideInput[]) => void
}

/**
 * The shop may know better than the checks: on which brake a line is made all the same, and why. Name
 * and reason stay with the order and on the bend card.
 */
export function OverrideForm({ lines, overrides, onChange }: Props) {
  const { t } = useTranslation('override')
  const brakes = useQuery(brakesQuery())
  const of = (lineId: string): OverrideInput =>
    overrides.find((each) => each.lineId === lineId) ?? { lineId, brakeId: '', reason: '' }
  const set = (next: OverrideInput) =>
    onChange([...overrides.filter(({ lineId }) => lineId !== next.lineId), next])

  return (
    <details className="border border-rule bg-sheet px-4 py-2">
      <summary className="min-h-target cursor-pointer py-2 font-semibold">{t('title')}</summary>
      <p className="max-w-prose pb-3 text-scribe">{t('caution')}</p>
      <div className="flex flex-col gap-4 pb-3">
        {lines.map((line) => {
          const given = of(line.id)
          return (
            <fieldset key={line.id} className="flex flex-wrap gap-4">
              <legend className="mb-1 font-semibold">
                {line.mark} {line.name}
              </legend>
              <Select
                label={t('brake')}
                className="w-60"
                value={given.brakeId}
                placeholder={t('choose')}
                options={(brakes.data?.items ?? []).map(({ id, brake }) => ({
                  value: id,
                  label: brake.name,
                }))}
                onChange={(event) => set({ ...given, brakeId: event.target.value })}
              />
              <TextField
                label={t('reason')}
                className="min-w-72 flex-1"
                value={given.reason}
                maxLength={400}
                onChange={(event) => set({ ...given, reason: event.target.value })}
              />
            </fieldset>
          )
        })}
      </div>
    </details>
  )
}
