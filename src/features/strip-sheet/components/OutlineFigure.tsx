import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import { outlineFigure } from '#shared/drawing/outline-figure'
import type { StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Strip } from '#shared/strip/strip.schema'
import { useElementSize } from '@/features/drawing/canvas/useElementSize'
import { SvgFigure } from '@/features/drawing/figure/SvgFigure'
import { useFigureColors, useFigureLabels } from '@/features/drawing/figure/useFigureLook'
import { useUnits } from '@/features/people/useUnits'

interface Props {
  readonly layout: StripLayout
  readonly strip: Strip
  /** What the picture shows, for its accessible name. */
  readonly name: string
  /** One end enlarged; absent: the whole strip. */
  readonly side?: Side
  readonly lowEnd: Side | null
}

const WHOLE = { width: 720, height: 190 }
/** As wide as a phone's column. */
const NARROW = { width: 358, height: 170 }
const ONE_END = { width: 460, height: 320 }

/** The strip as it is cut: left side up, edge A below. The marking table beside it says the same. */
export function OutlineFigure({ layout, strip, name, side, lowEnd }: Props) {
  const { t } = useTranslation('strip-sheet')
  const { run } = useUnits()
  const { length } = useFigureLabels()
  const colors = useFigureColors(null)
  const { ref, size } = useElementSize()
  const whole = size && size.width < WHOLE.width ? NARROW : WHOLE
  const display = useMemo(() => {
    const end = (which: Side) => {
      if (lowEnd === null) return t(`end.${which}`)
      return `${t(`end.${which}`)} · ${t(lowEnd === which ? 'end.low' : 'end.high')}`
    }
    const labels = { length, run, end }
    return outlineFigure(layout, strip, {
      labels,
      ...(side === undefined ? whole : { ...ONE_END, side }),
    }).display
  }, [layout, strip, side, lowEnd, length, run, t, whole])
  return (
    <div ref={ref} className="min-w-0">
      <SvgFigure
        display={display}
        colors={colors}
        title={t(side === undefined ? 'figure.whole' : 'figure.end', { name })}
        className="h-auto max-w-full"
      />
    </div>
  )
}
