import type { OrderSheetWords } from '#shared/sheets/words/order-sheet-words'

const counted =
  (one: string, more: string) =>
  (count: number, shown: string): string =>
    `${shown} ${count === 1 ? one : more}`

export const ORDER_ES: OrderSheetWords = {
  title: 'Hoja del pedido',
  company: 'Empresa',
  job: 'Obra',
  pitch: 'Pendiente',
  orderedBy: 'Pedido por',
  ordered: 'Pedido el',
  neededBy: 'Se necesita para',
  poNumber: 'Orden de compra',
  state: 'Estado',
  states: {
    submitted: 'enviado',
    question: 'con pregunta',
    released: 'liberado',
    inWork: 'en trabajo',
    ready: 'listo',
    partPickedUp: 'recogido en parte',
    pickedUp: 'recogido',
    withdrawn: 'retirado',
  },
  notes: 'Notas para el taller',
  metal: {
    steel: 'acero',
    stainless: 'inoxidable',
    aluminum: 'aluminio',
    copper: 'cobre',
    zinc: 'zinc',
  },
  stock: (color, thickness, metal) => `${color}, ${metal} ${thickness}`,
  drawn: 'El dibujo muestra',
  weightOfAll: 'Todas pesan',
  price: 'Precio',
  notInFigure: 'No caben en el dibujo',
  leg: (leg, length) => `tramo ${leg} ${length}`,
  bend: (bend, angle) => `doblez ${bend} ${angle}`,
  hem: (edge, length) => `dobladillo ${edge} ${length}`,
  ends: {
    title: 'Extremos',
    bothSquare: 'los dos a escuadra',
    left: (end) => `Izquierdo: ${end}`,
    right: (end) => `Derecho: ${end}`,
    square: 'a escuadra',
    over: (length) => `traslape de ${length} encima`,
    under: (length) => `traslape de ${length} debajo`,
    miter: (cut) => `inglete, ${cut}`,
    plumb: (slope) => `a plomo con ${slope}`,
    corner: (angle) => `esquina de ${angle}`,
    free: 'plano libre',
    tabs: (lengths) =>
      lengths.length === 1
        ? `lengüeta de ${lengths.join('')}`
        : `${lengths.length} lengüetas: ${lengths.join(', ')}`,
    low: { left: 'Extremo bajo a la izquierda', right: 'Extremo bajo a la derecha' },
  },
  goods: {
    title: 'Material menudo',
    kind: {
      fasteners: 'Tornillos',
      butylTape: 'Cinta de butilo',
      closures: 'Cierres de espuma',
      rivets: 'Remaches',
      sealant: 'Sellador',
      touchUpPaint: 'Pintura de retoque',
    },
    amount: {
      each: counted('pieza', 'piezas'),
      foot: counted('pie', 'pies'),
      tube: counted('tubo', 'tubos'),
      bottle: counted('frasco', 'frascos'),
    },
    inColor: (kind, color) => `${kind}, ${color}`,
  },
  totals: {
    title: 'Todas las líneas juntas',
    pieces: 'Piezas',
    weight: 'Peso',
    price: 'Precio',
    priceMeaning: 'Sin impuestos ni material menudo.',
  },
  wind: 'Los remates de borde que deben resistir la succión del viento se diseñan y prueban según su propia norma; deciden los códigos locales y los profesionales con licencia. Foldyard comprueba cómo se dobla una pieza, no si sujeta un techo.',
}
