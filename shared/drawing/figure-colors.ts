import type { Role } from './display-list'
import type { ThemeName } from './palette'
import { PALETTE } from './palette'

/** CSS colors of a drawing: one for each role, and the ground that lettering is knocked out of. */
export interface FigureColors {
  readonly roles: Readonly<Record<Role, string>>
  readonly ground: string
}

/** The face of all figures and letters in a drawing. */
export const FIGURE_FONT = "'JetBrains Mono', monospace"

/** `paintHex` is the real color of the sheet (CSS hex); null draws painted sides as plain metal. */
export const figureColors = (theme: ThemeName, paintHex: string | null): FigureColors => {
  const palette = PALETTE[theme]
  return {
    ground: palette.paper,
    roles: {
      metal: palette.ink,
      bare: palette.bare,
      paint: paintHex ?? palette.bare,
      paintEdge: palette.scribe,
      dimension: palette.scribe,
      dimensionText: palette.ink,
      angleText: palette.scribe,
      edge: palette.ink,
      strip: palette.sheet,
      crease: palette.dye,
      hemHatch: palette.edge,
      selected: palette.dye,
      hovered: palette.dye,
      problem: palette.chalk,
      warning: palette.ochre,
      tool: palette.tool,
      toolEdge: palette.edge,
      ghost: palette.edge,
      halo: palette.paper,
      outline: palette.ink,
      cutAway: palette.scribe,
      slit: palette.ink,
      tabHatch: palette.edge,
      tabFold: palette.dye,
      opening: palette.ochre,
      mark: palette.ink,
      word: palette.scribe,
      target: 'transparent',
    },
  }
}

/** A whole drawing in one color, such as the color of the text around a glyph. */
export const oneColor = (color: string): FigureColors => ({
  ground: 'none',
  roles: {
    metal: color,
    bare: color,
    paint: color,
    paintEdge: color,
    dimension: color,
    dimensionText: color,
    angleText: color,
    edge: color,
    strip: 'none',
    crease: color,
    hemHatch: color,
    selected: color,
    hovered: color,
    problem: color,
    warning: color,
    tool: 'none',
    toolEdge: color,
    ghost: color,
    halo: 'none',
    outline: color,
    cutAway: color,
    slit: color,
    tabHatch: color,
    tabFold: color,
    opening: color,
    mark: color,
    word: color,
    target: 'none',
  },
})

/** Ink on white paper: what a label printer or a fax can show. */
export const inkColors = (): FigureColors => {
  const black = '#000000'
  const grey = '#6B6B6B'
  return {
    ground: '#FFFFFF',
    roles: {
      metal: black,
      bare: '#FFFFFF',
      paint: '#9A9A9A',
      paintEdge: black,
      dimension: grey,
      dimensionText: black,
      angleText: black,
      edge: black,
      strip: '#FFFFFF',
      crease: black,
      hemHatch: grey,
      selected: black,
      hovered: black,
      problem: black,
      warning: black,
      tool: '#E4E4E4',
      toolEdge: grey,
      ghost: grey,
      halo: '#FFFFFF',
      outline: black,
      cutAway: grey,
      slit: black,
      tabHatch: grey,
      tabFold: black,
      opening: black,
      mark: black,
      word: black,
      target: 'none',
    },
  }
}
