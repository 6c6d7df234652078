import bwipjs from 'bwip-js/node'
import { z } from 'zod'

/** Widths of bars and spaces in modules, a bar first; the first of the answer is the symbol. */
const symbolSchema = z.tuple([z.object({ sbs: z.array(z.int().min(1).max(4)) })])

/** A bar of a symbol: where it begins and how wide it is, in modules from the symbol's left border. */
export interface Bar {
  readonly from: number
  readonly width: number
}

export interface Code128 {
  readonly bars: readonly Bar[]
  /** Modules from the first bar's left border to the last one's right; quiet zones come on top. */
  readonly modules: number
}

/** Modules that stay blank on either side: GS1 General Specifications, 5.4.4.2. */
export const QUIET_MODULES = 10

/** What scanners give back letter for letter, whatever they take for a character set. */
const PRINTABLE_ASCII = /^[\x20-\x7e]+$/

/**
 * The bars of a text in Code 128 (ISO/IEC 15417), with start, check and stop character.
 *
 * @throws RangeError for anything but printable ASCII
 */
export function code128(text: string): Code128 {
  if (!PRINTABLE_ASCII.test(text)) throw new RangeError(`No bar code is printed for "${text}".`)
  return barsOf(symbolSchema.parse(bwipjs.raw({ bcid: 'code128', text }))[0].sbs)
}

/** The bars among widths of bars and spaces in turn. */
export function barsOf(widths: readonly number[]): Code128 {
  const bars: Bar[] = []
  let modules = 0
  for (const [index, width] of widths.entries()) {
    if (index % 2 === 0) bars.push({ from: modules, width })
    modules += width
  }
  return { bars, modules }
}
