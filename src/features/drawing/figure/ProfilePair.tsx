import { useMemo } from 'react'
import type { Part } from '#shared/drawing/display-list'
import { sectionFigure } from '#shared/drawing/section-figure'
import { stripFigure } from '#shared/drawing/strip-figure'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import type { Degrees } from '#shared/units/brands'
import { useTranslation } from 'react-i18next'
import { SvgFigure } from './SvgFigure'
import { useFigureColors, useFigureLabels } from './useFigureLook'

interface Props {
  readonly profile: Profile
  readonly stock: Pick<Stock, 'sheet' | 'colorHex' | 'painted'>
  readonly strip: Strip
  /** What the piece is called, for the accessible names. */
  readonly name: string
  readonly width: number
  readonly height: number
  /** Where leg 1 heads, degrees counter-clockwise from the right; absent: to the right. */
  readonly heading?: Degrees
  /** `layout` adds the running distances at which the creases are marked. */
  readonly stripMode?: 'plain' | 'layout'
  readonly selected?: Part | null
}

/** The section and under it its strip: one thing, seen twice. */
export function ProfilePair({
  profile,
  stock,
  strip,
  name,
  width,
  height,
  heading = 0,
  stripMode = 'plain',
  selected = null,
}: Props) {
  const { t } = useTranslation('drawing')
  const colors = useFigureColors(stock.painted ? stock.colorHex : null)
  const labels = useFigureLabels(stripMode === 'layout' ? 32 : 16)
  const stripHeight =
    stripMode === 'layout'
      ? Math.max(110, Math.round(height * 0.32))
      : Math.max(56, Math.round(height * 0.2))
  const section = useMemo(
    () =>
      sectionFigure(profile, stock.sheet, {
        width,
        height: height - stripHeight,
        labels,
        rotation: heading,
        selected,
      }),
    [profile, stock.sheet, width, height, stripHeight, heading, labels, selected],
  )
  const flat = useMemo(
    () =>
      stripFigure(profile, strip, {
        width,
        height: stripHeight,
        labels,
        mode: stripMode,
        selected,
      }),
    [profile, strip, width, stripHeight, labels, stripMode, selected],
  )
  return (
    <div className="flex max-w-full flex-col">
      <SvgFigure
        display={section.display}
        colors={colors}
        title={t('figure.section', { name })}
        className="h-auto max-w-full"
      />
      <SvgFigure
        display={flat.display}
        colors={colors}
        title={t('figure.strip', { name })}
        className="h-auto max-w-full"
      />
    </div>
  )
}
