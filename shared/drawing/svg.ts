import type { CircleShape, DisplayItem, DisplayList, PathShape, TextShape } from './display-list'
import type { FigureColors } from './figure-colors'
import { FIGURE_FONT } from './figure-colors'

/** Attributes of one SVG element, under their SVG names. */
export type SvgAttributes = Readonly<Record<string, string | number>>

export interface SvgElement {
  readonly tag: 'path' | 'circle' | 'text'
  readonly attributes: SvgAttributes
  readonly text?: string
}

/** Half the height of capitals and digits in parts of the type size: centers a line of text. */
const HALF_CAP = 0.365

/** A hundredth of a pixel is finer than any screen or printer. */
const round = (value: number): number => {
  const rounded = Math.round(value * 100) / 100
  return rounded === 0 ? 0 : rounded
}

const paintOf = (color: string, width: number, filled: boolean): SvgAttributes => ({
  fill: filled ? color : 'none',
  stroke: width > 0 ? color : 'none',
  ...(width > 0 ? { 'stroke-width': round(width) } : {}),
})

const pathElement = (shape: PathShape, color: string): SvgElement => ({
  tag: 'path',
  attributes: {
    d:
      shape.points
        .map(({ x, y }, index) => `${index === 0 ? 'M' : 'L'}${round(x)} ${round(y)}`)
        .join('') + (shape.closed ? 'Z' : ''),
    ...paintOf(color, shape.width, shape.filled),
    'stroke-linejoin': 'round',
    ...(shape.dash ? { 'stroke-dasharray': shape.dash.map(round).join(' ') } : {}),
  },
})

const circleElement = (shape: CircleShape, color: string): SvgElement => ({
  tag: 'circle',
  attributes: {
    cx: round(shape.center.x),
    cy: round(shape.center.y),
    r: round(shape.radius),
    ...paintOf(color, shape.width, shape.filled),
  },
})

const textElement = (shape: TextShape, color: string): SvgElement => {
  const x = round(shape.at.x)
  const y = round(shape.at.y)
  return {
    tag: 'text',
    text: shape.text,
    attributes: {
      x,
      y: round(shape.at.y + shape.size * HALF_CAP),
      fill: color,
      'font-family': FIGURE_FONT,
      'font-size': round(shape.size),
      'font-weight': shape.bold ? 700 : 400,
      'text-anchor': 'middle',
      ...(shape.rotation === 0 ? {} : { transform: `rotate(${round(shape.rotation)} ${x} ${y})` }),
    },
  }
}

export const svgElement = (item: DisplayItem, colors: FigureColors): SvgElement => {
  const color = colors.roles[item.role]
  switch (item.kind) {
    case 'path':
      return pathElement(item, color)
    case 'circle':
      return circleElement(item, color)
    case 'text':
      return textElement(item, color)
  }
}

/** Characters that XML 1.0 does not know even when they are escaped. */
const isForbidden = (character: string): boolean => {
  const code = character.codePointAt(0) ?? 0
  const isControl = code < 0x20 && code !== 0x09 && code !== 0x0a && code !== 0x0d
  return isControl || (code >= 0xd800 && code <= 0xdfff) || code === 0xfffe || code === 0xffff
}

const escape = (text: string): string =>
  Array.from(text)
    .filter((character) => !isForbidden(character))
    .join('')
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;')
    .replace(/"/g, '&quot;')

const markup = ({ tag, attributes, text }: SvgElement): string => {
  const list = Object.entries(attributes)
    .map(([name, value]) => ` ${name}="${escape(String(value))}"`)
    .join('')
  return text === undefined ? `<${tag}${list}/>` : `<${tag}${list}>${escape(text)}</${tag}>`
}

export interface SvgFile {
  /** Inches that a unit of the drawing takes on paper: 1/72 for points. Screens decide without. */
  readonly inchesPerUnit?: number
  /** Draws on the ground of the colors, which the drawing is made for, instead of on nothing. */
  readonly ground?: boolean
}

/**
 * The drawing as one SVG document, the frame's pixels as user units. `title` becomes its
 * accessible name. Unseen targets are left out.
 */
export const toSvg = (
  display: DisplayList,
  colors: FigureColors,
  title?: string,
  { inchesPerUnit, ground = false }: SvgFile = {},
): string => {
  const { width, height } = display
  const shapes = display.items
    .filter((item) => item.role !== 'target')
    .map((item) => markup(svgElement(item, colors)))
  const name = title === undefined ? '' : `<title>${escape(title)}</title>`
  const size = (units: number) =>
    inchesPerUnit === undefined ? `${units}` : `${round(units * inchesPerUnit * 1000) / 1000}in`
  const paper = ground
    ? `<rect width="${width}" height="${height}" fill="${escape(colors.ground)}"/>`
    : ''
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" width="${size(width)}" height="${size(height)}"` +
    ` viewBox="0 0 ${width} ${height}" role="img">${name}${paper}${shapes.join('')}</svg>`
  )
}
