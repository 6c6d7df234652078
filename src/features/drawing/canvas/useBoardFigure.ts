import { useMemo } from 'react'
import type { Part } from '#shared/drawing/display-list'
import { sectionFigure, type Figure, type FigureLabels } from '#shared/drawing/section-figure'
import type { Sheet } from '#shared/stock/stock.schema'
import type { BoardDocument } from '../model/board-document'
import type { Viewport } from '../model/viewport'
import { figureView } from './sheet-view'
import type { ElementSize } from './useElementSize'

interface FigureInputs {
  readonly sheet: Sheet
  readonly size: ElementSize
  readonly labels: FigureLabels
  readonly problems: readonly Part[]
  readonly warnings: readonly Part[]
  readonly selected: Part | null
}

/** The section as drawn, fitted into the canvas or kept in a held view; null before the first leg. */
export function useBoardFigure(
  { profile, placement }: BoardDocument,
  heldView: Viewport | null,
  { sheet, size, labels, problems, warnings, selected }: FigureInputs,
): Figure | null {
  return useMemo(() => {
    if (profile === null) return null
    const view = heldView ? { view: figureView(heldView, placement) } : {}
    const rotation = placement.heading
    return sectionFigure(profile, sheet, {
      ...size,
      labels,
      selected,
      problems,
      warnings,
      rotation,
      ...view,
    })
  }, [profile, placement, sheet, size, labels, selected, problems, warnings, heldView])
}
