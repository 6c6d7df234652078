import { describe, expect, it } from 'vitest'
import type { Role } from '#shared/drawing/display-list'
import { figureColors, inkColors, oneColor } from '#shared/drawing/figure-colors'
import { PALETTE } from '#shared/drawing/palette'

/** Relative luminance of a CSS hex color (WCAG 2.2). */
const luminance = (hex: string): number => {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const value = parseInt(hex.slice(at, at + 2), 16) / 255
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}

const contrast = (a: string, b: string): number => {
  const [light = 0, dark = 0] = [luminance(a), luminance(b)].toSorted((x, y) => y - x)
  return (light + 0.05) / (dark + 0.05)
}

/** WCAG 2.2 AA: 4.5 for what is read, 3 for lines that carry a meaning. */
const TEXT: readonly Role[] = [
  'dimensionText',
  'angleText',
  'edge',
  'word',
  'selected',
  'problem',
  'warning',
]
const LINES: readonly Role[] = [
  'metal',
  'dimension',
  'crease',
  'hemHatch',
  'outline',
  'cutAway',
  'slit',
  'tabHatch',
  'tabFold',
  'opening',
  'mark',
  'ghost',
]

describe.each(['light', 'dark'] as const)('in the %s theme', (theme) => {
  const { roles } = figureColors(theme, null)
  const grounds = [PALETTE[theme].paper, PALETTE[theme].sheet]

  it.each(TEXT)('%s can be read on paper and on the sheet', (role) => {
    for (const ground of grounds) expect(contrast(roles[role], ground)).toBeGreaterThanOrEqual(4.5)
  })

  it.each(LINES)('lines of %s can be told from paper and from the sheet', (role) => {
    for (const ground of grounds) expect(contrast(roles[role], ground)).toBeGreaterThanOrEqual(3)
  })
})

it('is black on white for a printer that knows no colors, and one color in a line of text', () => {
  const ink = inkColors()
  for (const role of TEXT) expect(contrast(ink.roles[role], ink.ground)).toBeGreaterThanOrEqual(4.5)
  for (const role of LINES) expect(contrast(ink.roles[role], ink.ground)).toBeGreaterThanOrEqual(3)
  const { roles } = oneColor('currentColor')
  expect(new Set(Object.values(roles))).toEqual(new Set(['currentColor', 'none']))
})
