import { z } from 'zod'

/**
 * The widths of the characters 0 to 105 of Code 128 (ISO/IEC 15417, table 1; from memory), bars and
 * spaces in turn. Kept apart from the product's encoder, so that its bars are read by other eyes.
 */
const CHARACTERS = (
  '212222 222122 222221 121223 121322 131222 122213 122312 132212 221213 221312 231212 112232 ' +
  '122132 122231 113222 123122 123221 223211 221132 221231 213212 223112 312131 311222 321122 ' +
  '321221 312212 322112 322211 212123 212321 232121 111323 131123 131321 112313 132113 132311 ' +
  '211313 231113 231311 112133 112331 132131 113123 113321 133121 313121 211331 231131 213113 ' +
  '213311 213131 311123 311321 331121 312113 312311 332111 314111 221411 431111 111224 111422 ' +
  '121124 121421 141122 141221 112214 112412 122114 122411 142112 142211 241211 221114 413111 ' +
  '241112 134111 111242 121142 121241 114212 124112 124211 411212 421112 421211 212141 214121 ' +
  '412121 111143 111341 131141 114113 114311 411113 411311 113141 114131 311141 411131 211412 ' +
  '211214 211232'
).split(' ')

const STOP = '2331112'

/** Values of a symbol's characters: the start, the text, the check; the stop is left out. */
export function readCode128(widths: readonly number[]): number[] {
  const text = z.array(z.int().min(1).max(4)).parse(widths).join('')
  if (!text.endsWith(STOP)) throw new Error('The symbol does not end with the stop character.')
  const characters = text.slice(0, -STOP.length).match(/.{6}/g) ?? []
  if (characters.length * 6 + STOP.length !== text.length) throw new Error('Not whole characters.')
  return characters.map((character) => {
    const value = CHARACTERS.indexOf(character)
    if (value < 0) throw new Error(`${character} is no character of Code 128.`)
    return value
  })
}

/** The check value of a symbol by its definition: position times value, the start counted once. */
export const checkOf = ([start = 0, ...rest]: readonly number[]): number =>
  rest.reduce((sum, value, index) => sum + (index + 1) * value, start) % 103

/** Widths of bars and spaces in turn, from bars that say where they begin. */
export const widthsOf = (
  bars: readonly { readonly from: number; readonly width: number }[],
): number[] =>
  bars.flatMap(({ from, width }, index) => {
    const next = bars[index + 1]
    return next === undefined ? [width] : [width, next.from - from - width]
  })
