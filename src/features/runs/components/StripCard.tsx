import { useTranslation } from 'react-i18next'
import type { Run } from '#shared/runs/runs.contract'
import { useElementSize } from '@/features/drawing/canvas/useElementSize'
import { ProfilePair } from '@/features/drawing/figure/ProfilePair'
import { ChecksMade } from '@/features/drawing/panels/ChecksMade'
import { PrintLabels } from '@/features/labels/components/PrintLabels'
import { OverrideNote } from '@/features/orders/components/OverrideNote'
import { useUnits } from '@/features/people/useUnits'
import { useFormats } from '@/lib/format/useFormats'
import { RunLines } from './RunLines'
import { StandFigure } from './StandFigure'

/** The first card of a run: what to cut, where the creases lie, what the finished piece looks like. */
export function StripCard({ run }: { readonly run: Run }) {
  const { t } = useTranslation('brake')
  const { size, weight } = useUnits()
  const { duration } = useFormats()
  const { ref, size: room } = useElementSize()
  const heaviest = Math.max(...run.pieces.map((piece) => piece.weight))

  return (
    <div className="flex min-h-0 flex-1 max-lg:flex-col max-lg:overflow-y-auto">
      <div
        ref={ref}
        className="flex min-h-80 min-w-0 flex-1 items-center max-lg:shrink-0 justify-center overflow-hidden"
      >
        {room && room.height > 0 && (
          <ProfilePair
            profile={run.profile}
            stock={run.stock}
            strip={run.strip}
            name={run.name}
            width={room.width}
            height={room.height}
            stripMode="layout"
          />
        )}
      </div>
      <aside className="flex w-104 shrink-0 flex-col gap-2 overflow-y-auto border-l border-rule px-6 py-4 max-lg:w-full max-lg:border-t max-lg:border-l-0">
        <p className="text-scribe">{t('strip.width')}</p>
        <StandFigure text={size(run.strip.stripWidth, 32).replace(/"$/, '')} testId="strip-width" />
        <p className="text-scribe">{t('strip.lengths')}</p>
        <RunLines run={run} />
        <PrintLabels of={{ kind: 'run', runId: run.id }} />
        <p className="text-small">
          {t('strip.brake', { brake: run.brakeName })}
          {run.plan.seconds !== null && ` ${t('strip.time', { time: duration(run.plan.seconds) })}`}
        </p>
        <ChecksMade plan={run.plan} />
        {run.override && (
          <>
            <OverrideNote override={run.override} />
            <p className="text-small">{t('override:noSteps')}</p>
          </>
        )}
        <p className="mt-auto border-t border-rule pt-3 text-small text-scribe">
          {t('strip.caution', { weight: weight(heaviest) })}
        </p>
      </aside>
    </div>
  )
}
