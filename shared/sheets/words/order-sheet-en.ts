import type { OrderSheetWords } from '#shared/sheets/words/order-sheet-words'

const counted =
  (one: string, more: string) =>
  (count: number, shown: string): string =>
    `${shown} ${count === 1 ? one : more}`

export const ORDER_EN: OrderSheetWords = {
  title: 'Order sheet',
  company: 'Company',
  job: 'Job',
  pitch: 'Pitch',
  orderedBy: 'Ordered by',
  ordered: 'Ordered',
  neededBy: 'Needed by',
  poNumber: 'P.O. number',
  state: 'State',
  states: {
    submitted: 'submitted',
    question: 'question',
    released: 'released',
    inWork: 'in work',
    ready: 'ready',
    partPickedUp: 'part picked up',
    pickedUp: 'picked up',
    withdrawn: 'withdrawn',
  },
  notes: 'Notes for the shop',
  metal: {
    steel: 'steel',
    stainless: 'stainless',
    aluminum: 'aluminum',
    copper: 'copper',
    zinc: 'zinc',
  },
  stock: (color, thickness, metal) => `${color}, ${thickness} ${metal}`,
  drawn: 'The drawing shows',
  weightOfAll: 'All of them weigh',
  price: 'Price',
  notInFigure: 'Not in the figure',
  leg: (leg, length) => `leg ${leg} ${length}`,
  bend: (bend, angle) => `bend ${bend} ${angle}`,
  hem: (edge, length) => `hem at ${edge} ${length}`,
  ends: {
    title: 'Ends',
    bothSquare: 'both square',
    left: (end) => `Left: ${end}`,
    right: (end) => `Right: ${end}`,
    square: 'square',
    over: (length) => `lap ${length} over`,
    under: (length) => `lap ${length} under`,
    miter: (cut) => `miter, ${cut}`,
    plumb: (slope) => `plumb at ${slope}`,
    corner: (angle) => `${angle} corner`,
    free: 'free plane',
    tabs: (lengths) =>
      lengths.length === 1
        ? `${lengths.join('')} tab`
        : `${lengths.length} tabs: ${lengths.join(', ')}`,
    low: { left: 'Low end left', right: 'Low end right' },
  },
  goods: {
    title: 'Small goods',
    kind: {
      fasteners: 'Fasteners',
      butylTape: 'Butyl tape',
      closures: 'Closures',
      rivets: 'Rivets',
      sealant: 'Sealant',
      touchUpPaint: 'Touch-up paint',
    },
    amount: {
      each: counted('piece', 'pieces'),
      foot: counted('ft', 'ft'),
      tube: counted('tube', 'tubes'),
      bottle: counted('bottle', 'bottles'),
    },
    inColor: (kind, color) => `${kind}, ${color}`,
  },
  totals: {
    title: 'All lines together',
    pieces: 'Pieces',
    weight: 'Weight',
    price: 'Price',
    priceMeaning: 'Without tax and small goods.',
  },
  wind: 'Edge metal that must resist wind uplift is designed and tested to its own standard; local codes and licensed practice decide. Foldyard checks how a piece bends, not whether it keeps a roof on.',
}
