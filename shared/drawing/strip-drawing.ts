import type { StripLayout } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import type { DrawingBox, PlacedDisplay } from './compose'
import { composeDisplays } from './compose'
import type { DisplayList } from './display-list'
import type { OutlineLabels } from './outline-figure'
import { outlineFigure } from './outline-figure'
import type { FigureLabels } from './section-figure'
import { sectionFigure } from './section-figure'
import { stripFigure } from './strip-figure'

/** What a strip drawing can show. */
export type DrawingPart = 'section' | 'strip' | 'whole' | Side

export interface DrawnPiece {
  readonly profile: Profile
  readonly sheet: Sheet
  readonly strip: Strip
  readonly layout: StripLayout
}

export interface StripDrawingOptions {
  /** The sheet in pixels (or points). */
  readonly width: number
  readonly height: number
  readonly labels: FigureLabels & OutlineLabels
  /** Where each part lies; a part without a box is not drawn. */
  readonly boxes: Partial<Readonly<Record<DrawingPart, DrawingBox>>>
}

const drawPart = (
  part: DrawingPart,
  { profile, sheet, strip, layout }: DrawnPiece,
  frame: DrawingBox,
  labels: StripDrawingOptions['labels'],
): DisplayList => {
  const { width, height } = frame
  switch (part) {
    case 'section':
      return sectionFigure(profile, sheet, { width, height, labels }).display
    case 'strip':
      return stripFigure(profile, strip, { width, height, labels, mode: 'layout' }).display
    case 'whole':
      return outlineFigure(layout, strip, { width, height, labels }).display
    case 'left':
    case 'right':
      return outlineFigure(layout, strip, { width, height, labels, side: part }).display
  }
}

const PARTS: readonly DrawingPart[] = ['section', 'strip', 'whole', 'left', 'right']

/** Section, strip and outlines of one piece on one sheet, each in the box that the caller gives it. */
export const stripDrawing = (piece: DrawnPiece, options: StripDrawingOptions): DisplayList =>
  composeDisplays(
    options,
    PARTS.flatMap((part): PlacedDisplay[] => {
      const box = options.boxes[part]
      return box ? [{ display: drawPart(part, piece, box, options.labels), at: box }] : []
    }),
  )

/** An end with nothing to lay out: square, without tabs or opened hems. */
const isPlain = ({ marks, tabs, openings, cutAways }: StripLayout['left']): boolean =>
  tabs.length === 0 &&
  openings.length === 0 &&
  cutAways.length === 0 &&
  marks.every(({ along }) => along === 0)

/** Shares of a sheet's height, by what stands below section and strip. */
const SHARES = {
  pair: { section: 0.72, strip: 0.28 },
  dressed: { section: 0.38, strip: 0.14, whole: 0.18, ends: 0.3 },
}

/**
 * Boxes for a sheet of its own, one below the other: section, strip, and for a piece with dressed
 * ends the whole strip and its dressed ends side by side. `gap` is left free around each.
 */
export const drawingBoxes = (
  layout: StripLayout,
  { width, height }: Pick<DisplayList, 'width' | 'height'>,
  gap = 12,
): StripDrawingOptions['boxes'] => {
  const dressed = (['left', 'right'] as const).filter((side) => !isPlain(layout[side]))
  const across = width - 2 * gap
  const row = (from: number, share: number): DrawingBox => ({
    x: gap,
    y: from * height + gap / 2,
    width: across,
    height: share * height - gap,
  })
  if (dressed.length === 0) {
    const { section, strip } = SHARES.pair
    return { section: row(0, section), strip: row(section, strip) }
  }
  const { section, strip, whole, ends } = SHARES.dressed
  const last = row(section + strip + whole, ends)
  const wide = (across - gap * (dressed.length - 1)) / dressed.length
  const endBoxes = dressed.map(
    (side, index) => [side, { ...last, x: gap + index * (wide + gap), width: wide }] as const,
  )
  return {
    section: row(0, section),
    strip: row(section, strip),
    whole: row(section + strip, whole),
    ...Object.fromEntries(endBoxes),
  }
}
