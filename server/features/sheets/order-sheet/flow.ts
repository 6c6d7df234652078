import { drawRule } from '#server/adapters/pdf/page-frame'
import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import type { SheetPage } from '#server/features/sheets/sheet-pages'

/** Something that stays together on one page. Points. */
export interface Part {
  readonly height: number
  /** Room above it, but not at the head of a page. */
  readonly above: number
  /** A rule sets it off from what stands above it on its page. */
  readonly ruled?: boolean
  readonly draw: (pdf: Pdf, box: Box) => void
}

/** Parts one below the other, as many to a page as fit. At least one page. */
export function flowPages(parts: readonly Part[], body: Box): SheetPage[] {
  const bottom = body.y + body.height
  const pages: { readonly part: Part; readonly y: number }[][] = [[]]
  let y = body.y
  for (const part of parts) {
    const isFirst = pages.at(-1)?.length === 0
    let top = isFirst ? y : y + part.above
    if (!isFirst && top + part.height > bottom) {
      pages.push([])
      top = body.y
    }
    pages.at(-1)?.push({ part, y: top })
    y = top + part.height
  }
  return pages.map((page) => (pdf: Pdf) => {
    for (const [index, { part, y: top }] of page.entries()) {
      if (part.ruled === true && index > 0) drawRule(pdf, body.x, body.x + body.width, top)
      part.draw(pdf, { ...body, y: top, height: part.height })
    }
  })
}
