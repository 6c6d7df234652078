import type { Bounds } from '#shared/geometry/bounds'
import { boxAround } from '#shared/geometry/bounds'
import type { Point, TextShape } from '#shared/drawing/display-list'

/** Every character of the mono face is this wide, in parts of the type size. */
export const TEXT_ADVANCE = 0.6

/** From the foot of a slash to its head, in parts of the type size. */
export const TEXT_HEIGHT = 1.1

/** Half of a character beyond the basic plane: two of them are one character. */
const isLowSurrogate = (unit: number): boolean => unit >= 0xdc00 && unit <= 0xdfff

export const textWidth = (text: string, size: number): number => {
  let count = 0
  for (let index = 0; index < text.length; index += 1) {
    if (!isLowSurrogate(text.charCodeAt(index))) count += 1
  }
  return count * TEXT_ADVANCE * size
}

/** The box that a line of upright text fills when centred on `at`. */
export const textBox = (text: string, size: number, at: Point): Bounds =>
  boxAround(at, textWidth(text, size), size * TEXT_HEIGHT)

/** The box around a text shape, turned or not. */
export const boxOfText = (shape: TextShape): Bounds => {
  const angle = (shape.rotation * Math.PI) / 180
  const c = Math.abs(Math.cos(angle))
  const s = Math.abs(Math.sin(angle))
  const width = textWidth(shape.text, shape.size)
  const height = shape.size * TEXT_HEIGHT
  return boxAround(shape.at, width * c + height * s, width * s + height * c)
}
