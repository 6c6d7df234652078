import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { Choice } from '@/components/Choice'
import { DimensionField } from '@/components/keypad/DimensionField'
import { TextField } from '@/components/TextField'
import { parsePitch } from '@/features/jobs/pitch'
import { useUnits } from '@/features/people/useUnits'
import type { DraftRoofLine } from '../model/draft-roof-line'
import type { LongestPiece } from '../model/longest-piece'
import type { OutsideExtras } from '../model/use-pieces'

interface Props {
  readonly draft: DraftRoofLine
  readonly longest: LongestPiece
  readonly tooLong: boolean
  readonly extras: OutsideExtras
  readonly disabled: boolean
  readonly onChange: (patch: Partial<DraftRoofLine>) => void
}

/** What a line on the roof has to be told: how long it is, and how it is to be split. */
export function RoofLineFields({ draft, longest, tooLong, extras, disabled, onChange }: Props) {
  const { t } = useTranslation('roof-line')
  const { units, run, size } = useUnits()
  const { brake } = longest
  const point = extras.first.point + extras.last.point
  const bound = (value: number | null, most: number) =>
    value !== null && value > most ? t('fields.upTo', { most: size(most) }) : undefined
  return (
    <div className="flex flex-col gap-4">
      <Choice
        legend={t('fields.by')}
        value={draft.by}
        disabled={disabled}
        options={[
          { value: 'length', label: t('fields.byLength') },
          { value: 'planRun', label: t('fields.byRun') },
        ]}
        onChange={(by) => onChange({ by })}
      />
      {draft.by === 'length' ? (
        <DimensionField
          label={t('fields.length')}
          hint={t('fields.lengthHint')}
          purpose="run"
          units={units}
          value={draft.length}
          disabled={disabled}
          error={bound(draft.length, 12_000)}
          onChange={(length) => onChange({ length })}
        />
      ) : (
        <div className="grid grid-cols-[1fr_7rem] items-start gap-4">
          <DimensionField
            label={t('fields.planRun')}
            hint={t('fields.planRunHint')}
            purpose="run"
            units={units}
            value={draft.planRun}
            disabled={disabled}
            error={bound(draft.planRun, 12_000)}
            onChange={(planRun) => onChange({ planRun })}
          />
          <RiseField
            rise={draft.rise}
            disabled={disabled}
            onChange={(rise) => onChange({ rise })}
          />
        </div>
      )}
      <DimensionField
        label={t('fields.pieceLength')}
        hint={
          brake
            ? t('fields.longest', {
                stock: run(longest.stock),
                brake: run(brake.length),
                name: brake.name,
              })
            : t('fields.longestStock', { stock: run(longest.stock) })
        }
        purpose="run"
        units={units}
        value={draft.pieceLength}
        disabled={disabled}
        error={tooLong ? t('fields.tooLong', { most: run(longest.length) }) : undefined}
        onChange={(pieceLength) => onChange({ pieceLength })}
      />
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <DimensionField
          label={t('fields.lap')}
          units={units}
          value={draft.lap}
          disabled={disabled}
          error={bound(draft.lap, 24)}
          onChange={(lap) => onChange({ lap })}
        />
        <DimensionField
          label={t('fields.minimum')}
          units={units}
          value={draft.minimum}
          disabled={disabled}
          error={bound(draft.minimum, 240)}
          onChange={(minimum) => onChange({ minimum })}
        />
      </div>
      <Choice
        legend={t('fields.mode')}
        value={draft.mode}
        disabled={disabled}
        options={[
          { value: 'full', label: t('fields.full') },
          { value: 'equal', label: t('fields.equal') },
        ]}
        onChange={(mode) => onChange({ mode })}
      />
      <Choice
        legend={t('fields.laps')}
        value={draft.dressLaps ? 'dressed' : 'square'}
        disabled={disabled}
        options={[
          { value: 'square', label: t('fields.lapsSquare') },
          { value: 'dressed', label: t('fields.lapsDressed') },
        ]}
        onChange={(laps) => onChange({ dressLaps: laps === 'dressed' })}
      />
      {point > 0 && (
        <label className="flex min-h-target items-center gap-2.5">
          <input
            type="checkbox"
            className="size-5 shrink-0 accent-dye"
            disabled={disabled}
            checked={draft.toTips}
            onChange={(event) => onChange({ toTips: event.target.checked })}
          />
          {t('fields.toTips')}
        </label>
      )}
    </div>
  )
}

interface RiseProps {
  readonly rise: number | null
  readonly disabled: boolean
  readonly onChange: (rise: number | null) => void
}

/** The rise in 12, the job's unless another is typed. */
function RiseField({ rise, disabled, onChange }: RiseProps) {
  const { t } = useTranslation('jobs')
  const [typed, setTyped] = useState<string | null>(null)
  const text = typed ?? (rise === null ? '' : String(rise))
  const pitch = parsePitch(text)
  return (
    <TextField
      label={t('pitch')}
      value={text}
      inputMode="decimal"
      autoComplete="off"
      disabled={disabled}
      error={pitch.ok ? undefined : t(`pitchRefused.${pitch.refusal}`)}
      onChange={(event) => {
        setTyped(event.target.value)
        const next = parsePitch(event.target.value)
        onChange(next.ok ? next.rise : null)
      }}
    />
  )
}
