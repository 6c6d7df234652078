import type { LabelWords } from '#shared/labels/words/label-words'

export const ES: LabelWords = {
  title: 'Etiquetas de piezas',
  pieceOf: (sequence, quantity) => `${sequence} de ${quantity}`,
  poNumber: (number) => `O.C. ${number}`,
  lowEnd: 'extremo bajo',
  highEnd: 'extremo alto',
  edgeA: 'borde A',
  lift: { twoPeople: 'Levantar entre dos', neverOne: 'Dos personas, nunca una' },
  section: (name) => `Sección de ${name}`,
}
