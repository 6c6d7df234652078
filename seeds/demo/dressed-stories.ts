import { release, submit } from './acts'
import { cornerEnds, gableEnds, lappedEnds } from './dressings'
import { DEMO_JOBS } from './jobs'
import { equalPieces } from './roof-lines'
import { bend, bundle, leave } from './shop-floor-acts'
import { DEMO_STOCKS } from './stocks'
import { at, type Story } from './story'

const LAP = 4
const EAVE = equalPieces({ length: 412.5, pieceLength: 120, lap: LAP })
const lapped = lappedEnds(LAP)

/** Orders with dressed ends, hands, laps and small goods. */
export const DRESSED: readonly Story[] = [
  // A gable pair and a corner, some of it bent, in a stock that was measured on its brake.
  {
    by: 'tomas',
    job: 'tern',
    poNumber: '7744',
    neededIn: 4,
    notes: 'Entrance gable: lefts and rights bundled apart, please.',
    lines: [
      [
        'G',
        'Rake, entrance gable',
        'gableRake',
        'harbor',
        4,
        88.375,
        {
          ends: gableEnds(DEMO_JOBS.tern.pitch_rise),
          hands: { drawn: 'left', left: 2, right: 2 },
          statedGirth: 10.25,
        },
      ],
      [
        'C',
        'Fascia cover round the corner',
        'fascia',
        'harbor',
        2,
        74.75,
        { ends: cornerEnds, hands: { drawn: 'left', left: 1, right: 1 } },
      ],
    ],
    goods: [
      {
        kind: 'rivets',
        quantity: 50,
        unit: 'each',
        stockId: DEMO_STOCKS.harbor.id,
        note: 'For the tabs.',
      },
      { kind: 'sealant', quantity: 2, unit: 'tube', stockId: null, note: '' },
    ],
    steps: [
      at(-1, '19:30', submit),
      at(-1, '19:50', release),
      at(-1, '20:10', bend(1, 3)),
      at(-1, '20:40', leave(1)),
      at(-1, '20:50', bundle('R7')),
    ],
  },
  // A roof line in equal pieces; the girth the crew wrote is not that of the drawing.
  {
    by: 'maren',
    job: 'millpond',
    poNumber: 'MP-14',
    neededIn: 6,
    notes: 'Barn eave in equal pieces, laid from the left.',
    lines: [
      ['E1', 'Eave, first piece', 'deepEave', 'slate', 1, EAVE.length, { ends: lapped.first }],
      [
        'E2',
        'Eave',
        'deepEave',
        'slate',
        EAVE.count - 2,
        EAVE.length,
        { ends: lapped.middle, statedGirth: 10.25 },
      ],
      ['E3', 'Eave, last piece', 'deepEave', 'slate', 1, EAVE.length, { ends: lapped.last }],
    ],
    goods: [
      {
        kind: 'fasteners',
        quantity: 120,
        unit: 'each',
        stockId: DEMO_STOCKS.slate.id,
        note: 'Painted heads.',
      },
      { kind: 'butylTape', quantity: 45, unit: 'foot', stockId: null, note: '' },
      {
        kind: 'touchUpPaint',
        quantity: 1,
        unit: 'bottle',
        stockId: DEMO_STOCKS.slate.id,
        note: '',
      },
    ],
    steps: [at(-1, '21:00', submit)],
  },
]
