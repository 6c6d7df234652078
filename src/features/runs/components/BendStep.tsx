import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { StepPicture } from '#shared/bend-plan/plan-pictures'
import type { PlanStep } from '#shared/bend-plan/plan.schema'
import { moveFigure } from '#shared/drawing/move-figure'
import { stepFigure } from '#shared/drawing/step-figure'
import type { Run } from '#shared/runs/runs.contract'
import { includedAngle, printAngle } from '#shared/units/angle'
import { useElementSize } from '@/features/drawing/canvas/useElementSize'
import { SvgFigure } from '@/features/drawing/figure/SvgFigure'
import { useFigureColors } from '@/features/drawing/figure/useFigureLook'
import { usePlanWords } from '@/features/drawing/usePlanWords'
import { useUnits } from '@/features/people/useUnits'
import { NextPiece } from './NextPiece'
import { StandFigure } from './StandFigure'

interface Props {
  readonly run: Run
  readonly step: PlanStep
  readonly picture: StepPicture
  /** From 1. */
  readonly number: number
}

/** One hit, to be read from two metres: the piece in the brake, gauge and angle, what to do first. */
export function BendStep({ run, step, picture, number }: Props) {
  const { t } = useTranslation('brake')
  const { t: plan } = useTranslation('plan')
  const words = usePlanWords()
  const { ref, size } = useElementSize()
  const colors = useFigureColors(run.stock.painted ? run.stock.colorHex : null)
  const tools = step.direction === 'up' ? run.brake.up : (run.brake.down ?? run.brake.up)
  const display = useMemo(
    () =>
      size && size.height > 0 && stepFigure(picture, { ...size, direction: step.direction, tools }),
    [picture, size, step.direction, tools],
  )
  const move = moveFigure(step.move, 72)
  const fold = words.fold(step.bend)

  return (
    <div className="flex min-h-0 flex-1 max-lg:flex-col max-lg:overflow-y-auto">
      <div className="relative min-h-64 min-w-0 flex-1 max-lg:min-h-80 max-lg:shrink-0">
        <div ref={ref} className="absolute inset-0 overflow-hidden">
          {display && (
            <SvgFigure display={display} colors={colors} title={t('step.picture', { fold })} />
          )}
        </div>
        <div className="absolute top-4 left-(--gutter) flex items-center gap-4 border-2 border-ochre bg-paper px-4 py-2">
          <SvgFigure display={move} colors={colors} title={plan(`move.${step.move}`)} />
          <div>
            <p className="text-lead font-bold">{plan(`move.${step.move}`)}</p>
            <p className="text-small text-scribe">
              {picture.paintedUp !== null &&
                `${plan(picture.paintedUp ? 'side.paintUp' : 'side.paintDown')} · `}
              {plan(`edgeAtBack.${picture.edgeAtBack}`)}
            </p>
          </div>
        </div>
      </div>
      <aside className="flex w-104 shrink-0 flex-col gap-1 overflow-y-auto border-l border-rule px-6 py-3 max-lg:w-full max-lg:border-t max-lg:border-l-0">
        <p className="text-scribe">
          {t('step.count', { number, total: run.plan.steps.length })} ·{' '}
          <b className="text-ink">{fold}</b>
        </p>
        <NextPiece run={run} />
        <GaugeFigure run={run} step={step} />
        <AngleFigure run={run} step={step} />
        <p className="mt-auto border-t border-rule pt-3 text-small text-scribe">
          {t('step.caution', { edge: picture.edgeAtFront })}
        </p>
      </aside>
    </div>
  )
}

function GaugeFigure({ run, step }: Pick<Props, 'run' | 'step'>) {
  const { t } = useTranslation('brake')
  const words = usePlanWords()
  const { size } = useUnits()
  const crease = run.strip.creases.find(({ fold }) => fold === step.bend)
  const figure = step.gaugeSetting ?? crease?.at
  return (
    <>
      <p className="text-scribe">
        {step.gaugeSetting === null ? t('step.markedLine') : words.gauge(step)}
      </p>
      {figure !== undefined && (
        <StandFigure text={size(figure, 32).replace(/"$/, '')} testId="step-gauge" />
      )}
    </>
  )
}

/** What the brake's own scale must show, and what comes out when the sheet has sprung back. */
function AngleFigure({ run, step }: Pick<Props, 'run' | 'step'>) {
  const { t } = useTranslation('brake')
  const { t: plan } = useTranslation('plan')
  const reads = run.brake.scale?.reads ?? 'bend'
  const byMachine = run.brake.scale?.overbend === 'machine'
  const said = { direction: plan(`direction.${step.direction}`), scale: t(`step.scale.${reads}`) }
  return (
    <>
      <p className="mt-2 text-scribe">{t(step.hits > 1 ? 'step.firstHit' : 'step.angle', said)}</p>
      <StandFigure text={printAngle(step.scaleAngle)} testId="step-angle" />
      <p className="text-scribe">
        {step.hits > 1
          ? t('step.thenFlatten')
          : t(byMachine ? 'step.machineAdds' : 'step.opensTo', {
              turn: printAngle(step.angle),
              included: printAngle(includedAngle(step.angle)),
            })}
      </p>
    </>
  )
}
