import { code128, QUIET_MODULES } from '#server/adapters/pdf/code128'
import { POINTS_PER_INCH, type Pdf } from '#server/adapters/pdf/pdf'

/** Dots per inch of the thermal printers that labels are made for. */
export const LABEL_DPI = 203

export const POINTS_PER_DOT = POINTS_PER_INCH / LABEL_DPI

/** 3 dots of 203 dpi are 0.375 mm: the least whole number of dots at or above 0.33 mm (13 mil). */
export const DOTS_PER_MODULE = 3

const POINTS_PER_MODULE = DOTS_PER_MODULE * POINTS_PER_DOT

/**
 * A printer blackens every dot that a shape touches (ISO 32000-1, 10.6.5), so each bar stays this
 * part of a dot inside its borders; otherwise rounding makes some bars a dot too wide.
 */
const INSET = 0.05 * POINTS_PER_DOT

/** The same place, moved left or up to the next border between two dots. */
export const snapToDot = (points: number): number =>
  Math.floor(points / POINTS_PER_DOT + 1e-6) * POINTS_PER_DOT

/** Points that the symbol of a text takes with both quiet zones. */
export const widthOfCode128 = (text: string): number =>
  (code128(text).modules + 2 * QUIET_MODULES) * POINTS_PER_MODULE

/**
 * Draws the symbol of a text in black, its quiet zones inside the width it takes. `x` and `y` are its
 * upper left corner in points and are moved to whole dots counted from the page's corner.
 */
export function drawCode128(
  { document }: Pdf,
  text: string,
  place: { readonly x: number; readonly y: number; readonly height: number },
): void {
  const left = snapToDot(place.x) + QUIET_MODULES * POINTS_PER_MODULE
  const top = snapToDot(place.y)
  for (const { from, width } of code128(text).bars) {
    document.rect(
      left + from * POINTS_PER_MODULE + INSET,
      top,
      width * POINTS_PER_MODULE - 2 * INSET,
      place.height,
    )
  }
  document.fill('#000000')
}
