import { createElement } from 'react'
import { oneColor } from '#shared/drawing/figure-colors'
import { GLYPH_SIZE, stateGlyph } from '#shared/drawing/state-glyphs'
import { svgElement } from '#shared/drawing/svg'
import type { PieceState } from '#shared/pieces/piece-state'
import { reactAttributes } from './react-attributes'

interface StateGlyphProps {
  state: PieceState
  /** Pixels; 24 unless given. */
  size?: number
  className?: string
}

const inTextColor = oneColor('currentColor')

/** The state as a picture. Hidden from screen readers: its word always stands beside it. */
export const StateGlyph = ({ state, size = GLYPH_SIZE, className }: StateGlyphProps) => (
  <svg
    aria-hidden="true"
    focusable="false"
    width={size}
    height={size}
    viewBox={`0 0 ${GLYPH_SIZE} ${GLYPH_SIZE}`}
    className={className}
  >
    {stateGlyph(state).items.map((item, index) => {
      const { tag, attributes } = svgElement(item, inTextColor)
      return createElement(tag, { key: index, ...reactAttributes(attributes) })
    })}
  </svg>
)
