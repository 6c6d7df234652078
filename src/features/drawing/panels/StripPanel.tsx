import { useMemo, type Dispatch } from 'react'
import { useTranslation } from 'react-i18next'
import type { FigureColors } from '#shared/drawing/figure-colors'
import type { Part } from '#shared/drawing/display-list'
import type { FigureLabels } from '#shared/drawing/section-figure'
import { stripFigure } from '#shared/drawing/strip-figure'
import type { Profile } from '#shared/profile/profile.schema'
import type { Strip } from '#shared/strip/strip.schema'
import { useElementSize } from '../canvas/useElementSize'
import { SvgFigure } from '../figure/SvgFigure'
import type { BoardEvent } from '../model/board'
import { STRIP_HEIGHT } from './strip-height'

interface Props {
  readonly profile: Profile
  readonly strip: Strip
  readonly selected: Part | null
  /** What deserves a look. */
  readonly warnings: readonly Part[]
  readonly dispatch: Dispatch<BoardEvent>
  readonly colors: FigureColors
  readonly labels: FigureLabels
}

/** The same piece laid flat: edge A left, edge B right. A touch lights up the part in the section. */
export function StripPanel({
  profile,
  strip,
  selected,
  warnings,
  dispatch,
  colors,
  labels,
}: Props) {
  const { t } = useTranslation('drawing')
  const { ref, size } = useElementSize()
  const width = size?.width ?? 0
  const figure = useMemo(
    () =>
      width > 0
        ? stripFigure(profile, strip, {
            width,
            height: STRIP_HEIGHT,
            labels,
            selected,
            warnings,
            targets: true,
          })
        : null,
    [profile, strip, width, labels, selected, warnings],
  )
  return (
    <div ref={ref} className="shrink-0" style={{ height: STRIP_HEIGHT }}>
      {figure && (
        <SvgFigure
          display={figure.display}
          colors={colors}
          title={t('figure.stripOfDrawing')}
          onPart={(part) => dispatch({ type: 'select', part })}
        />
      )}
    </div>
  )
}
