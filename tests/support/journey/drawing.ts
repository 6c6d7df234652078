import type { Locator, Page } from 'playwright-core'

/** Inches from the middle of the empty sheet: x to the right, y up. */
export type Corner = readonly [x: number, y: number]

/** Top leg, face and kick of a gable trim, walked from edge A to edge B. */
export const GABLE: readonly Corner[] = [
  [-3, 1.5],
  [0.5, 1.5],
  [0.5, -1.5],
  [1.25, -2.25],
]

const pixels = (text: string): [number, number] => {
  const [x = Number.NaN, y = Number.NaN] = text.split(' ').map((part) => Number.parseFloat(part))
  if (Number.isNaN(x) || Number.isNaN(y)) throw new Error(`The sheet shows no dots: "${text}".`)
  return [x, y]
}

/** Where a corner lies on the screen now, read off the dots that mark the inches. */
async function placeOf(canvas: Locator, [x, y]: Corner): Promise<{ x: number; y: number }> {
  const box = await canvas.boundingBox()
  if (!box) throw new Error('The sheet is not on the screen.')
  const dots = await canvas.locator('> div').evaluate((element) => {
    const { backgroundSize, backgroundPosition } = getComputedStyle(element)
    return { backgroundSize, backgroundPosition }
  })
  const [inch] = pixels(dots.backgroundSize)
  const [left, top] = pixels(dots.backgroundPosition)
  const place = { x: left + inch / 2 + x * inch, y: top + inch / 2 - y * inch }
  if (place.x < 0 || place.x > box.width || place.y < 0 || place.y > box.height) {
    throw new Error(`The corner ${x}, ${y} lies beyond the sheet.`)
  }
  return { x: box.x + place.x, y: box.y + place.y }
}

/** Taps the corners one after another on a sheet with dots. */
export async function tapCorners(page: Page, corners: readonly Corner[]): Promise<void> {
  const canvas = page.getByTestId('board-canvas')
  for (const corner of corners) {
    const { x, y } = await placeOf(canvas, corner)
    await page.touchscreen.tap(x, y)
  }
}

export const drawingTool = (page: Page, name: string): Locator =>
  page.getByRole('toolbar', { name: 'Drawing tools' }).getByRole('button', { name, exact: true })
