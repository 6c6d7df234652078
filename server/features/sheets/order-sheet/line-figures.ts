import type { OrderSpeech } from '#server/features/sheets/order-sheet/order-speech'
import type { PrintedLine } from '#server/features/sheets/order-sheet/printed-order'
import { figureLabels, placeOnStrip } from '#server/features/sheets/strip-sheet/sheet-speech'
import type { DisplayList } from '#shared/drawing/display-list'
import { sectionFigure, type LeftOut } from '#shared/drawing/section-figure'
import { stripFigure } from '#shared/drawing/strip-figure'

const MANY_CREASES = 5

/** Strips of so many creases take the whole width. */
export const hasWideStrip = ({ strip }: PrintedLine): boolean => strip.creases.length > MANY_CREASES

/** Points. */
export const stripHeight = (line: PrintedLine): number => (hasWideStrip(line) ? 112 : 96)
const STRIP_TEXT = 9

/** The strip with the places of its creases. */
export const stripOfLine = (line: PrintedLine, speech: OrderSpeech, width: number): DisplayList =>
  stripFigure(line.profile, line.strip, {
    width,
    height: stripHeight(line),
    labels: { ...figureLabels(speech), length: placeOnStrip(speech, line.strip) },
    mode: 'layout',
    textSize: STRIP_TEXT,
  }).display

/** Heights of a section that is hard to dimension, points. */
const LARGER = [240, 320, 400]

export interface SectionOfLine {
  readonly display: DisplayList
  /** In words, what even the largest figure has no room for. */
  readonly missing: readonly string[]
}

/** The smallest section from `least` points of height on that shows every dimension, or most of them. */
export function sectionOfLine(
  line: PrintedLine,
  speech: OrderSpeech,
  { width, least }: { readonly width: number; readonly least: number },
): SectionOfLine {
  const draw = (height: number) =>
    sectionFigure(line.profile, line.stock.sheet, { width, height, labels: figureLabels(speech) })
  let figure = draw(least)
  for (const height of LARGER) {
    const missing = countOf(figure.leftOut)
    if (missing === 0) break
    if (height <= least) continue
    const larger = draw(height)
    if (countOf(larger.leftOut) < missing) figure = larger
  }
  return { display: figure.display, missing: missingOf(line, figure.leftOut, speech) }
}

const countOf = ({ legs, bends, hems, edges }: LeftOut): number =>
  legs.length + bends.length + hems.length + edges.length

/** The edges stand at the strip as well. */
function missingOf(
  { profile }: PrintedLine,
  { legs, bends, hems }: LeftOut,
  { order, size, angle }: OrderSpeech,
): string[] {
  const lipOf = { A: profile.hemA, B: profile.hemB }
  return [
    ...legs.map((leg) => order.leg(leg, size(profile.legs[leg - 1] ?? NaN))),
    ...bends.map((bend) => order.bend(bend, angle(profile.bends[bend - 1]?.turn ?? NaN))),
    ...hems.map((edge) => order.hem(edge, size(lipOf[edge]?.length ?? NaN))),
  ]
}
