import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import { outlineFigure } from '#shared/drawing/outline-figure'
import type { StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import { SvgFigure } from '@/features/drawing/figure/SvgFigure'
import { useFigureColors, useFigureLabels } from '@/features/drawing/figure/useFigureLook'
import { useUnits } from '@/features/people/useUnits'
import { useEndWords } from '../useEndWords'
import { useMarkWords } from '../useMarkWords'

interface Props {
  readonly layout: StripLayout
  readonly strip: Strip
  readonly stock: Stock
  readonly side: Side
}

/** As wide as a phone's column; it shrinks with anything narrower. */
const WIDTH = 358
const HEIGHT = 250

/** One end of the strip flat and enlarged, with the figures a tape is laid to. */
export function EndOutline({ layout, strip, stock, side }: Props) {
  const { t } = useTranslation('ends')
  const words = useEndWords()
  const marks = useMarkWords(strip)
  const { run } = useUnits()
  const { length } = useFigureLabels()
  const colors = useFigureColors(stock.painted ? stock.colorHex : null)
  const { display } = useMemo(
    () =>
      outlineFigure(layout, strip, {
        width: WIDTH,
        height: HEIGHT,
        side,
        labels: { length, run, end: (which) => t(`side.${which}`) },
      }),
    [layout, strip, side, length, run, t],
  )
  return (
    <SvgFigure
      display={display}
      colors={colors}
      title={t('picture.outline', { side: words.side(side), marks: marks.spoken(layout[side]) })}
      className="h-auto max-w-full"
    />
  )
}
