import type { MouseEvent } from 'react'
import { createElement, useId } from 'react'
import type { DisplayItem, DisplayList, Part } from '#shared/drawing/display-list'
import type { FigureColors } from '#shared/drawing/figure-colors'
import { svgElement } from '#shared/drawing/svg'
import { reactAttributes } from './react-attributes'

interface SvgFigureProps {
  display: DisplayList
  /** The accessible name: what the drawing shows, in words. */
  title: string
  colors: FigureColors
  className?: string
  /**
   * Called with the part under a press; draw the figure with `targets`. The keyboard's way to the
   * same parts is the table of legs and bends, so the drawing itself takes no focus.
   */
  onPart?: (part: Part) => void
}

const drawItem = (
  item: DisplayItem,
  index: number,
  colors: FigureColors,
  onPart?: (part: Part) => void,
) => {
  const { tag, attributes, text } = svgElement(item, colors)
  const { part } = item
  const props = reactAttributes(attributes)
  const press =
    onPart && part && item.role === 'target'
      ? {
          style: { cursor: 'pointer' },
          pointerEvents: 'stroke',
          onClick: (event: MouseEvent) => {
            event.stopPropagation()
            onPart(part)
          },
        }
      : { pointerEvents: 'none' }
  return createElement(tag, { key: index, ...props, ...press }, text)
}

/** Draws a display list as an SVG that scales to its box. */
export const SvgFigure = ({ display, title, colors, className, onPart }: SvgFigureProps) => {
  const id = useId()
  const items = onPart ? display.items : display.items.filter((item) => item.role !== 'target')
  return (
    <svg
      role="img"
      aria-labelledby={id}
      viewBox={`0 0 ${display.width} ${display.height}`}
      width={display.width}
      height={display.height}
      className={className}
    >
      <title id={id}>{title}</title>
      {items.map((item, index) => drawItem(item, index, colors, onPart))}
    </svg>
  )
}
