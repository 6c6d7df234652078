import type { LabelWords } from '#shared/labels/words/label-words'

export const EN: LabelWords = {
  title: 'Piece labels',
  pieceOf: (sequence, quantity) => `${sequence} of ${quantity}`,
  poNumber: (number) => `P.O. ${number}`,
  lowEnd: 'low end',
  highEnd: 'high end',
  edgeA: 'edge A',
  lift: { twoPeople: 'Two people lift', neverOne: 'Two people, never one' },
  section: (name) => `Section of ${name}`,
}
