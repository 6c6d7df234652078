import { useMemo } from 'react'
import { sectionFigure } from '#shared/drawing/section-figure'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Degrees } from '#shared/units/brands'
import { SvgFigure } from './SvgFigure'
import { useFigureColors, useFigureLabels } from './useFigureLook'

interface Props {
  readonly profile: Profile
  readonly stock: Pick<Stock, 'sheet' | 'colorHex' | 'painted'>
  readonly title: string
  readonly width: number
  readonly height: number
  /** Where leg 1 heads, degrees counter-clockwise from the right; absent: to the right. */
  readonly heading?: Degrees
  readonly className?: string
}

/** A section without words, for lists. */
export function ProfileThumb({
  profile,
  stock,
  title,
  width,
  height,
  heading = 0,
  className,
}: Props) {
  const colors = useFigureColors(stock.painted ? stock.colorHex : null)
  const labels = useFigureLabels()
  const { display } = useMemo(
    () =>
      sectionFigure(profile, stock.sheet, {
        width,
        height,
        labels,
        rotation: heading,
        show: { dimensions: false, angles: false, edges: false },
      }),
    [profile, stock.sheet, width, height, heading, labels],
  )
  return <SvgFigure display={display} colors={colors} title={title} className={className} />
}
