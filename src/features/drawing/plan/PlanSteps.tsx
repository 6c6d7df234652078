import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { Brake } from '#shared/bend-plan/brake.schema'
import { stepPictures } from '#shared/bend-plan/plan-pictures'
import type { Plan } from '#shared/bend-plan/plan.schema'
import { stepFigure } from '#shared/drawing/step-figure'
import type { ColorSide } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import { SvgFigure } from '../figure/SvgFigure'
import { useFigureColors } from '../figure/useFigureLook'
import { usePlanWords } from '../usePlanWords'

interface Props {
  readonly plan: Plan
  readonly brake: Brake
  readonly sheet: Sheet
  readonly colorSide: ColorSide
  /** Null draws bare metal. */
  readonly paintHex: string | null
  readonly pieceLength: number
}

const THUMB = { width: 150, height: 104 }

/** The hits of a plan in their order, a small picture each, with what is done before it. */
export function PlanSteps({ plan, brake, sheet, colorSide, paintHex, pieceLength }: Props) {
  const { t } = useTranslation('plan')
  const words = usePlanWords()
  const colors = useFigureColors(paintHex)
  const figures = useMemo(() => {
    const request = { section: plan.section, sheet, brake, pieceLength, paintedSide: colorSide }
    return stepPictures(plan, request).map((picture, index) => {
      const direction = plan.steps[index]?.direction ?? 'up'
      const tools = direction === 'up' ? brake.up : (brake.down ?? brake.up)
      return stepFigure(picture, { ...THUMB, direction, tools, textSize: 9 })
    })
  }, [plan, brake, sheet, colorSide, pieceLength])

  return (
    <ol className="flex gap-3 overflow-x-auto pb-1">
      {plan.steps.map((step, index) => {
        const figure = figures[index]
        return (
          <li key={index} className="w-38 shrink-0">
            {figure && (
              <SvgFigure
                display={figure}
                colors={colors}
                title={`${index + 1}. ${words.fold(step.bend)}, ${t(`direction.${step.direction}`)}`}
                className="border border-rule bg-paper"
              />
            )}
            <p className="text-small">
              <b>{index + 1}.</b> {words.fold(step.bend)}
            </p>
            <p className="text-small text-scribe">{t(`move.${step.move}`)}</p>
          </li>
        )
      })}
    </ol>
  )
}
