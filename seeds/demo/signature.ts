import type { Signature } from '#shared/hand-off/hand-off.contract'

const rounded = (value: number): number => Math.round(value * 10) / 10

/** A made-up scrawl: loops that shrink along a line, and a stroke below. */
export const demoSignature = (wildness: number): Signature => [
  Array.from({ length: 60 }, (_, index): [number, number] => {
    const along = index / 59
    const loop = along * Math.PI * (6 + wildness)
    const size = 90 * (1 - 0.6 * along)
    return [
      rounded(180 + 560 * along + size * Math.cos(loop) * 0.4),
      rounded(190 + size * Math.sin(loop)),
    ]
  }),
  Array.from({ length: 20 }, (_, index): [number, number] => {
    const along = index / 19
    return [rounded(220 + 500 * along), rounded(310 - 30 * along + 8 * Math.sin(along * wildness))]
  }),
]
