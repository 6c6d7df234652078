import { amendFirst, answer, ask, release, submit, withdraw } from './acts'
import { cornerEnds, gableEnds, lappedEnds } from './dressings'
import { DEMO_JOBS } from './jobs'
import { equalPieces } from './roof-lines'
import { bendRun, bundle, leave, ofMark, spoil } from './shop-floor-acts'
import { DEMO_STOCKS } from './stocks'
import { at, type Story } from './story'

const LAP = 4
const SLIP_EAVE = equalPieces({ length: 508, pieceLength: 118, lap: LAP })
const lapped = lappedEnds(LAP)

/** Orders of the last days, most of them still on their way. */
export const THIS_WEEK: readonly Story[] = [
  // Ready: a pair for a gable and a corner.
  {
    by: 'corin',
    job: 'nettle',
    poNumber: 'PW-3312',
    neededIn: 1,
    notes: 'Unit B only. Text when strapped.',
    lines: [
      [
        'G',
        'Rake, unit B',
        'gableRake',
        'moss',
        4,
        102.5,
        {
          ends: gableEnds(DEMO_JOBS.nettle.pitch_rise),
          hands: { drawn: 'left', left: 2, right: 2 },
        },
      ],
      ['F', 'Fascia cover, porch corner', 'fascia', 'foxglove', 2, 66, { ends: cornerEnds }],
    ],
    goods: [
      { kind: 'butylTape', quantity: 60, unit: 'foot', stockId: null, note: '' },
      { kind: 'touchUpPaint', quantity: 1, unit: 'bottle', stockId: DEMO_STOCKS.moss.id, note: '' },
    ],
    steps: [
      at(-5, '16:45', submit),
      at(-5, '20:00', release),
      at(-3, '16:00', bendRun(1, 'oskar')),
      at(-3, '16:40', bendRun(2, 'oskar')),
      at(-2, '17:00', bundle('R2', ofMark('G'))),
      at(-2, '17:10', bundle('R5', ofMark('F'))),
    ],
  },
  // In work: the valley is bent, half of the ridge as well.
  {
    by: 'bram',
    job: 'ferry',
    poNumber: 'OG 61',
    neededIn: 3,
    notes: 'Boat shed, river side. Steep: we want the ridge in the same load.',
    lines: [
      ['V', 'Valley over the slipway', 'wideValley', 'rook', 4, 120],
      ['R', 'Ridge', 'ridge', 'rook', 8, 126],
    ],
    steps: [
      at(-4, '15:25', submit),
      at(-3, '13:05', release),
      at(-2, '16:20', bendRun(1)),
      at(-2, '17:40', bendRun(2, 'wren', 4)),
      at(-2, '18:00', leave(2)),
      at(-1, '13:30', bundle('F1', ofMark('V'))),
    ],
  },
  // In work: one scrapped, its remake bent already, nothing strapped.
  {
    by: 'rosario',
    job: 'mirador',
    poNumber: '127',
    neededIn: 2,
    notes: 'Fachada norte. Si falta un tramo, llamar: no mandar incompleto.',
    lines: [
      ['AL', 'Alero, fachada norte', 'deepEave', 'barley', 7, 126],
      ['T', 'Tapajuntas lateral, chimenea', 'sidewall', 'barley', 2, 48],
    ],
    steps: [
      at(-4, '18:15', submit),
      at(-4, '20:20', release),
      at(-2, '14:20', bendRun(1, 'oskar')),
      at(-2, '15:05', spoil(1, 'Slipped off the gauge, face a quarter short.')),
      at(-2, '15:20', bendRun(1, 'oskar')),
    ],
  },
  // In Oskar's hands.
  {
    by: 'petra',
    job: 'orchard',
    poNumber: 'OR-24',
    neededIn: 4,
    notes: 'Only garages 2 and 4, the others are not framed.',
    lines: [
      ['E', 'Eave drip', 'deepEave', 'barley', 10, 120],
      ['G', 'Rake', 'gableRake', 'barley', 4, 96],
    ],
    steps: [
      at(-3, '14:05', submit),
      at(-3, '18:20', release),
      at(-1, '15:00', bendRun(1, 'oskar', 6)),
    ],
  },
  {
    by: 'corin',
    job: 'tannery',
    poNumber: 'PW-3315',
    neededIn: 5,
    notes: '',
    lines: [
      ['W', 'Parapet cap, elevator head', 'wallCap', 'moss', 6, 114],
      ['S', 'Sidewall, stair', 'sidewall', 'moss', 4, 87.5],
    ],
    steps: [at(-3, '15:45', submit), at(-2, '13:20', release)],
  },
  // A roof line by the water, in equal pieces.
  {
    by: 'bram',
    job: 'ferry',
    poNumber: 'OG 62',
    neededIn: 6,
    notes: 'Laid from the ramp end, against the weather.',
    lines: [
      ['1', 'Eave, first', 'bareDrip', 'stainless', 1, SLIP_EAVE.length, { ends: lapped.first }],
      [
        '2',
        'Eave',
        'bareDrip',
        'stainless',
        SLIP_EAVE.count - 2,
        SLIP_EAVE.length,
        { ends: lapped.middle },
      ],
      ['3', 'Eave, last', 'bareDrip', 'stainless', 1, SLIP_EAVE.length, { ends: lapped.last }],
    ],
    steps: [
      at(-3, '20:30', submit),
      at(-2, '13:35', ask('Which end is the first piece: ramp or office?')),
      at(-2, '16:40', answer('Ramp. Wind comes off the water there.')),
      at(-2, '19:15', release),
    ],
  },
  {
    by: 'rosario',
    job: 'molino',
    poNumber: '128',
    neededIn: 5,
    notes: 'Nave de barricas. Color igual a la muestra que dejamos en el mostrador.',
    lines: [
      ['P', 'Remate alto, nave', 'peak', 'moss', 6, 120],
      ['M', 'Encuentro con muro', 'headwall', 'moss', 4, 120],
    ],
    steps: [at(-2, '18:30', submit), at(-1, '13:10', release)],
  },
  {
    by: 'petra',
    job: 'harrow',
    poNumber: 'HL-109',
    neededIn: 6,
    notes: 'Carport. Two spare closures are on purpose.',
    lines: [
      ['E', 'Eave drip, carport', 'eaveDrip', 'kiln', 4, 120],
      ['Z', 'Closure', 'closure', 'kiln', 8, 120],
    ],
    steps: [at(-2, '20:50', submit), at(-1, '13:15', amendFirst(5)), at(-1, '14:30', release)],
  },
  // The shop saw that it was ordered twice.
  {
    by: 'corin',
    job: 'nettle',
    poNumber: 'PW-3312',
    neededIn: 2,
    notes: '',
    lines: [['F', 'Fascia cover, porch corner', 'fascia', 'foxglove', 2, 66]],
    steps: [
      at(-4, '14:20', submit),
      at(-4, '15:40', withdraw('Ordered twice, told by phone: PW-3312 has these pieces.', 'ines')),
    ],
  },
  {
    by: 'bram',
    job: 'gosling',
    poNumber: 'OG 63',
    neededIn: 7,
    notes: 'Hay loft.',
    lines: [
      ['T', 'Tall rake', 'tallRake', 'rook', 6, 126],
      ['S', 'Sidewall at the hoist', 'sidewall', 'rook', 2, 72],
    ],
    steps: [
      at(-2, '15:50', submit),
      at(-1, '14:40', ask('Tall rake: 8 in 12 as on the parlor, or is the loft flatter?')),
    ],
  },
  {
    by: 'corin',
    job: 'nettle',
    poNumber: 'PW-3317',
    neededIn: 6,
    notes: 'Unit A, same as unit B but nobody needs it before the siding is up.',
    lines: [['H', 'Headwall, party wall', 'headwall', 'foxglove', 5, 120]],
    steps: [at(-1, '17:30', submit)],
  },
  {
    by: 'rosario',
    job: 'mirador',
    poNumber: '130',
    neededIn: 8,
    notes: 'Sin prisa. Los cortes con los de la 127 si conviene.',
    lines: [
      ['R', 'Remate de hastial', 'gableRake', 'barley', 4, 110],
      ['C', 'Cumbrera, cobertizo', 'slimRidge', 'barley', 2, 90],
    ],
    steps: [at(-1, '18:45', submit)],
  },
]
