import { describe, expect, it } from 'vitest'
import type { DisplayList } from '#shared/drawing/display-list'
import { figureColors } from '#shared/drawing/figure-colors'
import { PALETTE } from '#shared/drawing/palette'
import { toSvg } from '#shared/drawing/svg'

const part = { kind: 'leg', leg: 1 } as const

const display: DisplayList = {
  width: 100,
  height: 50,
  items: [
    {
      kind: 'path',
      role: 'paint',
      points: [
        { x: 1, y: 2.00499 },
        { x: 30, y: 40 },
      ],
      closed: false,
      width: 3,
      filled: false,
      dash: [4, 2],
    },
    {
      kind: 'circle',
      role: 'edge',
      center: { x: 9, y: 9 },
      radius: 5,
      width: 0,
      filled: true,
    },
    {
      kind: 'text',
      role: 'dimensionText',
      at: { x: 20, y: 10 },
      text: '5" < 6"',
      size: 10,
      rotation: -90,
      bold: true,
    },
    {
      kind: 'path',
      role: 'target',
      part,
      points: [
        { x: 0, y: 0 },
        { x: 9, y: 0 },
      ],
      closed: false,
      width: 26,
      filled: false,
    },
  ],
}

describe('a drawing as SVG', () => {
  const svg = toSvg(display, figureColors('light', '#8f2f2a'), 'Leg & hem')

  it('names itself and keeps its frame', () => {
    expect(svg).toContain('viewBox="0 0 100 50"')
    expect(svg).toContain('role="img"><title>Leg &amp; hem</title>')
  })

  it('draws paint in the real color and ink in the color of the theme', () => {
    expect(svg).toContain(
      '<path d="M1 2L30 40" fill="none" stroke="#8f2f2a" stroke-width="3" stroke-linejoin="round" stroke-dasharray="4 2"/>',
    )
    expect(svg).toContain(`<circle cx="9" cy="9" r="5" fill="${PALETTE.light.ink}" stroke="none"/>`)
  })

  it('escapes text and centers it on its point, turned', () => {
    expect(svg).toContain('transform="rotate(-90 20 10)">5&quot; &lt; 6&quot;</text>')
    expect(svg).toContain('y="13.65"')
  })

  it('leaves unseen targets out', () => {
    expect(svg).not.toContain('stroke-width="26"')
  })

  it('draws a painted side as plain metal where the sheet has no color', () => {
    expect(toSvg(display, figureColors('dark', null))).toContain(`stroke="${PALETTE.dark.bare}"`)
  })
})
