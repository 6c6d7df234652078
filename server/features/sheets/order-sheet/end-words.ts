import type { OrderSpeech } from '#server/features/sheets/order-sheet/order-speech'
import type { CutPlane, End, PieceEnds } from '#shared/ends/end.schema'
import { printAngle } from '#shared/units/angle'
import { printSlope } from '#shared/units/print-slope'

type Speech = Pick<OrderSpeech, 'order' | 'size'>

/** What each end is, and which lies low, a line each; null is square and level. */
export function endWords(ends: PieceEnds | null, speech: Speech): string[] {
  const words = speech.order.ends
  if (ends === null) return [words.bothSquare]
  return [
    words.left(endOf(ends.left, speech)),
    words.right(endOf(ends.right, speech)),
    ...(ends.lowEnd === null ? [] : [words.low[ends.lowEnd]]),
  ]
}

function endOf(end: End, speech: Speech): string {
  const cut = cutOf(end, speech)
  if (end.tabs.length === 0) return cut
  return `${cut} + ${speech.order.ends.tabs(end.tabs.map(({ length }) => speech.size(length)))}`
}

function cutOf(end: End, { order: { ends: words }, size }: Speech): string {
  switch (end.kind) {
    case 'square':
      return words.square
    case 'lap':
      return words[end.side](size(end.length))
    case 'miter':
      return words.miter(planeOf(end.plane, words))
  }
}

function planeOf(plane: CutPlane, words: OrderSpeech['order']['ends']): string {
  if ('plumb' in plane) return words.plumb(printSlope(plane.plumb))
  if ('corner' in plane) return words.corner(printAngle(Math.abs(plane.corner.plan)))
  return words.free
}
