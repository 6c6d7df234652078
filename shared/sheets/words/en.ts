import type { SheetWords } from '#shared/sheets/words/sheet-words'

export const EN: SheetWords = {
  stripSheet: 'Strip sheet',
  endTemplates: 'Ends at full size',
  page: (page, pages) => `page ${page} of ${pages}`,
  printed: (day) => `printed ${day}`,
  poNumber: (number) => `P.O. ${number}`,
  hand: { left: 'left hand', right: 'right hand' },
  fact: {
    pieces: 'Pieces',
    left: 'of them left',
    right: 'of them right',
    length: 'Piece, tip to tip',
    stripWidth: 'Strip width',
    girth: 'Girth (stretch-out)',
    statedGirth: 'Girth the crew expects',
    blank: 'Cut the blank',
    weight: 'A piece weighs',
    stock: 'Stock',
    colorSide: 'Color side',
    brake: 'Brake',
    notReleased: 'not released yet',
  },
  colorSide: {
    left: 'up as it lies here',
    right: 'down as it lies here',
    both: 'both sides',
    none: 'none',
  },
  section: 'Section, seen from its right end',
  strip: 'Strip, left side up: creases from edge A',
  wholeStrip: 'The whole strip, left side up',
  creases: {
    title: 'Creases',
    fold: 'Fold',
    fromA: 'From A',
    way: 'Way',
    angle: 'Angle',
    up: 'up',
    down: 'down',
    bend: (bend) => `bend ${bend}`,
    hem: (edge) => `hem at ${edge}`,
  },
  end: {
    title: { left: 'Left end', right: 'Right end' },
    low: 'LOW END',
    high: 'HIGH END',
    square: 'Cut square.',
    under: 'Lap that slips under its neighbor.',
    relief: (length) => `Cut away what is dotted, over ${length} from the end.`,
    over: 'Lap that takes its neighbor in.',
    miter: 'Mitered: prick the marks and cut from one to the next.',
    tab: (leg, length) =>
      `Leg ${leg}: leave a tab of ${length} beyond the cut and fold it on the cut line.`,
    opening: (edge, gap, length) =>
      `Open the hem at edge ${edge} to ${gap} over ${length} from the end.`,
    slits: (count) =>
      count === 1
        ? 'Slit the crease between the tabs.'
        : `Slit the ${count} creases between the tabs.`,
  },
  marks: {
    title: 'Marks, left side up',
    at: 'At',
    fromA: 'From edge A',
    fromEnd: 'In from the end',
    edgeA: 'edge A',
    edgeB: 'edge B',
  },
  template: {
    check: (length) => `Measure this line: it must be ${length} long.`,
    full: 'Print at 100 %, nothing fitted to the page.',
    join: 'Cut along the frames and join the pages by their letters.',
    noDressedEnd: 'Both ends are cut square: there is no end to lay on the metal.',
  },
  caution: {
    title: 'Cautions',
    edges: 'Cut edges and burrs are sharp: gloves on.',
    brake: 'Pinch points at the brake: the maker’s guarding and lock-out rules come first.',
    film: 'Peel the film back from a hem before it is closed; strip the rest soon after fixing.',
    lift: {
      twoPeople: (weight, length) => `Two people lift it: over ${weight} or ${length}.`,
      neverOne: (_weight, _length, never) => `Two people lift it, never one: over ${never}.`,
    },
  },
  figure: {
    section: (name) => `Section of ${name} with its dimensions`,
    strip: (name) => `Flat strip of ${name} with its creases, edge A at the left`,
    wholeStrip: (name) => `Outline of the strip of ${name}`,
    end: (name, end) => `${end} of ${name}: outline with its marks`,
  },
}
